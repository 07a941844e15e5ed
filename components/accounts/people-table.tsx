import { PressForm } from '@/components/forms/press-form'
import { dayWords, ROLE_WORDS } from '@/lib/accounts/format'
import { ROLES } from '@/lib/accounts/terms'
import type { PersonView } from '@/lib/accounts/views'
import type { FormAction } from '@/lib/forms/terms'
import { RoleForm } from './role-form'

interface Props {
  people: PersonView[]
  changeRole: FormAction
  disable: FormAction
  enable: FormAction
}

/** Everyone with an account, and what an admin can do about each. */
export function PeopleTable({ people, changeRole, disable, enable }: Props) {
  return (
    <table className="lst" aria-labelledby="people">
      <thead>
        <tr>
          <th scope="col">Who</th>
          <th scope="col">Role</th>
          <th scope="col">Authenticator</th>
          <th scope="col">Last seen</th>
          <th scope="col">Account</th>
        </tr>
      </thead>
      <tbody>
        {people.map((person) => (
          <tr key={person.id} className={person.disabled ? 'closed' : undefined} aria-current={person.self || undefined}>
            <td data-label="Who">
              <b>{person.name}</b>
              <span className="sub">{person.email}</span>
            </td>
            <td data-label="Role">{person.self ? ROLE_WORDS[person.role] : <RoleForm action={changeRole} person={person} roles={ROLES} />}</td>
            <td data-label="Authenticator">{person.hasSecondFactor ? 'Yes' : 'No'}</td>
            <td data-label="Last seen">{person.lastSeenAt ? dayWords(person.lastSeenAt) : 'Never'}</td>
            <td data-label="Account">
              {standing(person)}
              {!person.self && (
                <PressForm
                  action={person.disabled ? enable : disable}
                  values={{ personId: person.id }}
                  label={`${person.disabled ? 'Open' : 'Close'} the account of ${person.name}`}
                >
                  {person.disabled ? 'Open it' : 'Close it'}
                </PressForm>
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}

function standing({ self, disabled, deletesAt }: PersonView): string {
  if (self) return 'Yours'
  if (disabled) return 'Closed'
  return deletesAt === null ? 'Open' : `Goes on ${dayWords(deletesAt)}`
}
