import Link from 'next/link'
import { ACT_CAUTIONS, EARTH_CAUTION, type Act } from '@/lib/cautions/texts'

type Props =
  | {
      act: Act
      /** Stays at the top of the screen while what it guards is in view. */
      dock?: boolean
    }
  | {
      act: 'earth'
      /** Where the words "What to do instead" lead. */
      insteadPath: string
    }

/** The fixed caution of an act, whole. It stands before each step that asks for the act, every time. */
export function CautionBox(props: Props) {
  if (props.act === 'earth') {
    return (
      <div className="caut" role="note">
        <p className="cth">{EARTH_CAUTION.title}</p>
        <p className="flat">
          <strong>{EARTH_CAUTION.never}</strong> {EARTH_CAUTION.also}{' '}
          <Link href={props.insteadPath}>{EARTH_CAUTION.instead}</Link>
        </p>
      </div>
    )
  }
  const { title, before, after, why } = ACT_CAUTIONS[props.act]
  return (
    <div className={props.dock ? 'caut dock' : 'caut'} role="note">
      <p className="cth">{title}</p>
      <dl>
        <dt>Before</dt>
        <dd>{before}</dd>
        <dt>After</dt>
        <dd>{after}</dd>
      </dl>
      <p className="why">{why}</p>
    </div>
  )
}
