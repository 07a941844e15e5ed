import { FieldRow } from '@/components/forms/field-row'
import { TextField } from '@/components/forms/text-field'
import type { FieldWiring } from '@/components/forms/use-action-form'
import { countWord, sentenceCase } from '@/lib/setups/format'
import type { SecondHand } from '@/lib/shelf/terms'

interface Board {
  id: string
  name: string
}

interface Props {
  field: (name: string) => FieldWiring
  modelName: string
  boards: readonly Board[]
  begin?: { board: string; name: string; boughtOn: string; boughtFrom: string; secondHand: SecondHand; serialEnding: string | null }
}

const SECOND_HAND_WORDS: Record<SecondHand, string> = { yes: 'Second-hand', no: 'New', 'not-said': 'Not said' }

/** Everything that is kept of a unit. The serial number comes in here and never back out. */
export function UnitFields({ field, modelName, boards, begin }: Props) {
  const board = field('board')
  const secondHand = field('secondHand')
  const ending = begin?.serialEnding
  return (
    <>
      <FieldRow id="serial-row" question="Serial number" help="It is on the plate at the back. It settles which board yours has.">
        <TextField
          wiring={field('serial')}
          label={ending ? `Serial number, ending ${ending}` : 'Serial number'}
          hint={ending ? 'Type the whole number to change it. Empty leaves it as it is.' : 'Kept for you alone. You see its last three figures, and nobody else any.'}
          autoComplete="off"
        />
        {ending && (
          <label className="tick">
            <input type="checkbox" {...field('forgetSerial').field} value="yes" />
            Forget the number
          </label>
        )}
      </FieldRow>
      {boards.length > 1 && (
        <FieldRow id="board-row" question="Board" help={`The ${modelName} was made with ${countWord(boards.length)} boards, and their switches differ. With a serial number you can leave this.`}>
          <RadioRow wiring={board} label="Board" begin={begin?.board ?? ''} options={[...boards.map(({ id, name }) => [id, sentenceCase(name)] as const), ['', "Don't know"] as const]} />
        </FieldRow>
      )}
      <FieldRow id="name-row" question="What you call it" help="Only if you have two of them, or like it named.">
        <TextField wiring={field('name')} label="Name" autoComplete="off" begin={begin?.name} />
      </FieldRow>
      <FieldRow id="bought-row" question="Bought" help="For a repair it helps to know. You can leave all of it.">
        <TextField wiring={field('boughtOn')} label="When" hint="Such as 2019, or March 2024." autoComplete="off" begin={begin?.boughtOn} />
        <TextField wiring={field('boughtFrom')} label="Where" autoComplete="off" begin={begin?.boughtFrom} />
        <RadioRow
          wiring={secondHand}
          label="New or second-hand"
          labelled
          begin={begin?.secondHand ?? 'not-said'}
          options={(['no', 'yes', 'not-said'] as const).map((each) => [each, SECOND_HAND_WORDS[each]] as const)}
        />
      </FieldRow>
    </>
  )
}

interface RadioRowProps {
  wiring: FieldWiring
  label: string
  /** The label is seen as well: the question beside it says something wider. */
  labelled?: boolean
  options: readonly (readonly [value: string, words: string])[]
  begin: string
}

function RadioRow({ wiring, label, labelled = false, options, begin }: RadioRowProps) {
  const chosen = wiring.value ?? begin
  return (
    <>
      {labelled && (
        <p className="rl" aria-hidden="true">
          {label}
        </p>
      )}
      <div className="seg wr" role="radiogroup" aria-label={label}>
        {options.map(([value, words]) => (
          <label key={value}>
            <input type="radio" {...wiring.field} value={value} defaultChecked={value === chosen} />
            {words}
          </label>
        ))}
      </div>
      {wiring.error && <p className="err">{wiring.error}</p>}
    </>
  )
}
