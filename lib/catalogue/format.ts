import type { PreampView } from './views'

/** Catalogue entries in the words of lists. */

const inList = (words: string[], last: 'and' | 'or') =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} ${last} ${words[words.length - 1]}`

/** "MM and MC". */
export function takesInWords({ takes }: Pick<PreampView, 'takes'>): string {
  return inList(takes.map((id) => id.toUpperCase()), 'and')
}

/** "40 dB, one gain", "40 or 62 dB", "36 to 66 dB". */
export function gainsInWords({ gainDecibels }: Pick<PreampView, 'gainDecibels'>): string {
  if (gainDecibels.length === 1) return `${gainDecibels[0]} dB, one gain`
  if (gainDecibels.length === 2) return `${gainDecibels.join(' or ')} dB`
  return `${gainDecibels[0]} to ${gainDecibels[gainDecibels.length - 1]} dB`
}

const kilohms = (ohms: number) => (ohms >= 1000 ? `${ohms / 1000} kΩ` : `${ohms} Ω`)

/** What there is to set, in a few words: "Two banks of 8 switches", "Load plugs, 10 Ω to 1 kΩ", "Fixed 47 kΩ, 100 pF". */
export function controlsInWords(preamp: Pick<PreampView, 'controls' | 'technology' | 'baseLoadOhms' | 'basePicofarads'>): string {
  const { controls, technology, baseLoadOhms, basePicofarads } = preamp
  if (controls.length === 0) return `Fixed ${kilohms(baseLoadOhms)}, ${basePicofarads} pF`
  const bank = controls.find(({ kind }) => kind === 'bank')
  if (bank) return `Two banks of ${bank.count} switches`
  const plugs = controls.find(({ kind }) => kind === 'plugs')
  if (plugs) return `${plugs.label} plugs, ${plugs.labels[0]} to ${plugs.labels[plugs.labels.length - 1]}`
  const place = controls[0].place === 'front' ? 'front ' : ''
  const what = controls[0].kind === 'slide' ? 'slides' : 'buttons'
  const words = `${place}${what}`
  return technology === 'valve' ? `Valves, ${words}` : words[0].toUpperCase() + words.slice(1)
}
