import type { HTMLInputAutoCompleteAttribute } from 'react'
import { VerdictMark } from '@/components/ui/verdict-mark'
import type { FieldWiring } from './use-action-form'

interface Props {
  wiring: FieldWiring
  label: string
  hint?: string
  type?: 'text' | 'email' | 'password'
  inputMode?: 'numeric' | 'email'
  autoComplete: HTMLInputAutoCompleteAttribute
  /** What stands in it before anyone typed. */
  begin?: string
}

/** A labelled box for a line of text. What is wrong stands under it, and is read out with it. */
export function TextField({ wiring: { id, field, value, error }, label, hint, type = 'text', inputMode, autoComplete, begin }: Props) {
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ')
  return (
    <div className="tf">
      <label htmlFor={id}>{label}</label>
      {hint && (
        <p className="h" id={`${id}-hint`}>
          {hint}
        </p>
      )}
      <span className={error ? 'in bad' : 'in'}>
        <input
          {...field}
          id={id}
          type={type}
          inputMode={inputMode}
          autoComplete={autoComplete}
          autoCapitalize={type === 'text' ? undefined : 'none'}
          spellCheck={false}
          defaultValue={value ?? begin}
          aria-invalid={error ? true : undefined}
          aria-describedby={described || undefined}
        />
      </span>
      {error && (
        <p className="err" id={`${id}-error`}>
          <VerdictMark mark="error" />
          <span>{error}</span>
        </p>
      )}
    </div>
  )
}
