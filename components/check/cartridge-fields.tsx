'use client'

import { Choice, type Option } from '@/components/forms/choice'
import { FieldRow } from '@/components/forms/field-row'
import { TroubleLine } from '@/components/forms/trouble-line'
import type { CartridgeView } from '@/lib/catalogue/views'
import { answersFromCartridge } from '@/lib/setups/schema-picked'
import { useCheckForm } from './form-context'
import { LookUp, type Pickable } from './look-up'
import { More } from './more'
import { OutputField } from './output-field'
import { ValueField } from './value-field'

const TYPES: readonly Option[] = [
  { value: 'moving-magnet', label: 'Moving magnet' },
  { value: 'moving-iron', label: 'Moving iron' },
  { value: 'moving-coil', label: 'Moving coil' },
  { value: 'other', label: 'Something else' },
  { value: 'unknown', label: "Don't know" },
]
const OTHERS: readonly Option[] = [
  { value: 'ceramic', label: 'Ceramic or crystal' },
  { value: 'strain-gauge', label: 'Strain gauge' },
  { value: 'optical', label: 'Optical' },
]
const CONDITIONS: readonly Option[] = [
  { value: '10-hz', label: '10 Hz' },
  { value: '100-hz', label: '100 Hz' },
  { value: 'static', label: 'Static' },
  { value: 'not-said', label: 'Not said' },
]
const CHANNELS: readonly Option[] = [
  { value: 'no', label: 'Stereo' },
  { value: 'yes', label: 'Mono' },
]
const TYPE_WORDS: Record<CartridgeView['type'], string> = {
  'moving-magnet': 'Moving magnet',
  'moving-iron': 'Moving iron',
  'moving-coil': 'Moving coil',
  ceramic: 'Ceramic or crystal',
  'strain-gauge': 'Strain gauge',
  optical: 'Optical',
}

function pickables(view: CartridgeView): Pickable[] {
  const output = view.outputMillivolts ? `, ${view.outputMillivolts.printed}` : ''
  return [
    {
      key: view.id,
      name: view.name,
      detail: `${TYPE_WORDS[view.type]}${output}`,
      fill: (answers) => answersFromCartridge(view, answers),
    },
  ]
}

/** Everything that is asked about the cartridge. What a type is not asked is hidden by style sheet, and kept. */
export function CartridgeFields() {
  const { raw } = useCheckForm()
  const filled = Boolean(raw.mass || raw.compliance || raw.force || raw.mono === 'yes')
  return (
    <div className="crt">
      <FieldRow id="name" question="Name">
        <LookUp<CartridgeView>
          kind="cartridges"
          name="name"
          idKey="cart"
          label="Name"
          filledNote="Found in our list. What its leaflet says is filled in below. Check it against yours."
          pickables={pickables}
        />
      </FieldRow>
      <TypeField />
      <OutputField />
      <ValueField field="coil" question="Coil resistance" help="DC resistance of one coil, where the leaflet has it." className="mag" />
      <ValueField field="inductance" question="Inductance" help="Sets where the treble begins to fall." className="mag" />
      <ValueField field="load" question="Maker's load" help="The resistance that the maker asks the preamp to be." className="mag" />
      <ValueField
        field="capacitance"
        question="Maker's capacitance"
        help="The total that the maker asks for: arm, lead and preamp together."
        className="mag not-coil"
      />
      <More filled={filled}>
        <ValueField field="mass" question="Weight" help="Of the cartridge, without its screws." className="mag" />
        <ValueField
          field="compliance"
          question="Compliance"
          help="How soft the stylus is held. It decides where arm and cartridge resonate."
          className="mag"
          beside={<ComplianceAt />}
        />
        <ValueField field="force" question="Tracking force" help="What the maker asks for, in g or mN." className="mag" />
        <Channels />
      </More>
    </div>
  )
}

function TypeField() {
  const { initial, raw, field, answers, showsTrouble, apply } = useCheckForm()
  const missing = raw.type === 'other' && answers.cartridge.type === 'unknown' && showsTrouble(['other'])
  return (
    <FieldRow id="type" question="Type" help="If the stylus pulls out of the body, it is nearly always a magnet or an iron.">
      <Choice label="Type" options={TYPES} value={initial.type} field={field('type')} wrap />
      <div className="which-other">
        <Choice label="Which of the three" options={OTHERS} value={initial.other} field={field('other')} wrap />
      </div>
      <TroubleLine
        id="other-e"
        sentence={missing ? "Say which of the three it is, or choose Don't know." : null}
        fix={{ label: "Choose Don't know", go: 'fix:other', apply: () => apply({ type: 'unknown' }, 'type') }}
      />
      <p className="note">Something else: ceramic or crystal, strain gauge, optical. They get their own answer.</p>
    </FieldRow>
  )
}

function ComplianceAt() {
  const { initial, field } = useCheckForm()
  return (
    <div className="spd">
      <span className="lab at" aria-hidden="true">
        at
      </span>
      <Choice label="Measured at" options={CONDITIONS} value={initial.complianceAt} field={field('complianceAt')} />
    </div>
  )
}

function Channels() {
  const { initial, field } = useCheckForm()
  return (
    <FieldRow id="mono" question="Channels" help="A mono cartridge may have its pins joined; the sheet says what that does.">
      <Choice label="Channels" options={CHANNELS} value={initial.mono ?? 'no'} field={field('mono')} />
    </FieldRow>
  )
}
