import { SESSION_LASTS_MS } from '@/lib/accounts/terms'

const DAY_MS = 24 * 60 * 60_000

const daysOf = (ms: number) => Math.round(ms / DAY_MS)

/** What an account keeps, thing by thing. */
export function AccountKept() {
  return (
    <dl>
      <dt>You</dt>
      <dd>Your name as you give it, your mail address, and when you joined.</dd>
      <dt>Password</dt>
      <dd>A scrambled form of it, from which nobody can read it back. A link by mail signs you in without it.</dd>
      <dt>Where you sign in</dt>
      <dd>
        Browser and device in words, such as “Firefox on Linux”, your network address with its end cut off, and when. A
        sign-in lasts {daysOf(SESSION_LASTS_MS.owner)} days, for the workshop’s people {daysOf(SESSION_LASTS_MS.staff)}.
        We forget it 90 days after that.
      </dd>
      <dt>Your preamps</dt>
      <dd>Model, serial number, when and where you bought it, and how its switches stand. All but the model can be left out.</dd>
      <dt>Your cartridges</dt>
      <dd>Their values, hours on the stylus, and your notes.</dd>
      <dt>Your sheets</dt>
      <dd>Which are yours, what you named them, and every revision.</dd>
    </dl>
  )
}
