import type { ButtonRow, ControlState, LoadPlugs, Preamp, Slide, SwitchBank } from '@/lib/match'
import { isActive } from '@/lib/match/groups'
import { stateFieldName, type Side } from '@/lib/match/state-fields'
import { inSentence, sharedUnit } from './words'

/** Real checkboxes and radios, drawn as the controls they stand for. */

interface PartProps<C> {
  control: C
  state: ControlState
  side: Side
  /** Put before the names that are read aloud: "Left, ", or nothing. */
  spoken: string
  onSet: (to: number | string) => void
}

/** Switches that belong together, side by side; null for those without a use. */
function runsOf(preamp: Preamp, bank: SwitchBank, state: ControlState): { label: string | null; members: number[] }[] {
  const runs: { label: string | null; members: number[] }[] = []
  for (let member = 1; member <= bank.switchCount; member++) {
    const groups = preamp.groups.filter(({ control, members }) => control === bank.id && (members === null || members.includes(member)))
    const label = (groups.find((group) => isActive(preamp, group, state)) ?? groups[0])?.label ?? null
    const last = runs.at(-1)
    if (last && last.label === label) last.members.push(member)
    else runs.push({ label, members: [member] })
  }
  return runs
}

export function BankPart({ preamp, control: bank, state, side, spoken, onSet }: PartProps<SwitchBank> & { preamp: Preamp }) {
  return (
    <fieldset className="pk-bank">
      <legend className="vh">
        {spoken}
        {bank.label}
      </legend>
      {runsOf(preamp, bank, state).map(({ label, members }) => (
        <div className="pk-run" key={members[0]}>
          <div className="pk-switches">
            {members.map((member) => (
              <label className="pk-sw" key={member}>
                <input
                  type="checkbox"
                  aria-label={[`Switch ${member}`, ...(label ? [inSentence(label)] : [])].join(', ')}
                  name={stateFieldName(side, bank.id)}
                  value={member}
                  checked={state[bank.id][member - 1] === '1'}
                  onChange={() => onSet(member)}
                />
                <span className="pk-n">{member}</span>
                <span className="pk-cell" aria-hidden="true" />
              </label>
            ))}
          </div>
          {label && <span className="pk-name">{label}</span>}
        </div>
      ))}
      <span className="pk-onoff" aria-hidden="true">
        <span>ON</span>
        <span>OFF</span>
      </span>
    </fieldset>
  )
}

export function SlidePart({ control: slide, state, side, onSet }: PartProps<Slide>) {
  const { unit, short } = sharedUnit(slide.positions.map(({ label }) => label))
  return (
    <fieldset className="pk-slide">
      <legend className="pk-title">{unit ? `${slide.label}, ${unit}` : slide.label}</legend>
      {slide.positions.map(({ id }, index) => (
        <label className="pk-place" key={id}>
          <input type="radio" name={stateFieldName(side, slide.id)} value={id} checked={state[slide.id] === id} onChange={() => onSet(id)} />
          <span className="pk-cell" aria-hidden="true" />
          <span>{short[index]}</span>
        </label>
      ))}
    </fieldset>
  )
}

export function PlugsPart({ control: plugs, state, side, spoken, onSet }: PartProps<LoadPlugs>) {
  return (
    <fieldset>
      <legend className="pk-title">
        {spoken && <span className="vh">{spoken}</span>}
        {plugs.label} plug in the socket
      </legend>
      <div className="seg">
        {plugs.positions.map(({ id, label }) => (
          <label key={id}>
            <input type="radio" name={stateFieldName(side, plugs.id)} value={id} checked={state[plugs.id] === id} onChange={() => onSet(id)} />
            {label}
          </label>
        ))}
      </div>
    </fieldset>
  )
}

export function ButtonsPart({ control: row, state, side, onSet }: PartProps<ButtonRow>) {
  const isIn = (id: string, index: number) => (row.latch === 'each' ? state[row.id][index] === '1' : state[row.id] === id)
  return (
    <fieldset className="pk-buttons">
      <legend className="pk-title">{row.label}</legend>
      {row.buttons.map(({ id, label }, index) => (
        <label className="pk-btn" key={id}>
          <input
            type={row.latch === 'each' ? 'checkbox' : 'radio'}
            name={stateFieldName(side, row.id)}
            value={row.latch === 'each' ? index + 1 : id}
            checked={isIn(id, index)}
            onChange={() => onSet(id)}
          />
          <span>{label}</span>
          <span className="pk-cell" aria-hidden="true" />
        </label>
      ))}
    </fieldset>
  )
}
