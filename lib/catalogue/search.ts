import 'server-only'
import { and, asc, desc, eq, inArray, sql, type SQL } from 'drizzle-orm'
import { z } from 'zod'
import { catalogueEntries as entries } from '@/db/schema/catalogue'
import { Fault } from '../kernel/errors'
import { foldedWords } from '../kernel/text'
import type { Context } from '../kernel/context'
import { MAX_SEARCH_WORDS, type SearchedKind } from './terms'

/**
 * Finding entries by words typed in any order. A word matches anywhere, across the gaps between words too, so that
 * "no3", "No. 3" and "callowaywren" find what they mean. No index can look inside words, so every entry of a kind is
 * looked at; but only in the index, which holds all that matching and ranking need.
 */

/** How well a word fits: the whole word of a name, the start of one, inside the name, or only among the type's words. */
const FIT = { whole: 8, start: 6, inside: 3, elsewhere: 1 } as const
/** On top, when the name begins with what was typed, and when it is nothing else. */
const FIT_OF_ALL = { beginning: 4, same: 8 } as const

export interface FoundRows {
  rows: { id: string; data: string }[]
  /** Hand it back for the next page; null on the last. */
  next: string | null
}

const Cursor = z.tuple([z.number(), z.string(), z.string()])
type Cursor = z.infer<typeof Cursor>

const writeCursor = (cursor: Cursor) => Buffer.from(JSON.stringify(cursor)).toString('base64url')

/** @throws Fault bad_input when the text is not a cursor of ours */
function readCursor(text: string): Cursor {
  try {
    return Cursor.parse(JSON.parse(Buffer.from(text, 'base64url').toString()))
  } catch (cause) {
    const words = 'That is not a place in this list. Leave it out to begin at the top.'
    throw new Fault('bad_input', words, { fields: { cursor: words }, cause })
  }
}

function scoreOf(words: string[]): SQL<number> {
  if (words.length === 0) return sql<number>`0`
  const name = sql`(' ' || ${entries.sortName} || ' ')`
  const nameTight = sql`replace(${entries.sortName}, ' ', '')`
  const all = words.join('')
  const each = words.map(
    (word) => sql`case
      when instr(${name}, ${` ${word} `}) > 0 then ${FIT.whole}
      when instr(${name}, ${` ${word}`}) > 0 then ${FIT.start}
      when instr(${nameTight}, ${word}) > 0 then ${FIT.inside}
      else ${FIT.elsewhere} end`,
  )
  const whole = sql`case
    when ${nameTight} = ${all} then ${FIT_OF_ALL.same}
    when instr(${nameTight}, ${all}) = 1 then ${FIT_OF_ALL.beginning}
    else 0 end`
  return sql<number>`(${sql.join([...each, whole], sql` + `)})`
}

/** Beyond the cursor, in the order of the list. Without words the score is the same everywhere and stays out. */
function isAfter(score: SQL<number>, words: string[], [lastScore, lastName, lastId]: Cursor): SQL {
  const { sortName, id } = entries
  if (words.length === 0) return sql`(${sortName}, ${id}) > (${lastName}, ${lastId})`
  return sql`(-${score}, ${sortName}, ${id}) > (${-lastScore}, ${lastName}, ${lastId})`
}

interface SearchTerms {
  text: string
  /** Only rows of one of these types. */
  types?: string[]
  limit: number
  cursor?: string
}

/**
 * Rows of a kind that hold every word of the text, best fit first, then by name; without a text, all by name.
 * @throws Fault bad_input for a cursor that is not ours
 */
export function searchRows({ db }: Pick<Context, 'db'>, kind: SearchedKind, { text, types, limit, cursor }: SearchTerms): FoundRows {
  const words = foldedWords(text).slice(0, MAX_SEARCH_WORDS)
  if (words.length === 0 && text.trim() !== '') return { rows: [], next: null }
  const score = scoreOf(words)
  const { sortName, id } = entries
  const after = cursor === undefined ? undefined : readCursor(cursor)
  const found = db
    .select({ id, sortName, score })
    .from(entries)
    .where(
      and(
        eq(entries.kind, kind),
        types && inArray(entries.type, types),
        ...words.map((word) => sql`instr(${entries.searchTight}, ${word}) > 0`),
        after && isAfter(score, words, after),
      ),
    )
    .orderBy(...(words.length > 0 ? [desc(score)] : []), asc(sortName), asc(id))
    .limit(limit + 1)
    .all()
  const page = found.slice(0, limit)
  const last = page.at(-1)
  const next = found.length > limit && last ? writeCursor([last.score, last.sortName, last.id]) : null
  return { rows: dataOf(db, page.map((row) => row.id)), next }
}

/** The data of these rows, in their order. Fetched apart, so that the search itself runs in the index. */
function dataOf(db: Context['db'], ids: string[]): FoundRows['rows'] {
  const known = new Map(
    db
      .select({ id: entries.id, data: entries.data })
      .from(entries)
      .where(inArray(entries.id, ids))
      .all()
      .map((row) => [row.id, row] as const),
  )
  return ids.flatMap((one) => known.get(one) ?? [])
}
