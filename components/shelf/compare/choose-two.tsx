import type { SheetMark } from '@/lib/shelf/views'

interface Props {
  sheets: readonly SheetMark[]
  a: string
  b: string
  /** What was wrong with what was asked for. */
  refused: boolean
}

/** Which two to hold against each other. A plain form: it needs no script. */
export function ChooseTwo({ sheets, a, b, refused }: Props) {
  const choices = sheets.flatMap(({ number, code, letters, cartridgeName, modelName, name }) =>
    [...letters].reverse().map((letter) => ({
      value: `${code}.${letter}`,
      words: `${number}, revision ${letter}: ${name ?? [cartridgeName || 'no name on it', modelName].join(', ')}`,
    })),
  )
  return (
    <form action="/shelf/compare" method="get" className="shf two-c2">
      {refused && (
        <p className="err" role="alert">
          One of the two cannot be found. A code may have been replaced since, or the sheet put away.
        </p>
      )}
      {(['a', 'b'] as const).map((side) => (
        <div className="tf" key={side}>
          <label htmlFor={`two-${side}`}>{side === 'a' ? 'The first' : 'The second'}</label>
          <select id={`two-${side}`} name={side} defaultValue={(side === 'a' ? a : b) || choices[side === 'a' ? Math.min(1, choices.length - 1) : 0]?.value}>
            {choices.map(({ value, words }) => (
              <option key={value} value={value}>
                {words}
              </option>
            ))}
          </select>
        </div>
      ))}
      <button type="submit" className="b pri">
        Side by side
      </button>
    </form>
  )
}
