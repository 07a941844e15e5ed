'use client'

import { Choice, type Option } from '@/components/forms/choice'
import { FieldRow } from '@/components/forms/field-row'
import type { InputView } from '@/lib/catalogue/views'
import { answersFromInput } from '@/lib/setups/schema-picked'
import { useCheckForm } from './form-context'
import { LookUp, type Pickable } from './look-up'
import { More } from './more'
import { PlainBox, PlainTrouble } from './plain-field'
import { ValueField } from './value-field'
import { WireField } from './wire-field'

const KINDS: readonly Option[] = [
  { value: 'line', label: 'Amplifier' },
  { value: 'digital', label: 'Digital input' },
  { value: 'recorder', label: 'Recorder' },
  { value: 'headphones', label: 'Headphone stage' },
  { value: 'phono', label: 'Phono input' },
  { value: 'unknown', label: "Don't know" },
]
const OUTPUTS: readonly Option[] = [
  { value: 'unbalanced', label: 'Unbalanced' },
  { value: 'balanced', label: 'Balanced' },
]

const inputs = (view: InputView): Pickable[] => [
  {
    key: view.id,
    name: view.name,
    detail: view.maximumVolts ? `takes ${view.maximumVolts.nominal} V` : 'its limit is not printed',
    fill: (answers) => answersFromInput(view, answers),
  },
]

/** What the preamp plays into, its cable, and the rare answers of that end. */
export function PlaysIntoFields({ hasBalancedOutput }: { hasBalancedOutput: boolean }) {
  const { initial, raw, field } = useCheckForm()
  const filled = Boolean(raw.alsoAmplifier || raw.alsoRecorder || raw.alsoSubwoofer || raw.wish)
  return (
    <div className="nxi">
      <FieldRow id="next" question="What is it?" help="The input that the preamp's cable goes to.">
        <Choice label="What is it?" options={KINDS} value={initial.next} field={field('next')} wrap="three" />
        <div aria-live="polite">
          {raw.next === 'phono' && (
            <p className="note">That makes two phono stages in a row. You can go on, and the sheet says what it does.</p>
          )}
        </div>
      </FieldRow>
      <FieldRow id="nextName" question="Name">
        <LookUp<InputView>
          kind="inputs"
          name="nextName"
          idKey="nextId"
          label="Name"
          filledNote="Found in our list. What is printed about it is filled in below."
          pickables={inputs}
        />
      </FieldRow>
      <ValueField field="nextMax" question="The most it takes" help="In V RMS, before it distorts. In its manual as maximum input." />
      <ValueField field="nextLoad" question="Input resistance" help="In its manual as input impedance." />
      <WireField which="cable" question="Cable" help="From the preamp to the amplifier." />
      {hasBalancedOutput && (
        <FieldRow id="out" question="Output" help="The balanced one gives twice the voltage, 6 dB more.">
          <Choice label="Output" options={OUTPUTS} value={initial.out ?? 'unbalanced'} field={field('out')} />
        </FieldRow>
      )}
      <More filled={filled}>
        <Also />
        <FieldRow id="wish" question="Level you wish for" help="Usual level at the amplifier. Left empty it is 300 to 1000 mV.">
          <PlainBox field="wish" label="Level you wish for" />
          <PlainTrouble field="wish" />
        </FieldRow>
      </More>
    </div>
  )
}

const ALSO = [
  { field: 'alsoAmplifier', name: 'Another amplifier' },
  { field: 'alsoRecorder', name: 'A recorder' },
  { field: 'alsoSubwoofer', name: 'A subwoofer' },
] as const

function Also() {
  return (
    <FieldRow id="also" question="On the same output" help="Other inputs at the same time, with their input resistance.">
      {ALSO.map(({ field, name }) => (
        <div className="alo" key={field}>
          <label className="lab" htmlFor={`${field}-box`}>
            {name}
          </label>
          <PlainBox field={field} label={`${name}, input resistance`} />
          <PlainTrouble field={field} />
        </div>
      ))}
    </FieldRow>
  )
}
