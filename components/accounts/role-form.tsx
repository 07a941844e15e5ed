'use client'

import { useActionState } from 'react'
import { FormWords } from '@/components/forms/form-words'
import { ROLE_WORDS } from '@/lib/accounts/format'
import type { Role } from '@/lib/accounts/terms'
import type { PersonView } from '@/lib/accounts/views'
import { UNTOUCHED, type FormAction } from '@/lib/forms/terms'

interface Props {
  action: FormAction
  person: Pick<PersonView, 'id' | 'name' | 'role'>
  roles: readonly Role[]
}

/** Makes someone owner, staff or admin. */
export function RoleForm({ action, person, roles }: Props) {
  const [{ words, done }, send, pending] = useActionState(action, UNTOUCHED)
  return (
    <form action={send} className="inline pick">
      <input type="hidden" name="personId" value={person.id} />
      {/* Made anew when the role is another one, so that it shows what now is. */}
      <select key={person.role} name="role" defaultValue={person.role} aria-label={`Role of ${person.name}`}>
        {roles.map((role) => (
          <option key={role} value={role}>
            {ROLE_WORDS[role]}
          </option>
        ))}
      </select>
      <button type="submit" className="b sm" disabled={pending} aria-label={`Change the role of ${person.name}`}>
        {pending ? 'One moment' : 'Change'}
      </button>
      <FormWords words={done ? null : words} />
    </form>
  )
}
