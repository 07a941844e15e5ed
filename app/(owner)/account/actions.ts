'use server'

import { refresh } from 'next/cache'
import { askForDeletion } from '@/lib/accounts/ask-for-deletion'
import { askToChangeAddress } from '@/lib/accounts/ask-to-change-address'
import { changeName } from '@/lib/accounts/change-name'
import { changePassword } from '@/lib/accounts/change-password'
import { endAllSessions } from '@/lib/accounts/end-all-sessions'
import { endSession } from '@/lib/accounts/end-session'
import { AddressInput, AskForDeletionInput, ChangeNameInput, ChangePasswordInput, NothingInput, SessionInput } from '@/lib/accounts/schema'
import { signOut } from '@/lib/accounts/sign-out'
import { takeBackDeletion } from '@/lib/accounts/take-back-deletion'
import { action } from '@/lib/server/action'
import { clearSessionCookie } from '@/lib/server/session-cookie'

/** The same page again, as it now is. */
const again = () => ({ go: '/account' })

async function leave() {
  await clearSessionCookie()
  return { go: '/' }
}

export const changeNameAction = action(ChangeNameInput, changeName, () => {
  refresh()
  return { words: 'Kept.' }
})

export const changeAddressAction = action(AddressInput, askToChangeAddress, (_done, { email }) => ({
  words: `Two mails are on their way: one here, one to ${email}. Follow the link in each.`,
}))

export const changePasswordAction = action(ChangePasswordInput, changePassword, () => ({
  words: 'Your new password is set. Everywhere else you are signed out.',
}))

export const endSessionAction = action(SessionInput, endSession, again)

export const endAllSessionsAction = action(NothingInput, endAllSessions, leave)

export const signOutAction = action(NothingInput, signOut, leave)

export const askForDeletionAction = action(AskForDeletionInput, askForDeletion, again)

export const takeBackDeletionAction = action(NothingInput, takeBackDeletion, again)
