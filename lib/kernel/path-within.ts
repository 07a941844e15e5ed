/** A path of this site, whatever was sent: a form or a link elsewhere must not choose where people land. */
export function pathWithin(back: unknown, otherwise = '/'): string {
  const base = 'http://here.invalid'
  if (typeof back !== 'string' || back === '' || !URL.canParse(back, base)) return otherwise
  const { origin, pathname, search } = new URL(back, base)
  return origin === base && !pathname.startsWith('//') ? `${pathname}${search}` : otherwise
}
