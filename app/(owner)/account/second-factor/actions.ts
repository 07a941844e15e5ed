'use server'

import { beginSecondFactor } from '@/lib/accounts/begin-second-factor'
import { confirmSecondFactor } from '@/lib/accounts/confirm-second-factor'
import { removeSecondFactor } from '@/lib/accounts/remove-second-factor'
import { BeginSecondFactorInput, CodeInput, ProofInput } from '@/lib/accounts/schema'
import { action } from '@/lib/server/action'

export const beginSecondFactorAction = action(BeginSecondFactorInput, beginSecondFactor, () => ({ go: '/account/second-factor' }))

export const confirmSecondFactorAction = action(CodeInput, confirmSecondFactor, ({ recoveryCodes }) => ({
  words: 'From now on a code is asked for. These are for the day your phone is gone: each works once, and they are shown only now.',
  shown: recoveryCodes,
}))

export const removeSecondFactorAction = action(ProofInput, removeSecondFactor, () => ({ go: '/account' }))
