'use server'

import { askForReset } from '@/lib/accounts/ask-for-reset'
import { AddressInput } from '@/lib/accounts/schema'
import { action } from '@/lib/server/action'

export const askForResetAction = action(AddressInput, askForReset, (_done, { email }) => ({
  words: `If ${email} has an account, a mail with a link is on its way. The link opens once, and lasts an hour.`,
}))
