'use server'

import { confirmAddress } from '@/lib/accounts/confirm-address'
import { ConfirmAddressInput } from '@/lib/accounts/schema'
import { action } from '@/lib/server/action'
import { enter } from '@/lib/server/enter'

export const confirmAddressAction = action(ConfirmAddressInput, confirmAddress, enter)
