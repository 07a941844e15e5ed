import Link from 'next/link'
import type { TokenPurpose } from '@/lib/accounts/terms'
import type { LinkState } from '@/lib/accounts/views'

/** Where a new link of each kind can be had. */
export const AGAIN: Record<TokenPurpose, { href: string; words: string }> = {
  confirm: { href: '/join', words: 'Join once more' },
  link: { href: '/sign-in', words: 'Send a new one' },
  reset: { href: '/reset-password', words: 'Send a new one' },
  invite: { href: '/sign-in', words: 'Sign in' },
  'change-address-old': { href: '/account', words: 'Go to your account' },
  'change-address-new': { href: '/account', words: 'Go to your account' },
}

const TITLES: Record<Exclude<LinkState, 'open'>, string> = {
  used: 'This link was used already',
  expired: 'This link has run out',
  unknown: 'This link opens nothing',
}
const REASONS: Record<Exclude<LinkState, 'open'>, string> = {
  used: 'Each link opens once, and a newer one makes those before it void.',
  expired: 'Links last a short time, so that an old mail opens nothing.',
  unknown: 'A part of it may be missing. Copy the whole line from the mail.',
}

/** What stands behind a link that opens nothing, and where a new one is. */
export function LinkTrouble({ state, purpose }: { state: Exclude<LinkState, 'open'>; purpose: TokenPurpose }) {
  const { href, words } = AGAIN[purpose]
  return (
    <>
      <h1>{TITLES[state]}</h1>
      <p>{REASONS[state]}</p>
      <Link className="b" href={href}>
        {words}
      </Link>
    </>
  )
}
