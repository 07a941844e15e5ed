import type { FindingCode, Gate, VerdictKind, Weight } from '../match/result'
import type { UnknownName } from '../match/inputs'
import { countWord, sentenceCase } from '../setups/format'
import { UNKNOWN_WORDS } from '../setups/sentences/unknowns'
import type { SheetSearch } from './schema'
import type { OwnedCartridgeView, UnitView } from './views'
import type { Compared } from './views-compare'

/** Things of a shelf in the few words of a table. */

const SHORT_FINDINGS: Record<FindingCode, string> = {
  'headroom-tight': 'little room on loud records',
  'headroom-loud-records': 'little room on the loudest records',
  'level-low': 'the volume sits high',
  'level-high': 'the volume sits low',
  'next-input-tight': 'close to what the next input takes',
  'load-below-recommended': 'a lower load than it asks for',
  'load-above-recommended': 'a higher load than it asks for',
  'load-near-coil': 'the load costs a little level',
  'capacitance-low': 'less capacitance than it asks for',
  'capacitance-high': 'more capacitance than it asks for',
  'treble-lift': 'lifts the treble',
  'treble-fall': 'the treble falls',
  hiss: 'hiss comes close to the groove',
  'arm-resonance-low': 'a heavy arm for it',
  'arm-resonance-high': 'a light arm for it',
  'cable-loss': 'the cable costs treble',
  'bass-loss': 'loses the deepest bass',
  'double-step-up': 'two transformers in a row',
  'step-up-into-mc': 'the transformer goes into MM',
  'two-phono-stages': 'equalised twice',
  'magnet-into-mc': 'too strong for an MC input',
  'current-input': 'takes current, not voltage',
  'not-magnetic': 'not a magnetic cartridge',
  'strapped-mono': 'mono: it may see half the load',
}

/** The same where it rules the cartridge out. */
const RULED_OUT: Partial<Record<FindingCode, string>> = {
  'headroom-tight': 'distorts on loud records',
  'headroom-loud-records': 'distorts on loud records',
  'level-low': 'too quiet',
  'level-high': 'too loud',
  'next-input-tight': 'too loud for the next input',
  'load-near-coil': 'the load takes too much level',
  hiss: 'too much hiss',
}

/** These say why it cannot be: what follows from them, such as too little level, does not. */
const CAUSES: ReadonlySet<FindingCode> = new Set(['double-step-up', 'step-up-into-mc', 'two-phono-stages', 'magnet-into-mc'])

/** What a revision's one thing worth knowing rests on. */
export interface Gist {
  verdict: VerdictKind
  gate: Gate['reason'] | null
  next: UnknownName | null
  /** Of the setting it shows, the heaviest first. */
  findings: { code: FindingCode; worst: Weight }[]
}

/** The one thing worth knowing: the number to find while nothing can be said, else the heaviest finding. */
export function worthKnowing({ verdict, gate, next, findings }: Gist): string {
  if (gate) return SHORT_FINDINGS[gate]
  if (verdict === 'cannot-say') return next ? `find: ${UNKNOWN_WORDS[next].ask.replace(/^the /, '')}` : ''
  const first = findings.find(({ code }) => CAUSES.has(code)) ?? findings[0]
  if (!first || first.worst === 'fine') return ''
  return (verdict === 'does-not-suit' && first.worst === 'rules-it-out' && RULED_OUT[first.code]) || SHORT_FINDINGS[first.code]
}

/** "380 hours", "one hour", "12.5 hours"; empty where nobody counts. */
export function hoursText({ stylusHours }: Pick<OwnedCartridgeView, 'stylusHours'>): string {
  if (stylusHours === null) return ''
  return stylusHours === 1 ? 'one hour' : `${stylusHours} hours`
}

/** What a unit is called in a row: by its owner's name for it, else by its model. */
export function unitTitle({ name, model }: Pick<UnitView, 'name' | 'model'>): string {
  return name ?? model.name
}

/** "Tarn 2, serial ending 418"; the model only where the owner's name for it stands above. */
export function unitNote({ name, model, serialEnding }: Pick<UnitView, 'name' | 'model' | 'serialEnding'>): string {
  const parts = [name ? model.name : '', serialEnding ? `serial ending ${serialEnding}` : '']
  return parts.filter(Boolean).join(', ')
}

const MONTHS = 'January February March April May June July August September October November December'.split(' ')

/** "11 March", with the year where it is not this one. In UTC, as everywhere. */
export function dayInYear(milliseconds: number, now: number): string {
  const day = new Date(milliseconds)
  const words = `${day.getUTCDate()} ${MONTHS[day.getUTCMonth()]}`
  return day.getUTCFullYear() === new Date(now).getUTCFullYear() ? words : `${words} ${day.getUTCFullYear()}`
}

/** "Two preamps, four cartridges". */
export function shelfHeading(units: number, cartridges: number): string {
  const preamps = units === 1 ? 'one preamp' : `${countWord(units)} preamps`
  return sentenceCase(`${preamps}, ${cartridges === 1 ? 'one cartridge' : `${countWord(cartridges)} cartridges`}`)
}

/** Longest note that stands under a cartridge's name in a table. */
const MOST_LETTERS = 44

/** What stands under a cartridge's name: its hours, and how its notes begin. */
export function cartridgeNote(cartridge: Pick<OwnedCartridgeView, 'stylusHours' | 'notes'>): string {
  const [line] = cartridge.notes.split('\n')
  const short = line.length > MOST_LETTERS ? `${line.slice(0, MOST_LETTERS).replace(/\s+\S*$/, '')} ...` : line
  return [hoursText(cartridge), short].filter(Boolean).join('. ')
}

/** "as you told us, 11 March", "after sheet 4471, B, on 12 March". */
export function standingNote({ since, source, sheet }: NonNullable<UnitView['standing']>, now: number): string {
  const day = dayInYear(since, now)
  if (source === 'told') return `as you told us, ${day}`
  return sheet ? `as sheet ${sheet.number} asked, ${day}` : `as a sheet asked, ${day}`
}

/** The address of a page of all sheets, without what stands at its default anyway. */
export function sheetsPath({ q, show, order, page }: SheetSearch): string {
  const query = new URLSearchParams({
    ...(q && { q }),
    ...(show !== 'kept' && { show }),
    ...(order !== 'newest' && { order }),
    ...(page > 1 && { page: String(page) }),
  }).toString()
  return query ? `/shelf/sheets?${query}` : '/shelf/sheets'
}

/** The address where two revisions stand side by side; each is a sheet's code and a letter. */
export function comparePath(a: { code: string; letter: string }, b: { code: string; letter: string }, shown?: Compared): string {
  return `/shelf/compare?a=${a.code}.${a.letter}&b=${b.code}.${b.letter}${shown ? `&as=${shown}` : ''}`
}
