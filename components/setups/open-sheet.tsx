import { movesBetween } from '@/lib/match/moves'
import { doubtRows } from '@/lib/setups/sentences/doubts'
import { asksMeaning, numberTitle, whereToRead } from '@/lib/setups/sentences/number-to-find'
import { numberTrouble } from '@/lib/setups/sentences/troubles'
import { UNKNOWN_WORDS } from '@/lib/setups/sentences/unknowns'
import type { Outcome } from '@/lib/setups/views'
import type { FoundFormProps } from './found-form'
import { NumberToFind } from './number-to-find'
import { DoubtsTable, HoldsTable } from './open-verdict'
import { turnsOf } from './plot-data'
import { canAct } from './sheet-facts'
import { SheetHead } from './sheet-head'
import type { SheetParts } from './sheet-parts'
import { SwitchCard } from './switch-card'

const TONIGHT = 'Bring the volume up from zero. If loud parts turn harsh, stop there.'

/** While the verdict is open: the number that would settle it, tonight's setting, what holds, what is not known. */
export function OpenSheet({ advice, ...parts }: SheetParts & { advice: Outcome }) {
  const { sheet, paths } = parts
  const { inputs, result, code } = sheet
  const { next } = result.match
  const target = advice.evaluation.setting.state
  const moves = inputs.present ? movesBetween(inputs.preamp, inputs.present, target) : inputs.preamp.controls.length === 0 ? [] : null
  return (
    <>
      <SheetHead {...parts}>
        {next && <NumberToFind title={numberTitle(next, inputs)} turns={turnsOf(next, inputs)} whereToRead={whereToRead(next, inputs)} form={foundForm(parts)} />}
      </SheetHead>
      <SwitchCard
        preamp={inputs.preamp}
        present={inputs.present}
        target={target}
        moves={moves}
        label="Figure 1. To play it tonight"
        after={TONIGHT}
        code={code}
        tellPath={paths.tellPresent}
        canAct={canAct(sheet)}
        unitName={sheet.unitName}
      />
      <HoldsTable label="Table 1. What can be said" />
      <DoubtsTable label="Table 2. What we do not know" rows={doubtRows(result.match, inputs)} />
    </>
  )
}

/** The box to type it in; none for what only a maker knows, nor at an earlier revision. */
function foundForm({ sheet, returned }: SheetParts): FoundFormProps | null {
  const { inputs, result, answers, code } = sheet
  const { next } = result.match
  if (!next || !canAct(sheet)) return null
  const words = UNKNOWN_WORDS[next.unknown]
  if (!words.field) return null
  const asks = asksMeaning(inputs, next.unknown) ? 'meaning' : next.unknown === 'output' ? 'output' : 'value'
  const { value, velocity = answers.velocity, meaning = answers.meaning } = returned ?? {}
  const trouble = returned?.trouble === 'number' ? numberTrouble(next.unknown, value ?? '', answers) : null
  return { code, unknown: next.unknown, name: words.name, unit: words.unit, asks, value, velocity, meaning, trouble }
}
