/** Milliseconds since 1970, UTC. Every time in the database is one of these. */
export type Milliseconds = number

/** The one place that reads the machine's clock for a request. Tests hand in a fixed time instead. */
export function currentTime(): Milliseconds {
  return Date.now()
}
