'use client'

import { Choice, type Option } from '@/components/forms/choice'
import { FieldRow } from '@/components/forms/field-row'
import { TroubleLine } from '@/components/forms/trouble-line'
import { UnitBox } from '@/components/forms/unit-box'
import type { ValueField as Field } from '@/lib/setups/terms'
import { fieldView } from '@/lib/setups/views-field'
import { useCheckForm } from './form-context'

const HOWS: readonly Option[] = [
  { value: 'one', label: 'One value' },
  { value: 'between', label: 'Between' },
  { value: 'unknown', label: "Don't know" },
]
const HOWS_WITH_ABOVE: readonly Option[] = [HOWS[0], HOWS[1], { value: 'above', label: 'Or more' }, HOWS[2]]

/**
 * A value as it may be known: one, between two, not at all. Which boxes are there follows the choice by style sheet,
 * so that it does without script as well.
 */
export function ValueField({
  field,
  question,
  help,
  className = '',
  beside,
  under,
}: {
  field: Field
  question: string
  help?: string
  className?: string
  /** In the row of the boxes: what else belongs to the value. */
  beside?: React.ReactNode
  under?: React.ReactNode
}) {
  return (
    <FieldRow id={field} question={question} help={help} className={`val ${className}`.trim()}>
      <ValueBoxes field={field} label={question} beside={beside} />
      {under}
    </FieldRow>
  )
}

export function ValueBoxes({ field, label, beside }: { field: Field; label: string; beside?: React.ReactNode }) {
  const { initial, raw, answers, type, field: tie, showsTrouble, apply } = useCheckForm()
  const view = fieldView(field, raw, answers, type)
  const [to, how] = [`${field}To`, `${field}How`] as const
  const trouble = showsTrouble([field, to]) ? view.trouble : null
  const isBad = (key: string) => trouble !== null && (trouble.key === key || (trouble.key === to && key === field))
  const ids = { trouble: `${field}-e`, note: `${field}-n` }
  const describedBy = `${ids.trouble} ${ids.note}`
  return (
    <>
      <div className="how">
        <Choice
          label={`How well is it known: ${label}`}
          options={field === 'load' ? HOWS_WITH_ABOVE : HOWS}
          value={initial[how] ?? 'one'}
          field={tie(how)}
        />
      </div>
      <div className="row vals">
        <UnitBox id={`${field}-box`} label={label} unit={view.unit} value={initial[field]} field={tie(field)} bad={isBad(field)} describedBy={describedBy} className="first" />
        <span className="lab to" aria-hidden="true">
          to
        </span>
        <UnitBox id={`${to}-box`} label={`${label}, second value`} unit={view.unit} value={initial[to]} field={tie(to)} bad={isBad(to)} describedBy={describedBy} className="second" />
        {beside}
      </div>
      <TroubleLine
        id={ids.trouble}
        sentence={trouble?.sentence ?? null}
        fix={
          trouble?.fix
            ? { label: trouble.fix.label, go: `fix:${trouble.key}`, apply: () => apply(trouble.fix?.set ?? {}, trouble.fix?.set[how] === 'unknown' ? how : field) }
            : null
        }
      />
      <div id={ids.note}>
        {view.understood && field !== 'output' && <p className="und vals">Understood: {view.understood}.</p>}
        {/* An output is understood with its groove speed, and says so below. */}
        {view.fromList && <p className="note vals">As printed, from our list.</p>}
        <p className="note if-unknown">{view.ifUnknown}</p>
      </div>
    </>
  )
}
