import { z } from 'zod'
import {
  INPUT_KINDS,
  LEAD_USES,
  LISTED_CARTRIDGE_TYPES,
  MAX_FOUND,
  MAX_SEARCH_LETTERS,
  SEARCHED_KINDS,
  USUAL_FOUND,
  type SearchedKind,
} from './terms'

/** What a search of the catalogue may ask, as it stands in an address. */

const TYPES: Record<SearchedKind, readonly string[]> = {
  cartridges: LISTED_CARTRIDGE_TYPES,
  arms: [],
  'step-ups': [],
  leads: LEAD_USES,
  inputs: INPUT_KINDS,
}

const LIMIT_WORDS = `Ask for 1 to ${MAX_FOUND} at a time.`

export const CatalogueSearch = z
  .object({
    kind: z.enum(SEARCHED_KINDS, 'There is no such list. There are cartridges, arms, step-ups, leads and inputs.'),
    q: z.string().max(MAX_SEARCH_LETTERS, `Use ${MAX_SEARCH_LETTERS} letters or fewer.`).default(''),
    type: z.string().optional(),
    limit: z.coerce.number(LIMIT_WORDS).int(LIMIT_WORDS).min(1, LIMIT_WORDS).max(MAX_FOUND, LIMIT_WORDS).default(USUAL_FOUND),
    cursor: z.string().max(500, 'That is not a place in this list. Leave it out to begin at the top.').optional(),
  })
  .superRefine(({ kind, type }, context) => {
    const known = TYPES[kind]
    if (type === undefined || known.includes(type)) return
    const message = known.length === 0 ? 'This list has no types. Leave it out.' : `There is ${known.join(', ')}.`
    context.addIssue({ code: 'custom', path: ['type'], message })
  })
export type CatalogueSearch = z.infer<typeof CatalogueSearch>
