'use server'

import { LinkInput } from '@/lib/accounts/schema'
import { signInWithLink } from '@/lib/accounts/sign-in-with-link'
import { action } from '@/lib/server/action'
import { enter } from '@/lib/server/enter'

export const signInWithLinkAction = action(LinkInput, signInWithLink, enter)
