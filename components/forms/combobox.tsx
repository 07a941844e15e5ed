'use client'

import { useId, useRef, useState } from 'react'
import type { UseFormRegisterReturn } from 'react-hook-form'

export interface Suggestion {
  key: string
  name: string
  detail: string
}

/**
 * A text box with suggestions under it, after the combobox pattern of WAI-ARIA: arrows move, Enter takes, Escape
 * closes, and whatever is typed stays what it is. Without script it is a text box.
 */
export function Combobox<S extends Suggestion>({
  id,
  label,
  value,
  field,
  suggestions,
  status,
  onTake,
  onType,
  describedBy,
}: {
  id: string
  label: string
  /** What stands in it when the page arrives. */
  value: string | undefined
  field: UseFormRegisterReturn
  suggestions: readonly S[]
  /** Read out when the list changes: "Eight found." */
  status: string
  onTake: (suggestion: S) => void
  /** After each change by hand, not after taking a suggestion. */
  onType: (text: string) => void
  describedBy?: string
}) {
  const listId = useId()
  const [open, setOpen] = useState(false)
  const [at, setAt] = useState(-1)
  const list = useRef<HTMLUListElement>(null)
  const shown = open && suggestions.length > 0
  const active = shown && at >= 0 && at < suggestions.length ? at : -1

  const close = () => {
    setOpen(false)
    setAt(-1)
  }
  const take = (suggestion: S) => {
    close()
    onTake(suggestion)
  }
  const move = (to: number) => {
    setOpen(true)
    setAt(to)
    list.current?.children[to]?.scrollIntoView({ block: 'nearest' })
  }
  const onKeyDown = (event: React.KeyboardEvent) => {
    const last = suggestions.length - 1
    if (event.key === 'ArrowDown' && last >= 0) move(active >= last ? 0 : active + 1)
    else if (event.key === 'ArrowUp' && last >= 0) move(active <= 0 ? last : active - 1)
    else if (event.key === 'Enter' && active >= 0) take(suggestions[active])
    else if (event.key === 'Escape' && shown) close()
    else return
    event.preventDefault()
  }

  return (
    <div className="combo">
      <span className="in">
        <input
          {...field}
          id={id}
          type="text"
          role="combobox"
          aria-label={label}
          aria-autocomplete="list"
          aria-expanded={shown}
          aria-controls={listId}
          aria-activedescendant={active >= 0 ? `${listId}-${active}` : undefined}
          aria-describedby={describedBy}
          autoComplete="off"
          spellCheck={false}
          defaultValue={value}
          onChange={(event) => {
            void field.onChange(event)
            setOpen(true)
            setAt(-1)
            onType(event.target.value)
          }}
          onBlur={(event) => {
            void field.onBlur(event)
            close()
          }}
          onKeyDown={onKeyDown}
        />
      </span>
      <ul className="cbl" id={listId} role="listbox" aria-label={label} ref={list} hidden={!shown}>
        {suggestions.map((suggestion, index) => (
          <li
            key={suggestion.key}
            id={`${listId}-${index}`}
            role="option"
            aria-selected={index === active}
            // Before the box loses the focus, which would close the list under the finger.
            onPointerDown={(event) => event.preventDefault()}
            onClick={() => take(suggestion)}
          >
            <b>{suggestion.name}</b>
            <span>{suggestion.detail}</span>
          </li>
        ))}
      </ul>
      <span className="vh" role="status">
        {open ? status : ''}
      </span>
    </div>
  )
}
