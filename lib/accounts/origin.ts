/** Where a request came from: what a person may recognise a sign-in by, and what tries are counted by. */
export interface Origin {
  /** The network address, whole. Counted under a keyed hash; shown and kept only shortened. */
  address: string
  /** The browser's own line about itself. */
  userAgent: string
}

// First match wins: most browsers name others in their line as well.
const BROWSERS: [RegExp, string][] = [
  [/\bEdg(?:A|iOS)?\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\b(?:Firefox|FxiOS)\//, 'Firefox'],
  [/\b(?:Chrome|CriOS|Chromium|HeadlessChrome)\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
]
const SYSTEMS: [RegExp, string][] = [
  [/\b(?:iPhone|iPod)\b/, 'iPhone'],
  [/\biPad\b/, 'iPad'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\b(?:Macintosh|Mac OS X)\b/, 'Mac'],
  [/\bLinux\b/, 'Linux'],
]

/** A browser in words, such as "Firefox on Linux". Versions are left out: with them every update looks like a stranger. */
export function deviceWords(userAgent: string): string {
  const browser = BROWSERS.find(([mark]) => mark.test(userAgent))?.[1] ?? 'A browser we do not know'
  const system = SYSTEMS.find(([mark]) => mark.test(userAgent))?.[1]
  return system ? `${browser} on ${system}` : browser
}

/** An address with the part that names one connection taken off: the last figure of four, or all but the first three groups. */
export function shortOrigin(address: string): string {
  const four = /(?:^|:)(\d{1,3}\.\d{1,3}\.\d{1,3})\.\d{1,3}$/.exec(address)
  if (four) return `${four[1]}.x`
  if (!address.includes(':')) return 'unknown'
  const groups = address.split('%')[0].split(':')
  const gap = groups.indexOf('')
  return `${groups.slice(0, gap === -1 ? 3 : Math.min(gap, 3)).join(':')}::x`
}
