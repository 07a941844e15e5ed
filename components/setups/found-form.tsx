import type { UnknownName } from '@/lib/match/inputs'
import { VELOCITIES, type Meaning, type VelocityChoice } from '@/lib/setups/terms'
import { FieldError } from './field-error'

export interface FoundFormProps {
  code: string
  unknown: UnknownName
  name: string
  unit: string
  /** What is asked: the value, the value of an output with its cm/s, or only what the cm/s mean. */
  asks: 'value' | 'output' | 'meaning'
  /** What stood there when it came back, or what the answers say about the cm/s already. */
  value?: string
  velocity?: string
  meaning?: string
  /** Why it came back; null when it did not. */
  trouble: string | null
}

const VELOCITY_WORDS: Record<Exclude<VelocityChoice, 'other'>, string> = {
  '5': '5 cm/s',
  '3.54': '3.54 cm/s',
  'per-cm': 'mV per cm/s',
  none: 'It does not say',
}
const MEANINGS_OFFERED: readonly (readonly [Meaning, string])[] = [
  ['peak-lateral', 'Peak, sideways'],
  ['rms-lateral', 'RMS, sideways'],
  ['peak-channel', 'Peak, one channel'],
  ['rms-channel', 'RMS, one channel'],
  ['not-said', 'It does not say'],
]

/** A box for the number that was found. It makes the sheet's next revision. A plain form: it needs no script. */
export function FoundForm({ code, unknown, name, unit, asks, value = '', velocity = '5', meaning = 'not-said', trouble }: FoundFormProps) {
  const wrong = trouble !== null
  return (
    <form action={`/sheets/${code}/number`} method="post" className="found">
      <input type="hidden" name="unknown" value={unknown} />
      {asks !== 'meaning' && (
        <div className="row">
          <span className={wrong ? 'in bad' : 'in'}>
            <input
              name="value"
              defaultValue={value}
              aria-label={unit ? `${name}, ${unit}` : name}
              aria-invalid={wrong}
              aria-describedby={wrong ? 'found-error' : undefined}
              autoComplete="off"
              inputMode="decimal"
              maxLength={120}
              required
            />
            {unit && <span className="u">{unit}</span>}
          </span>
        </div>
      )}
      {asks !== 'value' && (
        <div className="row">
          {asks === 'output' && (
            <Choice
              name="velocity"
              label="Printed for"
              value={velocity}
              options={VELOCITIES.filter((choice) => choice !== 'other').map((choice) => [choice, VELOCITY_WORDS[choice]])}
            />
          )}
          <Choice name="meaning" label="Measured" value={meaning} options={MEANINGS_OFFERED} />
        </div>
      )}
      {wrong && <FieldError id="found-error">{trouble}</FieldError>}
      <div className="row">
        <button type="submit" className="b pri">
          Work it out
        </button>
      </div>
    </form>
  )
}

interface ChoiceProps {
  name: string
  label: string
  value: string
  options: readonly (readonly [value: string, words: string])[]
}

function Choice({ name, label, value, options }: ChoiceProps) {
  return (
    <label className="pick">
      <span className="lab">{label}</span>
      <select name={name} defaultValue={value}>
        {options.map(([option, words]) => (
          <option key={option} value={option}>
            {words}
          </option>
        ))}
      </select>
    </label>
  )
}
