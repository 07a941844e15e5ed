'use server'

import { changeRole } from '@/lib/accounts/change-role'
import { disablePerson } from '@/lib/accounts/disable-person'
import { enablePerson } from '@/lib/accounts/enable-person'
import { invitePerson } from '@/lib/accounts/invite-person'
import { ChangeRoleInput, InviteInput, PersonInput } from '@/lib/accounts/schema'
import { action } from '@/lib/server/action'

const again = () => ({ go: '/workshop/people' })

export const inviteAction = action(InviteInput, invitePerson, (_done, { email }) => ({
  words: `An invitation is on its way to ${email}. It lasts a week.`,
}))

export const changeRoleAction = action(ChangeRoleInput, changeRole, again)

export const disableAction = action(PersonInput, disablePerson, again)

export const enableAction = action(PersonInput, enablePerson, again)
