import { useId } from 'react'

/** A name for the patterns and clips of one drawing, safe inside `url(#…)` and the same on server and client. */
export function usePlotId(): string {
  return `p${useId().replace(/[^a-zA-Z0-9]/g, '')}`
}
