import { cookies } from 'next/headers'
import { THEME_COOKIE, toTheme } from '@/lib/appearance/terms'

const ONE_YEAR_SECONDS = 365 * 24 * 60 * 60

/** Keeps the choice in a cookie and goes back to the page it was made on. */
export async function POST(request: Request) {
  const form = await request.formData()
  const theme = toTheme(form.get('theme'))
  const jar = await cookies()
  if (theme === 'system') jar.delete(THEME_COOKIE)
  else jar.set(THEME_COOKIE, theme, { path: '/', maxAge: ONE_YEAR_SECONDS, sameSite: 'lax', httpOnly: true })
  return new Response(null, { status: 303, headers: { Location: pathWithin(form.get('back')) } })
}

/** A path of this site, whatever was sent: a form elsewhere must not choose where people land. */
function pathWithin(back: unknown): string {
  const base = 'http://here.invalid'
  if (typeof back !== 'string' || !URL.canParse(back, base)) return '/'
  const { origin, pathname, search } = new URL(back, base)
  return origin === base && !pathname.startsWith('//') ? `${pathname}${search}` : '/'
}
