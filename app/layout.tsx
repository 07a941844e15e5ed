import type { Metadata, Viewport } from 'next'
import { cookies, headers } from 'next/headers'
import { Footer } from '@/components/shell/footer'
import { Masthead } from '@/components/shell/masthead'
import { can } from '@/lib/access/permit'
import { THEME_COOKIE, toTheme } from '@/lib/appearance/terms'
import { requestActor } from '@/lib/server/request-context'
import './globals.css'

export const metadata: Metadata = {
  title: { default: 'Oskerby set-up service', template: '%s · Oskerby set-up service' },
  description: 'Find out whether a cartridge suits your Oskerby preamp, and which switches to set.',
}

export const viewport: Viewport = { width: 'device-width', initialScale: 1, colorScheme: 'light dark' }

export default async function RootLayout({ children }: { children: React.ReactNode }) {
  // Reading the request keeps every page from being made at build time: such a page has no nonce, and its
  // scripts are refused.
  await headers()
  const actor = await requestActor()
  const present = actor.kind === 'person' ? { name: actor.name, workshop: can(actor, 'workshop:enter') } : null
  const theme = toTheme((await cookies()).get(THEME_COOKIE)?.value)
  return (
    <html lang="en-GB" data-theme={theme === 'system' ? undefined : theme} suppressHydrationWarning>
      <body>
        <a className="skip" href="#main">
          Skip to content
        </a>
        <Masthead present={present} />
        {children}
        <Footer theme={theme} />
      </body>
    </html>
  )
}
