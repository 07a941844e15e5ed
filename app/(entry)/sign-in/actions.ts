'use server'

import { EnterInput } from '@/lib/accounts/schema'
import { signIn } from '@/lib/accounts/sign-in'
import { action } from '@/lib/server/action'
import { enter } from '@/lib/server/enter'

export const signInAction = action(EnterInput, signIn, (result, texts) => ('sentTo' in result ? { words: sent(result.sentTo) } : enter(result, texts)))

function sent(email: string) {
  return `We have sent a link to ${email}. It opens once, and lasts twenty minutes. If it does not come, look among unwanted mail.`
}
