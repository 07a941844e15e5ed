import type { UseFormRegisterReturn } from 'react-hook-form'

export interface Option {
  value: string
  label: string
}

/** One of a few, as a row of radio buttons. Works without script; with it, `field` ties it to the form. */
export function Choice({
  label,
  options,
  value,
  field,
  wrap = false,
  describedBy,
}: {
  /** What is chosen, for those who cannot see where it stands. */
  label: string
  options: readonly Option[]
  /** What is chosen when the page arrives. */
  value: string | undefined
  field: UseFormRegisterReturn
  /** Two in a row on a phone; `three` also stands three in a row where there is more place. */
  wrap?: boolean | 'three'
  describedBy?: string
}) {
  return (
    <div className={['seg', wrap && 'wr', wrap === 'three' && 'wr3'].filter(Boolean).join(' ')} role="radiogroup" aria-label={label} aria-describedby={describedBy}>
      {options.map((option) => (
        <label key={option.value}>
          <input type="radio" {...field} value={option.value} defaultChecked={option.value === value} />
          {option.label}
        </label>
      ))}
    </div>
  )
}
