/** What an owner may choose for the look of the pages; `system` follows the device. */
export const THEMES = ['light', 'dark', 'system'] as const

export type Theme = (typeof THEMES)[number]

export const THEME_WORDS: Record<Theme, string> = { light: 'Light', dark: 'Dark', system: 'As the system' }

export const THEME_COOKIE = 'theme'

/** The choice behind a cookie's or a form's text; anything else follows the device. */
export function toTheme(text: unknown): Theme {
  return THEMES.find((theme) => theme === text) ?? 'system'
}
