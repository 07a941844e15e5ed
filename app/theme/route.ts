import { cookies } from 'next/headers'
import { THEME_COOKIE, toTheme } from '@/lib/appearance/terms'
import { pathWithin } from '@/lib/kernel/path-within'

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
