import { FittedPanel } from '@/components/panel/fitted-panel'
import { moveLines } from '@/components/panel/move-words'
import { VerdictMark } from '@/components/ui/verdict-mark'
import type { MatchInputs } from '@/lib/match/inputs'
import type { MatchResult } from '@/lib/match/result'

interface Props {
  inputs: MatchInputs
  result: MatchResult
  title: string
}

/** What comes out, shown before anyone has answered anything: verdict, panel and moves of one finished check. */
export function Specimen({ inputs, result, title }: Props) {
  const { preamp, present, cartridge } = inputs
  if (!result.chosen || !present || !result.moves) return null
  const lines = moveLines(preamp, result.moves)
  return (
    <figure>
      <div className="ex">
        <p className="vh1">
          <VerdictMark mark={result.verdict} />
          {title}
        </p>
        <div className="pn">
          <FittedPanel preamp={preamp} present={present} target={result.chosen.setting.state} initialWidth={600} />
        </div>
        {lines.length > 0 && (
          <ul>
            {lines.map((line) => (
              <li key={line.title}>
                <b>{line.title}</b>
                {line.detail}
              </li>
            ))}
          </ul>
        )}
      </div>
      <figcaption>
        From a finished check: a {cartridge.name} into a {preamp.modelName}.
      </figcaption>
    </figure>
  )
}
