'use client'

import { FormWords } from '@/components/forms/form-words'
import { TextField } from '@/components/forms/text-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { ROLE_WORDS } from '@/lib/accounts/format'
import { InviteInput } from '@/lib/accounts/schema'
import { INVITED_ROLES } from '@/lib/accounts/terms'
import type { FormAction } from '@/lib/forms/terms'
import { Said } from './said'

/** Lets someone into the workshop, by a mail with a link. */
export function InviteForm({ action }: { action: FormAction }) {
  const { state, pending, form, field } = useActionForm(InviteInput, action)
  const role = field('role')
  return (
    <form {...form} className="afm">
      <TextField wiring={field('email')} label="Mail address" type="email" autoComplete="off" />
      <fieldset className="tf">
        <legend className="vh">Role</legend>
        <div className="seg">
          {INVITED_ROLES.map((each) => (
            <label key={each}>
              <input type="radio" {...role.field} value={each} defaultChecked={each === (role.value ?? 'staff')} />
              {ROLE_WORDS[each]}
            </label>
          ))}
        </div>
      </fieldset>
      <FormWords words={state.done ? null : state.words} />
      <button className="b pri" type="submit" disabled={pending}>
        Send the invitation
      </button>
      <Said words={state.done ? state.words : null} />
    </form>
  )
}
