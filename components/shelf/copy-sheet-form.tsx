'use client'

import { useActionState } from 'react'
import { FormWords } from '@/components/forms/form-words'
import { UNTOUCHED, type FormAction } from '@/lib/forms/terms'
import { Pick } from './pick'

/** A new check with everything as here but the cartridge. */
export function CopySheetForm({ action, number, cartridges }: { action: FormAction; number: number; cartridges: readonly (readonly [value: string, words: string])[] }) {
  const [{ words }, send, pending] = useActionState(action, UNTOUCHED)
  return (
    <form action={send} className="shf">
      <input type="hidden" name="number" value={number} />
      {cartridges.length > 0 && <Pick id="copy-cartridge" name="cartridgeId" label="With which cartridge" begin="" options={[['', 'Another one, asked next'], ...cartridges]} />}
      <FormWords words={words} />
      <button className="b" type="submit" disabled={pending}>
        Start a check from this sheet
      </button>
    </form>
  )
}
