'use client'

import { TroubleLine } from '@/components/forms/trouble-line'
import { UnitBox } from '@/components/forms/unit-box'
import type { PlainField as Field } from '@/lib/setups/terms'
import { fieldView } from '@/lib/setups/views-field'
import { useCheckForm } from './form-context'

/** A number in one box; a range may be typed into it as well. What is wrong with it stands in `PlainTrouble`. */
export function PlainBox({ field, label }: { field: Field; label: string }) {
  const { initial, raw, answers, type, field: tie, showsTrouble } = useCheckForm()
  const { unit, trouble } = fieldView(field, raw, answers, type)
  return (
    <UnitBox
      id={`${field}-box`}
      label={label}
      unit={unit}
      value={initial[field]}
      field={tie(field)}
      bad={trouble !== null && showsTrouble([field])}
      describedBy={`${field}-e`}
    />
  )
}

export function PlainTrouble({ field }: { field: Field }) {
  const { raw, answers, type, showsTrouble, apply } = useCheckForm()
  const { understood, trouble: found } = fieldView(field, raw, answers, type)
  const trouble = showsTrouble([field]) ? found : null
  return (
    <>
      <TroubleLine
        id={`${field}-e`}
        sentence={trouble?.sentence ?? null}
        fix={trouble?.fix ? { label: trouble.fix.label, go: `fix:${trouble.key}`, apply: () => apply(trouble.fix?.set ?? {}, field) } : null}
      />
      {understood && <p className="und">Understood: {understood}.</p>}
    </>
  )
}
