interface Props {
  id: string
  name: string
  label: string
  begin: string
  options: readonly (readonly [value: string, words: string])[]
  error?: string
}

/** One of a list, under its label. */
export function Pick({ id, name, label, begin, options, error }: Props) {
  return (
    <div className="tf">
      <label htmlFor={id}>{label}</label>
      <select key={begin} id={id} name={name} defaultValue={begin} aria-invalid={error ? true : undefined} aria-describedby={error ? `${id}-error` : undefined}>
        {options.map(([value, words]) => (
          <option key={value} value={value}>
            {words}
          </option>
        ))}
      </select>
      {error && (
        <p className="err" id={`${id}-error`}>
          {error}
        </p>
      )}
    </div>
  )
}
