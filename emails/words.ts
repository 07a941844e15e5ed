const MINUTES_PER_HOUR = 60
const MINUTES_PER_DAY = 24 * MINUTES_PER_HOUR

const several = (count: number, one: string) => `${count} ${one}${count === 1 ? '' : 's'}`

/** A length of time in the largest unit that says it whole: "15 minutes", "1 hour", "7 days". */
export function inWords(minutes: number): string {
  if (minutes % MINUTES_PER_DAY === 0) return several(minutes / MINUTES_PER_DAY, 'day')
  if (minutes % MINUTES_PER_HOUR === 0) return several(minutes / MINUTES_PER_HOUR, 'hour')
  return several(minutes, 'minute')
}

/** "Friday 6 March 2026". Where the reader is nobody knows, so it is the day in UTC. */
export function day(at: number): string {
  return new Intl.DateTimeFormat('en-GB', { weekday: 'long', day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })
    .format(at)
    .replaceAll(',', '')
}

/** "Friday 6 March 2026, 10:30 UTC". */
export function dayAndTime(at: number): string {
  const time = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone: 'UTC' }).format(at)
  return `${day(at)}, ${time} UTC`
}
