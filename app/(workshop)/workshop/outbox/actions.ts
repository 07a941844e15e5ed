'use server'

import { revalidatePath } from 'next/cache'
import { SendAgainInput, SendAllAgainInput } from '@/lib/mail/schema'
import { sendAgain, sendAllAgain } from '@/lib/mail/send-again'
import { action } from '@/lib/server/action'

const OUTBOX = '/workshop/outbox'

export const sendAgainAction = action(SendAgainInput, sendAgain, () => {
  revalidatePath(OUTBOX)
  return { words: 'It is tried now.' }
})

export const sendAllAgainAction = action(SendAllAgainInput, sendAllAgain, () => {
  revalidatePath(OUTBOX)
  return { words: 'They are tried now.' }
})
