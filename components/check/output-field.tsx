'use client'

import { Choice, type Option } from '@/components/forms/choice'
import { HALF_MEANINGS, type HalfMeaning } from '@/lib/setups/terms'
import { outputView } from '@/lib/setups/views-field'
import { useCheckForm } from './form-context'
import { PlainBox, PlainTrouble } from './plain-field'
import { useOpenOnce } from './use-open-once'
import { ValueField } from './value-field'

const SPEEDS: readonly Option[] = [
  { value: '5', label: '5 cm/s' },
  { value: '3.54', label: '3.54 cm/s' },
  { value: 'per-cm', label: 'Per cm/s' },
  { value: 'other', label: 'Other' },
  { value: 'none', label: 'Not stated' },
]
const MEANINGS: readonly Option[] = [
  { value: 'peak-lateral', label: 'Peak, sideways' },
  { value: 'rms-lateral', label: 'RMS, sideways' },
  { value: 'peak-channel', label: 'Peak, one channel' },
  { value: 'rms-channel', label: 'RMS, one channel' },
  { value: 'not-said', label: 'It does not say' },
]
const HALVES: Record<HalfMeaning, string> = {
  peak: 'Peak, which way it does not say',
  rms: 'RMS, which way it does not say',
  lateral: 'Sideways, peak or RMS it does not say',
  channel: 'One channel, peak or RMS it does not say',
}

/** Output with the groove speed it was printed for, and what that speed means where it matters. */
export function OutputField() {
  const { initial, field } = useCheckForm()
  const speed = (
    <div className="spd">
      <span className="lab at" aria-hidden="true">
        at
      </span>
      <Choice label="Groove speed beside the output" options={SPEEDS} value={initial.velocity} field={field('velocity')} wrap />
    </div>
  )
  return (
    <ValueField
      field="output"
      question="Output"
      help="How strong the signal is, at one groove speed."
      className="out"
      beside={speed}
      under={<Under />}
    />
  )
}

function Under() {
  const { initial, answers, raw, field, meaningMatters } = useCheckForm()
  const { question, understood, ifNotSaid, atReference } = outputView(answers)
  const half = HALF_MEANINGS.find((each) => each === initial.meaning)
  const options = half ? [...MEANINGS, { value: half, label: HALVES[half] }] : MEANINGS
  const open = useOpenOnce(meaningMatters || Boolean(raw.meaning))
  return (
    <div className="vals">
      <div className="other-speed">
        <PlainBox field="velocityOther" label="Groove speed" />
        <PlainTrouble field="velocityOther" />
      </div>
      <details className="ask5" open={open}>
        <summary className="q2">{question}</summary>
        <p className="h" id="meaning-h">
          Look for peak or RMS, and for sideways (lateral) or one channel. It moves the result by 3 to 6 dB.
        </p>
        <Choice label={question} options={options} value={initial.meaning} field={field('meaning')} describedBy="meaning-h" />
      </details>
      <div aria-live="polite">
        {understood && <p className="und">{understood}</p>}
        {understood && atReference && <p className="note">{atReference}</p>}
        {understood && ifNotSaid && <p className="note">{ifNotSaid}</p>}
      </div>
    </div>
  )
}
