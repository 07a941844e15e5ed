'use server'

import { resetPassword } from '@/lib/accounts/reset-password'
import { ResetPasswordInput } from '@/lib/accounts/schema'
import { action } from '@/lib/server/action'

export const resetPasswordAction = action(ResetPasswordInput, resetPassword, () => ({ go: '/sign-in?set=password' }))
