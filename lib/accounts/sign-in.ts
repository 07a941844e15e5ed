import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { askForLink } from './ask-for-link'
import type { Origin } from './origin'
import type { EnterInput } from './schema'
import type { OpenedSession } from './sessions'
import { signInWithPassword } from './sign-in-with-password'

/** Either way in, by the button that was pressed. @throws Fault as the two verbs do */
export async function signIn(context: Context, input: EnterInput, origin: Origin): Promise<OpenedSession | { sentTo: string }> {
  if (input.how === 'password') return signInWithPassword(context, input, origin)
  askForLink(context, input, origin)
  return { sentTo: input.email }
}
