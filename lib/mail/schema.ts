import { z } from 'zod'

export const SendAgainInput = z.object({ mailId: z.string().min(1).max(60) })
export type SendAgainInput = z.infer<typeof SendAgainInput>

export const SendAllAgainInput = z.object({ status: z.enum(['queued', 'given_up']) })
export type SendAllAgainInput = z.infer<typeof SendAllAgainInput>
