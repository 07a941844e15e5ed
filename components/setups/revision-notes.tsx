import Link from 'next/link'
import { dayText, listed } from '@/lib/setups/format'
import type { Changed, RevisionMark } from '@/lib/setups/views'
import { SheetForm } from './sheet-form'

interface Props {
  code: string
  letter: string
  createdAt: number
  revisions: readonly RevisionMark[]
  changed: Changed
  mayChange: boolean
  model: string
}

/** Where this letter stands among the others, and whether it would be reckoned otherwise today. */
export function RevisionNotes({ code, letter, createdAt, revisions, changed, mayChange, model }: Props) {
  const newest = revisions[revisions.length - 1]
  const isNewest = newest.letter === letter
  const stale = changed.rules || changed.engine || changed.data
  if (revisions.length === 1 && !stale) return null
  const what = listed([...(changed.rules ? ['our rules'] : []), ...(changed.engine ? ['how we reckon'] : []), ...(changed.data ? [`the data of the ${model}`] : [])])
  return (
    <aside className="revs no-p" aria-label="Revisions">
      {revisions.length > 1 && (
        <p>
          <span className="rv">
            {revisions.map((revision) => (
              <RevisionLetter key={revision.letter} code={code} revision={revision} inUse={revision.letter === letter} />
            ))}
          </span>
          {!isNewest && (
            <span>
              This is revision {letter}. <Link href={`/sheets/${code}`}>Go to {newest.letter}, the newest</Link>
            </span>
          )}
        </p>
      )}
      {stale && (
        <div className="anew">
          <p>
            This is what it said on {dayText(createdAt)}. Since then {what} {changed.rules && !changed.engine && !changed.data ? 'have' : 'has'} changed.
            {!changed.canComputeAnew && ' It can no longer be worked out anew with these answers.'}
          </p>
          {changed.canComputeAnew && isNewest && mayChange && (
            <SheetForm act="anew" code={code} button="b sm">
              Work it out anew
            </SheetForm>
          )}
        </div>
      )}
    </aside>
  )
}

function RevisionLetter({ code, revision: { letter, createdAt }, inUse }: { code: string; revision: RevisionMark; inUse: boolean }) {
  if (inUse) {
    return (
      <b className="on" aria-current="true">
        {letter}
        <span className="vh">, shown here</span>
      </b>
    )
  }
  return (
    <Link href={`/sheets/${code}?revision=${letter}`} aria-label={`Revision ${letter}, of ${dayText(createdAt)}`}>
      <b>{letter}</b>
    </Link>
  )
}
