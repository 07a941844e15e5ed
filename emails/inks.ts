/** The inks of the pages, written out: a mail has no stylesheet to ask. Held to those of the pages by a test. */
export const LIGHT = {
  paper: '#e9ece6',
  ink: '#271a2b',
  ink2: '#5b4c60',
  rule: '#837886',
  hair: '#c6c6c4',
  spot: '#e5a913',
  act: '#7a1f59',
} as const

export const DARK = {
  paper: '#1b151e',
  ink: '#efe9e2',
  ink2: '#b8abba',
  rule: '#7c7080',
  hair: '#453b49',
  spot: '#e9b431',
  act: '#eba6d2',
} as const

/** Text and lines on solid mustard, light or dark. */
export const ON_SPOT = '#271a2b'

/** Inline styles win over a stylesheet, so each of these says so. The classes stand beside the inline styles. */
export const DARK_AND_NARROW = `
@media (prefers-color-scheme: dark) {
  .paper { background-color: ${DARK.paper} !important }
  .ink { color: ${DARK.ink} !important }
  .ink2 { color: ${DARK.ink2} !important }
  .edge { border-color: ${DARK.ink} !important }
  .rule { border-color: ${DARK.rule} !important }
  .hair { border-color: ${DARK.hair} !important }
  .spot { background-color: ${DARK.spot} !important }
  .act { color: ${DARK.act} !important }
  .button { background-color: ${DARK.ink} !important; color: ${DARK.paper} !important }
}
@media (max-width: 480px) {
  .pad { padding-left: 18px !important; padding-right: 18px !important }
  .head { font-size: 30px !important; line-height: 32px !important }
  .button { display: block !important; text-align: center !important }
}
`
