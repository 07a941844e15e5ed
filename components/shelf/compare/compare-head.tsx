import Link from 'next/link'
import { comparePath, dayInYear } from '@/lib/shelf/format'
import type { ComparedSide, ComparisonView } from '@/lib/shelf/views-compare'
import { VerdictLine } from '../verdict-line'

/** Both, with their letters to choose from, over the columns that they head. */
export function CompareHead({ comparison: { a, b, sameSheet }, now }: { comparison: ComparisonView; now: number }) {
  return (
    <div className="ch2">
      <div className="chs">
        <p className="lab">Choose two</p>
        <Letters of={a} label="First" pathOf={(letter) => comparePath({ ...a, letter }, b)} />
        <Letters of={b} label="Second" pathOf={(letter) => comparePath(a, { ...b, letter })} />
      </div>
      {[a, b].map((side, index) => (
        <div key={index}>
          <h2>
            <span className="rv" aria-hidden="true">
              <b className="on">{side.letter}</b>
            </span>
            {sameSheet ? `Revision ${side.letter}` : `Sheet ${side.number}, ${side.letter}`}, {dayInYear(side.createdAt, now)}
          </h2>
          <VerdictLine verdict={side.verdict} />
        </div>
      ))}
    </div>
  )
}

function Letters({ of: { letters, letter: chosen }, label, pathOf }: { of: ComparedSide; label: string; pathOf: (letter: string) => string }) {
  return (
    <p className="chl">
      <span className="lab">{label}</span>
      <span className="rv">
        {letters.map((letter) =>
          letter === chosen ? (
            <b key={letter} className="on" aria-current="true">
              {letter}
              <span className="vh">, {label.toLowerCase()}, shown here</span>
            </b>
          ) : (
            <Link key={letter} href={pathOf(letter)} scroll={false}>
              <b>
                {letter}
                <span className="vh"> as the {label.toLowerCase()}</span>
              </b>
            </Link>
          ),
        )}
      </span>
    </p>
  )
}
