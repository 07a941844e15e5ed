import type { Role, SignInWay } from './terms'

const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })
const TIME = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone: 'UTC' })

/** "6 March 2026". */
export function dayWords(time: number): string {
  return DAY.format(time)
}

/** "6 March 2026, 10:30 UTC": the server does not know where its reader is, so it says which clock it means. */
export function timeWords(time: number): string {
  return `${DAY.format(time)}, ${TIME.format(time)} UTC`
}

export const ROLE_WORDS: Record<Role, string> = { owner: 'Owner', staff: 'Staff', admin: 'Admin' }

export const WAY_WORDS: Record<SignInWay, string> = { password: 'with a password', link: 'with a link', invitation: 'by invitation' }
