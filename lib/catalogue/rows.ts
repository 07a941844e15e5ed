import { createHash } from 'node:crypto'
import type { catalogueEntries } from '@/db/schema/catalogue'
import { foldedWords } from '../kernel/text'
import { ArmEntry, CartridgeEntry, InputEntry, LeadEntry, StepUpEntry } from './schema'
import { PreampEntry } from './schema-preamp'
import type { CatalogueKind } from './terms'

export const ENTRY_SCHEMAS = {
  preamps: PreampEntry,
  cartridges: CartridgeEntry,
  arms: ArmEntry,
  'step-ups': StepUpEntry,
  leads: LeadEntry,
  inputs: InputEntry,
} as const

export interface EntryOf {
  preamps: PreampEntry
  cartridges: CartridgeEntry
  arms: ArmEntry
  'step-ups': StepUpEntry
  leads: LeadEntry
  inputs: InputEntry
}
type Entry = EntryOf[CatalogueKind]

type NewRow = typeof catalogueEntries.$inferInsert
export type EntryColumns = Omit<NewRow, 'demoHash' | 'createdAt' | 'updatedAt'>

/** Short names that people type instead of the type's words. */
const TYPE_WORDS: Record<string, string> = {
  'moving-magnet': 'moving magnet mm',
  'moving-iron': 'moving iron mi',
  'moving-coil': 'moving coil mc',
  ceramic: 'ceramic',
  'strain-gauge': 'strain gauge',
  optical: 'optical',
}

function typeOf(entry: Entry): string | null {
  if ('type' in entry) return entry.type
  if ('use' in entry) return entry.use
  return 'kind' in entry ? entry.kind : null
}

function searchWords(entry: Entry): string {
  const type = typeOf(entry)
  const more = 'groove' in entry ? [entry.variety, entry.channels, entry.groove === 'coarse' ? '78' : ''] : []
  return [entry.maker, entry.name, type && (TYPE_WORDS[type] ?? type), ...more].filter(Boolean).join(' ')
}

/**
 * The columns of an entry, its data checked against the schema of its kind.
 * @throws ZodError when the entry describes something impossible
 */
export function toColumns(kind: CatalogueKind, given: unknown): EntryColumns {
  const entry: Entry = ENTRY_SCHEMAS[kind].parse(given)
  return {
    id: entry.id,
    kind,
    type: typeOf(entry),
    maker: entry.maker,
    name: entry.name,
    sortName: foldedWords(`${entry.maker} ${entry.name}`).join(' '),
    searchTight: foldedWords(searchWords(entry)).join(''),
    data: JSON.stringify(entry),
  }
}

/**
 * The entry out of a row's data.
 * @throws ZodError when the row holds something that its schema does not allow
 */
export function readEntry<Kind extends CatalogueKind>(kind: Kind, data: string): EntryOf[Kind] {
  // Each schema gives the entry of its own kind; the compiler cannot follow the pairing through the index.
  return ENTRY_SCHEMAS[kind].parse(JSON.parse(data)) as EntryOf[Kind]
}

/** A fixed mark of a row's data, to tell whether anyone changed it since. */
export function hashOf(data: string): string {
  return createHash('sha256').update(data).digest('hex')
}
