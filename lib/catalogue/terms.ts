/** The words and limits of the catalogue: what kinds of thing it holds and how a leaflet may put them. */

export const CATALOGUE_KINDS = ['preamps', 'cartridges', 'arms', 'step-ups', 'leads', 'inputs'] as const
export type CatalogueKind = (typeof CATALOGUE_KINDS)[number]

/** Kinds that are looked up by typing. A maker's own preamps are few and are listed whole. */
export const SEARCHED_KINDS = ['cartridges', 'arms', 'step-ups', 'leads', 'inputs'] as const
export type SearchedKind = (typeof SEARCHED_KINDS)[number]

/** What a cartridge works by. Crystal counts as ceramic; its variety says so. */
export const LISTED_CARTRIDGE_TYPES = [
  'moving-magnet',
  'moving-iron',
  'moving-coil',
  'ceramic',
  'strain-gauge',
  'optical',
] as const
export type ListedCartridgeType = (typeof LISTED_CARTRIDGE_TYPES)[number]

export const CARTRIDGE_VARIETIES = ['high-output', 'low-output', 'crystal'] as const
export type CartridgeVariety = (typeof CARTRIDGE_VARIETIES)[number]

/** How a mono cartridge's coils come out: one coil on two pins, or coils joined across four. */
export const PIN_ARRANGEMENTS = ['separate', 'strapped', 'two-pin'] as const
export const GROOVES = ['micro', 'coarse'] as const

/** Whether a printed capacitance means everything across the coil or the preamp alone. */
export const CAPACITANCE_MEANINGS = ['total', 'preamp-only', 'not-said'] as const
export const COMPLIANCE_CONDITIONS = ['dynamic10Hz', 'static', 'dynamic100Hz', 'unknown'] as const
export const VELOCITY_KINDS = ['peak', 'rms'] as const
export const VELOCITY_DIRECTIONS = ['lateral', 'vertical', 'perChannel'] as const

export const LEAD_USES = ['arm-lead', 'cable', 'either'] as const
export type LeadUse = (typeof LEAD_USES)[number]

export const INPUT_KINDS = ['line', 'digital', 'recorder', 'headphones', 'phono'] as const
export type InputKind = (typeof INPUT_KINDS)[number]

/** Most rows that one answer of a search holds, and how many where nothing is said. */
export const MAX_FOUND = 20
export const USUAL_FOUND = 8
export const MAX_SEARCH_LETTERS = 80
/** Words of a search beyond these are left out: a name has no more. */
export const MAX_SEARCH_WORDS = 8
