import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { finishSignIn } from './awaiting-session'
import type { CodeInput } from './schema'
import { confirmedFactor, takeCode } from './second-factor'
import type { OpenedSession } from './sessions'

const WRONG = 'That code does not fit, or was used already. The app shows a new one every half minute.'

/** Finishes a sign-in with a code from the authenticator. @throws Fault sign_in, bad_input, too_many, not_allowed */
export function checkSecondFactor(context: Context, { code }: CodeInput): OpenedSession {
  return finishSignIn(context, {
    wrong: WRONG,
    prove: (tx, person) => {
      const factor = confirmedFactor(tx, person.id)
      return factor !== undefined && takeCode(tx, factor, code, context.now)
    },
  })
}
