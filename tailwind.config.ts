import type { Config } from 'tailwindcss'
import plugin from 'tailwindcss/plugin'

type Inks = Record<string, string>

/** Two inks on tinted stock: one dark ink, one mustard spot. What each may mean is in DEVELOPERS.md. */
export const lightInks: Inks = {
  '--paper': '#e9ece6',
  '--plot': '#f7f8f4',
  '--sunk': '#dde1da',
  '--ink': '#271a2b',
  '--ink2': '#5b4c60',
  '--rule': '#837886',
  '--hair': '#c6c6c4',
  '--spot': '#e5a913',
  '--spotd': '#7d5600',
  '--tint': '#f4dc9c',
  '--act': '#7a1f59',
  '--actink': '#f7f8f4',
  '--warn': '#8c3a00',
  '--lw': '#ffffff',
  '--lb': '#1f56c0',
  '--lr': '#c2271f',
  '--lg': '#17793a',
  '--scr': '1.4',
}

export const darkInks: Inks = {
  '--paper': '#1b151e',
  '--plot': '#231c27',
  '--sunk': '#130f16',
  '--ink': '#efe9e2',
  '--ink2': '#b8abba',
  '--rule': '#7c7080',
  '--hair': '#453b49',
  '--spot': '#e9b431',
  '--spotd': '#f0c352',
  '--tint': '#4b3a1c',
  '--act': '#eba6d2',
  '--actink': '#1b151e',
  '--warn': '#ffb37a',
  '--lw': '#ffffff',
  '--lb': '#6f9dff',
  '--lr': '#ff7a70',
  '--lg': '#55c27a',
  '--scr': '1.1',
}

/** The light inks on white, whatever the screen was set to. */
export const printInks: Inks = {
  ...lightInks,
  '--paper': '#ffffff',
  '--plot': '#ffffff',
  '--sunk': '#eeeeee',
  '--ink': '#1b1220',
  '--ink2': '#4c4151',
  '--hair': '#cccccc',
}

/** Text and lines on solid mustard, in both themes. */
export const ON_SPOT = '#271a2b'

const families = {
  text: '"Sofia Sans", sans-serif',
  data: '"Sofia Sans Condensed", sans-serif',
  head: '"Sofia Sans Extra Condensed", sans-serif',
  article: '"Literata", serif',
}

/** Page padding, width of the words column and the gap beside it. */
const measures = {
  full: { '--pad': '60px', '--mar': '268px', '--gap': '44px' },
  narrow: { '--mar': '210px', '--gap': '32px' },
  phone: { '--pad': '18px', '--gap': '14px' },
  print: { '--mar': '190px', '--gap': '18px' },
}

const NARROW = '(min-width: 821px) and (max-width: 1180px)'
const PHONE = '(max-width: 820px)'

const customProperties = plugin(({ addBase }) => {
  addBase({
    ':root': {
      ...lightInks,
      ...measures.full,
      '--onspot': ON_SPOT,
      '--ft': families.text,
      '--fc': families.data,
      '--fx': families.head,
      '--fr': families.article,
      'color-scheme': 'light',
    },
    '@media screen and (prefers-color-scheme: dark)': {
      ':root:not([data-theme="light"])': { ...darkInks, 'color-scheme': 'dark' },
    },
    '@media screen': { ':root[data-theme="dark"]': { ...darkInks, 'color-scheme': 'dark' } },
    [`@media screen and ${NARROW}`]: { ':root': measures.narrow },
    [`@media screen and ${PHONE}`]: { ':root': measures.phone },
    '@media print': { ':root': { ...printInks, ...measures.print } },
  })
})

const ink = (name: string) => `var(--${name})`

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    screens: {
      phone: { max: '820px' },
      narrow: { min: '821px', max: '1180px' },
      full: '1181px',
    },
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: ink('paper'),
      plot: ink('plot'),
      sunk: ink('sunk'),
      ink: ink('ink'),
      ink2: ink('ink2'),
      rule: ink('rule'),
      hair: ink('hair'),
      spot: ink('spot'),
      spotd: ink('spotd'),
      tint: ink('tint'),
      act: ink('act'),
      warn: ink('warn'),
      onspot: ink('onspot'),
    },
    fontFamily: { text: families.text, data: families.data, head: families.head, article: families.article },
    spacing: { 0: '0', 1: '4px', 2: '8px', 3: '12px', 4: '16px', 6: '24px', 8: '32px', 11: '44px', 16: '64px' },
    borderRadius: { none: '0', key: '2px' },
    boxShadow: {},
  },
  plugins: [customProperties],
}

export default config
