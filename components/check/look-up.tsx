'use client'

import { useState } from 'react'
import { Combobox, type Suggestion } from '@/components/forms/combobox'
import type { SearchedKind } from '@/lib/catalogue/terms'
import type { AnswersInput } from '@/lib/setups/schema'
import type { AnswerKey } from '@/lib/setups/terms'
import { useCheckForm } from './form-context'
import { useLookUp } from './use-look-up'

export interface Pickable extends Suggestion {
  fill: (answers: AnswersInput) => AnswersInput
}

/** A name, looked up in the catalogue while it is typed. Taking one fills in what is printed about it. */
export function LookUp<View>({
  kind,
  type,
  name,
  idKey,
  label,
  shown = false,
  filledNote,
  pickables,
}: {
  kind: SearchedKind
  /** Only entries of this type. */
  type?: string
  /** Under which the name travels, and the id of the entry it was taken from. */
  name: AnswerKey
  idKey: AnswerKey
  label: string
  /** Whether the label stands over the box: where no question beside it says the same. */
  shown?: boolean
  filledNote: string
  pickables: (entry: View) => Pickable[]
}) {
  const { initial, raw, field, apply } = useCheckForm()
  const [text, setText] = useState('')
  const { entries, settled } = useLookUp<View>(kind, text, type)
  const found = entries.flatMap(pickables)
  const status = !settled ? '' : found.length === 0 ? 'Nothing in our list by that name.' : `${found.length} in our list.`
  return (
    <div className="lookup">
      {shown && (
        <label className="lab" htmlFor={`${name}-box`}>
          {label}
        </label>
      )}
      <Combobox
        id={`${name}-box`}
        label={label}
        value={initial[name]}
        field={field(name)}
        suggestions={found}
        status={text.trim() === '' ? '' : status}
        onType={(typed) => {
          setText(typed)
          // By another name it is another thing; its values stay until they are changed.
          if (raw[idKey]) apply({ [idKey]: '' })
        }}
        onTake={(taken) => {
          setText('')
          apply(taken.fill(raw))
        }}
        describedBy={`${name}-n`}
      />
      <div id={`${name}-n`} aria-live="polite">
        {raw[idKey] && <p className="note">{filledNote}</p>}
      </div>
      <noscript>
        <p className="note">
          <button className="lnk" type="submit" name="go" value={`look-up:${name}`}>
            Look it up in our list
          </button>
        </p>
      </noscript>
    </div>
  )
}
