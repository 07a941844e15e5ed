import { dayText } from '@/lib/setups/format'

/** What lies in the archive and what does not, for whoever opens it. */
export function readMe({ name, email, now, sheets }: { name: string; email: string; now: number; sheets: number }): string {
  return `Everything that the Oskerby set-up service holds about ${name}, ${email}
Made on ${dayText(now)} at ${new Date(now).toISOString().slice(11, 16)} UTC.

What lies in here
  account.json      Your account: address, name, role, when you joined, what links we sent you and when.
                    Your authenticators and how many recovery codes are left, without the codes.
  sessions.json     Where you are and were signed in: device, origin (shortened), when.
  units.json        Your preamps with their whole serial numbers, what you told us of them, and how they stood,
                    step by step. This is the one place where a serial number leaves us. Keep it to yourself.
  cartridges.json   Your cartridges: the values of their leaflets as you gave them, stylus hours, notes.
  mails.json        Mail to your present address: what was sent and when, and its text where it is kept.
  sheets.json       A list of your sheets, ${sheets} in all, with their numbers and codes.
  sheets/<number>/sheet.txt    The sheet to read, every revision of it.
  sheets/<number>/sheet.json   The same for a program: what you answered, what we reckoned with, what came out.

Units in the JSON
  Times are ISO 8601, UTC. Answers are as typed. Inputs and results are in SI units (volts, ohms, henries, farads,
  hertz, kilograms, metres per newton) and decibels; where a limit is open it reads null. A range has low, nominal
  and high. The left and right of a unit are short texts, such as bank.10000010: switch 1 first, 1 is ON.

What is not in here
  Your password, the secret of your authenticator and the codes: we keep only what we need to check them, and that is
  of no use to you or anybody.
  Counts of how often something was tried, which are kept without names and thrown out after minutes or hours.
  Sheets that you made and did not put on your shelf: nobody's name is on them. Their codes open them.
`
}
