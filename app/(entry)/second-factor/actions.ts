'use server'

import { checkSecondFactor } from '@/lib/accounts/check-second-factor'
import { CodeInput, RecoveryCodeInput } from '@/lib/accounts/schema'
import { signInWithRecoveryCode } from '@/lib/accounts/sign-in-with-recovery-code'
import { action } from '@/lib/server/action'
import { enter } from '@/lib/server/enter'

export const checkSecondFactorAction = action(CodeInput, checkSecondFactor, enter)

export const recoveryCodeAction = action(RecoveryCodeInput, signInWithRecoveryCode, enter)
