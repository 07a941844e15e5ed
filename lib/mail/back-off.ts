import type { Milliseconds } from '@/lib/kernel/clock'

const MINUTE = 60_000
const FIRST_WAIT_MS = 1 * MINUTE
/** A server that is back is found within this. */
const LONGEST_WAIT_MS = 6 * 60 * MINUTE
/** Each wait is up to so much shorter or longer, so that mail held up together does not come back together. */
const JITTER = 0.2

/** With the waits below, four days: RFC 5321, 4.5.4.1 asks for four to five before a mail is given up. */
export const MOST_ATTEMPTS = 25

/**
 * How long to wait after so many failed attempts: a minute, doubled each time, six hours at most, give or take a fifth.
 * @param random from 0 up to 1
 */
export function waitAfter(attempts: number, random: number): Milliseconds {
  const wait = Math.min(FIRST_WAIT_MS * 2 ** (attempts - 1), LONGEST_WAIT_MS)
  return Math.round(wait * (1 + JITTER * (2 * random - 1)))
}
