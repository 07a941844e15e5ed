'use server'

import { acceptInvitation } from '@/lib/accounts/accept-invitation'
import { AcceptInvitationInput } from '@/lib/accounts/schema'
import { action } from '@/lib/server/action'
import { enter } from '@/lib/server/enter'

export const acceptInvitationAction = action(AcceptInvitationInput, acceptInvitation, enter)
