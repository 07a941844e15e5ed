import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { finishSignIn } from './awaiting-session'
import { takeRecoveryCode } from './recovery-codes'
import type { RecoveryCodeInput } from './schema'
import type { OpenedSession } from './sessions'

const WRONG = 'That is none of your recovery codes, or it was used already. Each works once.'

/** Finishes a sign-in with a recovery code in place of the authenticator's. @throws Fault sign_in, bad_input, too_many, not_allowed */
export function signInWithRecoveryCode(context: Context, { code }: RecoveryCodeInput): OpenedSession {
  return finishSignIn(context, { wrong: WRONG, prove: (tx, person) => takeRecoveryCode(tx, person.id, code, context.now) })
}
