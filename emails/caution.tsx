import { Column, Row } from '@react-email/components'
import { ACT_CAUTIONS, type Act } from '@/lib/cautions/texts'
import { LIGHT, ON_SPOT } from './inks'
import { caution, narrow, row } from './styles'

/** The fixed caution of an act, whole, as a table. It stands before what asks for the act. */
export function MailCaution({ act }: { act: Act }) {
  const { title, before, after, why } = ACT_CAUTIONS[act]
  return (
    <Row>
      <Column className="pad" style={row(22)}>
        <Row className="spot" bgcolor={LIGHT.spot} style={{ backgroundColor: LIGHT.spot, border: `2px solid ${ON_SPOT}` }}>
          <Column style={{ padding: '11px 16px 13px' }}>
            <Row>
              <Column style={narrow(19, 23, ON_SPOT)}>{title}</Column>
            </Row>
            <Part name="Before" words={before} />
            <Part name="After" words={after} />
            <Row>
              <Column style={{ ...caution(14, 19), paddingTop: '5px' }}>{why}</Column>
            </Row>
          </Column>
        </Row>
      </Column>
    </Row>
  )
}

function Part({ name, words }: { name: string; words: string }) {
  return (
    <Row style={{ paddingTop: '4px' }}>
      <Column width={58} valign="top" style={{ ...caution(15, 21), fontWeight: 700 }}>
        {name}
      </Column>
      <Column style={caution(15, 21)}>{words}</Column>
    </Row>
  )
}
