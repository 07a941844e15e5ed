import type { UseFormRegisterReturn } from 'react-hook-form'

/** A box for a number with its unit inside. It takes any text: what was meant is read, never forced. */
export function UnitBox({
  id,
  label,
  unit,
  value,
  field,
  bad = false,
  describedBy,
  className = '',
}: {
  id: string
  label: string
  unit: string
  /** What stands in it when the page arrives. */
  value: string | undefined
  field: UseFormRegisterReturn
  bad?: boolean
  describedBy?: string
  className?: string
}) {
  return (
    <span className={['in', bad ? 'bad' : '', className].filter(Boolean).join(' ')}>
      <input
        {...field}
        id={id}
        type="text"
        inputMode="text"
        autoComplete="off"
        spellCheck={false}
        defaultValue={value}
        aria-label={label}
        aria-invalid={bad || undefined}
        aria-describedby={describedBy}
      />
      {unit && (
        <span className="u" aria-hidden="true">
          {unit}
        </span>
      )}
    </span>
  )
}
