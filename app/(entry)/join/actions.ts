'use server'

import { join } from '@/lib/accounts/join'
import { JoinInput } from '@/lib/accounts/schema'
import { action } from '@/lib/server/action'

export const joinAction = action(JoinInput, join, (_done, { email }) => ({
  words: `We have sent a mail to ${email}. Its link makes your account. If it does not come, look among unwanted mail.`,
}))
