'use server'

import { confirmAddressChange, type AddressChange } from '@/lib/accounts/confirm-address-change'
import { LinkInput } from '@/lib/accounts/schema'
import { action } from '@/lib/server/action'

const said = ({ done, newAddress }: AddressChange) => ({
  words: done
    ? `The address of your account is ${newAddress} now.`
    : `Now follow the link in the other mail as well. Once both have said yes, the address of your account is ${newAddress}.`,
})

export const confirmFromOldAction = action(LinkInput, (context, input, origin) => confirmAddressChange(context, { ...input, end: 'old' }, origin), said)

export const confirmFromNewAction = action(LinkInput, (context, input, origin) => confirmAddressChange(context, { ...input, end: 'new' }, origin), said)
