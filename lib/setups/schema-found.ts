import { z } from 'zod'
import { UNKNOWNS } from '../match/inputs'
import { ASKED_MEANINGS, MAX_ANSWER_LENGTH, VELOCITIES } from './terms'

const SAY_IT = 'Type what stands there, such as 0.4.'

/** The number to find next, as typed on a sheet; with an output, what its cm/s mean. */
export const FoundNumberInput = z.object({
  code: z.string().min(1),
  unknown: z.enum(UNKNOWNS),
  value: z.string().trim().min(1, SAY_IT).max(MAX_ANSWER_LENGTH, `At most ${MAX_ANSWER_LENGTH} characters.`).optional(),
  velocity: z.enum(VELOCITIES).optional(),
  meaning: z.enum(ASKED_MEANINGS).optional(),
})
export type FoundNumberInput = z.infer<typeof FoundNumberInput>
