'use client'

import { Choice, type Option } from '@/components/forms/choice'
import { FieldRow } from '@/components/forms/field-row'
import type { ArmView, LeadView, StepUpView } from '@/lib/catalogue/views'
import { answersFromArm, answersFromLead, answersFromStepUp } from '@/lib/setups/schema-picked'
import { useCheckForm } from './form-context'
import { LookUp, type Pickable } from './look-up'
import { More } from './more'
import { ValueField } from './value-field'
import { WireField } from './wire-field'

const YES_NO: readonly Option[] = [
  { value: 'no', label: 'No' },
  { value: 'yes', label: 'Yes' },
]

const arms = (view: ArmView): Pickable[] => [
  {
    key: view.id,
    name: view.name,
    detail: view.effectiveMassGrams ? `${view.effectiveMassGrams.nominal} g` : 'Mass not printed',
    fill: (answers) => answersFromArm(view, answers),
  },
]

const stepUps = (view: StepUpView): Pickable[] =>
  view.taps.map((tap) => ({
    key: `${view.id} ${tap.id}`,
    name: view.name,
    detail: tap.label,
    fill: (answers) => answersFromStepUp(view, tap, answers),
  }))

const leads = (view: LeadView): Pickable[] =>
  view.lengths.map((length) => ({
    key: `${view.id} ${length.metres}`,
    name: view.name,
    detail: `${length.metres} m${length.picofarads ? `, ${Math.round(length.picofarads.nominal)} pF` : ''}`,
    fill: (answers) => answersFromLead(view, length, answers),
  }))

/** Arm, arm lead and the owner's own transformer. */
export function ArmFields() {
  const { initial, raw, field } = useCheckForm()
  return (
    <>
      <FieldRow id="arm" question="Arm" help="Or the deck, where the arm belongs to it.">
        <LookUp<ArmView>
          kind="arms"
          name="arm"
          idKey="armId"
          label="Arm"
          filledNote="Found in our list. What is printed about it is filled in below."
          pickables={arms}
        />
      </FieldRow>
      <ValueField field="armMass" question="Effective mass" help="Of the arm, without cartridge and screws. It is in the arm's manual." />
      <ValueField field="armWiring" question="Arm wiring" help="Capacitance of the wire inside the arm." />
      <WireField which="lead" question="Arm lead" help="From the arm to the preamp. With magnets and irons it shapes the treble.">
        <LookUp<LeadView>
          kind="leads"
          type="arm-lead"
          name="leadName"
          idKey="leadId"
          label="Name of the arm lead"
          shown
          filledNote="Found in our list. Its capacitance is filled in below."
          pickables={leads}
        />
      </WireField>
      <div className="sup">
        <FieldRow id="stepUp" question="Step-up transformer" help="A box of your own between arm and preamp, for a moving coil.">
          <Choice label="Step-up transformer" options={YES_NO} value={initial.stepUp ?? 'no'} field={field('stepUp')} />
          <div className="with-step-up">
            <LookUp<StepUpView>
              kind="step-ups"
              name="stepUpName"
              idKey="stepUpId"
              label="Name of the step-up"
              shown
              filledNote="Found in our list. What is printed about it is filled in below."
              pickables={stepUps}
            />
          </div>
        </FieldRow>
        <div className="with-step-up">
          <ValueField field="ratio" question="Ratio" help="As 1:10, as gain in dB, or the label, such as 150 : 50k." />
          <More filled={Boolean(raw.primaryCoil || raw.secondaryCoil || raw.primaryInductance || raw.stepUpLead)} title="Its windings, if you have them">
            <ValueField field="primaryCoil" question="Primary winding" help="As printed. Do not measure it: a meter can magnetise the core." />
            <ValueField field="secondaryCoil" question="Secondary winding" help="As printed." />
            <ValueField field="primaryInductance" question="Primary inductance" help="Sets where the bass begins to fall." />
            <ValueField field="stepUpLead" question="Lead after it" help="Capacitance of the lead from the step-up to the preamp." />
          </More>
        </div>
      </div>
      <More filled={Boolean(raw.fixings)}>
        <ValueField field="fixings" question="Screws and nuts" help="What holds the cartridge, in g." />
      </More>
    </>
  )
}
