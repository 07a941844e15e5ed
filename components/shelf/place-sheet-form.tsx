'use client'

import { useActionState } from 'react'
import { FormWords } from '@/components/forms/form-words'
import { UNTOUCHED, type FormAction } from '@/lib/forms/terms'
import { Pick } from './pick'

type Options = readonly (readonly [value: string, words: string])[]

interface Props {
  action: FormAction
  number: number
  unitId: string | null
  cartridgeId: string | null
  units: Options
  cartridges: Options
}

/** Which of their things a sheet is about: where it stands in the table. */
export function PlaceSheetForm({ action, number, unitId, cartridgeId, units, cartridges }: Props) {
  const [{ words, fields, done }, send, pending] = useActionState(action, UNTOUCHED)
  return (
    <form action={send} className="shf">
      <input type="hidden" name="number" value={number} />
      <Pick id="place-unit" name="unitId" label="Preamp" begin={unitId ?? ''} options={[...units, ['', 'None of mine']]} error={fields.unitId} />
      <Pick id="place-cartridge" name="cartridgeId" label="Cartridge" begin={cartridgeId ?? ''} options={[...cartridges, ['', 'None of mine']]} />
      <FormWords words={done ? null : words} />
      <button className="b" type="submit" disabled={pending}>
        Keep this
      </button>
    </form>
  )
}
