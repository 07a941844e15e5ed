'use client'

import { Choice, type Option } from '@/components/forms/choice'
import { FieldRow } from '@/components/forms/field-row'
import { fieldView, lengthNote } from '@/lib/setups/views-field'
import { useCheckForm } from './form-context'
import { PlainBox, PlainTrouble } from './plain-field'

const WAYS: readonly Option[] = [
  { value: 'whole', label: 'In pF' },
  { value: 'metres', label: 'By length' },
  { value: 'unknown', label: "Don't know" },
]
const KEYS = {
  lead: { as: 'leadAs', metres: 'leadMetres', perMetre: 'leadPerMetre' },
  cable: { as: 'cableAs', metres: 'cableMetres', perMetre: 'cablePerMetre' },
} as const

/** Capacitance of a lead or cable: said outright, reckoned from its length, or not known. */
export function WireField({
  which,
  question,
  help,
  children,
}: {
  which: 'lead' | 'cable'
  question: string
  help: string
  /** Above the choice: looking it up by name. */
  children?: React.ReactNode
}) {
  const { initial, raw, answers, type, field } = useCheckForm()
  const { as, metres, perMetre } = KEYS[which]
  const note = lengthNote(which, answers)
  return (
    <FieldRow id={which} question={question} help={help} className="wire">
      {children}
      <div className="how">
        <Choice label={`How well is it known: ${question}`} options={WAYS} value={initial[as] ?? 'whole'} field={field(as)} />
      </div>
      <div className="in-whole">
        <PlainBox field={which} label={`${question}, capacitance`} />
        <PlainTrouble field={which} />
      </div>
      <div className="in-metres">
        <div className="row">
          <PlainBox field={metres} label={`${question}, length`} />
          <span className="lab" aria-hidden="true">
            of
          </span>
          <PlainBox field={perMetre} label={`${question}, capacitance of a metre`} />
        </div>
        <PlainTrouble field={metres} />
        <PlainTrouble field={perMetre} />
        <p className="note">{note ?? fieldView(perMetre, raw, answers, type).ifUnknown}</p>
      </div>
      <p className="note if-unknown">{fieldView(which, raw, answers, type).ifUnknown}</p>
    </FieldRow>
  )
}
