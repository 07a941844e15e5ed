/** The words of a check: its steps, the keys under which answers travel, and what can be answered. */

export const STEPS = ['preamp', 'cartridge', 'arm', 'plays-into'] as const
export type Step = (typeof STEPS)[number]

/** What an owner chooses among; `other` then says which of `OTHER_TYPES`. */
export const CARTRIDGE_CHOICES = ['moving-magnet', 'moving-iron', 'moving-coil', 'other', 'unknown'] as const
export type CartridgeChoice = (typeof CARTRIDGE_CHOICES)[number]
export const OTHER_TYPES = ['ceramic', 'strain-gauge', 'optical'] as const
export type OtherType = (typeof OTHER_TYPES)[number]

/** How a value is known. `above` is "or more", offered for the maker's load alone. */
export const HOWS = ['one', 'between', 'above', 'unknown'] as const
export type How = (typeof HOWS)[number]

/** The groove speed that the output was printed for. */
export const VELOCITIES = ['5', '3.54', 'other', 'per-cm', 'none'] as const
export type VelocityChoice = (typeof VELOCITIES)[number]
/** What that speed means, as it is asked. */
export const ASKED_MEANINGS = ['peak-lateral', 'rms-lateral', 'peak-channel', 'rms-channel', 'not-said'] as const
/** A leaflet in the catalogue may say one half of it and not the other. */
export const HALF_MEANINGS = ['peak', 'rms', 'lateral', 'channel'] as const
export type HalfMeaning = (typeof HALF_MEANINGS)[number]
export const MEANINGS = [...ASKED_MEANINGS, ...HALF_MEANINGS] as const
export type Meaning = (typeof MEANINGS)[number]

export const COMPLIANCE_CONDITIONS = ['10-hz', '100-hz', 'static', 'not-said'] as const
export type ComplianceCondition = (typeof COMPLIANCE_CONDITIONS)[number]

/** How the owner's switches stand: drawn by hand, never touched since it came, or not known. */
export const PRESENTS = ['known', 'delivered', 'unknown'] as const
export type Present = (typeof PRESENTS)[number]

/** A capacitance said outright, reckoned from a length, or not known. */
export const WIRES = ['whole', 'metres', 'unknown'] as const
export type Wire = (typeof WIRES)[number]

export const NEXT_KINDS = ['line', 'digital', 'recorder', 'headphones', 'phono', 'unknown'] as const
export type NextKind = (typeof NEXT_KINDS)[number]

/** Every value that is one number, a range or not known. Each has three keys: itself, `…To` and `…How`. */
export const VALUE_FIELDS = [
  'output',
  'coil',
  'inductance',
  'load',
  'capacitance',
  'mass',
  'compliance',
  'force',
  'armMass',
  'armWiring',
  'fixings',
  'ratio',
  'primaryCoil',
  'secondaryCoil',
  'primaryInductance',
  'stepUpLead',
  'nextMax',
  'nextLoad',
] as const
export type ValueField = (typeof VALUE_FIELDS)[number]

/** Values that are always one number (or a range typed into the one box). */
export const PLAIN_FIELDS = [
  'velocityOther',
  'lead',
  'leadMetres',
  'leadPerMetre',
  'cable',
  'cableMetres',
  'cablePerMetre',
  'alsoAmplifier',
  'alsoRecorder',
  'alsoSubwoofer',
  'wish',
] as const
export type PlainField = (typeof PLAIN_FIELDS)[number]
export type NumberField = ValueField | PlainField

/** True for a value that has a second box and can be said not to be known. */
export const isValueField = (field: NumberField): field is ValueField => VALUE_FIELDS.some((each) => each === field)

/** Answers that are words, names or choices. */
export const WORD_KEYS = [
  'preamp',
  'board',
  'present',
  'left',
  'right',
  'name',
  'cart',
  'type',
  'other',
  'velocity',
  'meaning',
  'complianceAt',
  'mono',
  'arm',
  'armId',
  'leadName',
  'leadId',
  'leadAs',
  'stepUp',
  'stepUpName',
  'stepUpId',
  'out',
  'next',
  'nextName',
  'nextId',
  'cableAs',
  'unit',
  'own',
  'leaflet',
  'sheet',
] as const
export type WordKey = (typeof WORD_KEYS)[number]

export type AnswerKey = WordKey | PlainField | ValueField | `${ValueField}To` | `${ValueField}How`

export const ANSWER_KEYS: readonly AnswerKey[] = [
  ...WORD_KEYS,
  ...PLAIN_FIELDS,
  ...VALUE_FIELDS.flatMap((field): AnswerKey[] => [field, `${field}To`, `${field}How`]),
]

const withRange = (fields: readonly ValueField[]): AnswerKey[] =>
  fields.flatMap((field): AnswerKey[] => [field, `${field}To`, `${field}How`])

/** Which answers are given on which step. `sheet` and `leaflet` travel along on all of them. */
export const STEP_KEYS: Record<Step, readonly AnswerKey[]> = {
  preamp: ['preamp', 'board', 'present', 'left', 'right', 'unit'],
  cartridge: [
    'name',
    'cart',
    'own',
    'type',
    'other',
    'velocity',
    'velocityOther',
    'meaning',
    'complianceAt',
    'mono',
    ...withRange(['output', 'coil', 'inductance', 'load', 'capacitance', 'mass', 'compliance', 'force']),
  ],
  arm: [
    'arm',
    'armId',
    'leadName',
    'leadId',
    'leadAs',
    'lead',
    'leadMetres',
    'leadPerMetre',
    'stepUp',
    'stepUpName',
    'stepUpId',
    ...withRange([
      'armMass',
      'armWiring',
      'fixings',
      'ratio',
      'primaryCoil',
      'secondaryCoil',
      'primaryInductance',
      'stepUpLead',
    ]),
  ],
  'plays-into': [
    'out',
    'next',
    'nextName',
    'nextId',
    'cableAs',
    'cable',
    'cableMetres',
    'cablePerMetre',
    'alsoAmplifier',
    'alsoRecorder',
    'alsoSubwoofer',
    'wish',
    ...withRange(['nextMax', 'nextLoad']),
  ],
}

/** Answers that no box shows: which entry of the catalogue a name was taken from, or what of one's own it is. */
export const ENTRY_KEYS: readonly AnswerKey[] = ['cart', 'armId', 'leadId', 'stepUpId', 'nextId', 'unit', 'own']

/** Which unit and cartridge of one's own shelf a check is about. They place its sheet and are no part of what it says. */
export const SHELF_KEYS = ['unit', 'own'] as const satisfies readonly WordKey[]

/** What a choice stands at before anyone touched it; not written into links. */
export const DEFAULT_ANSWERS: Partial<Record<AnswerKey, string>> = {
  ...Object.fromEntries(VALUE_FIELDS.map((field) => [`${field}How`, 'one'])),
  present: 'unknown',
  leadAs: 'whole',
  cableAs: 'whole',
  stepUp: 'no',
  out: 'unbalanced',
  mono: 'no',
}

/** Longest text kept for one answer, and for the list of values that came out of the catalogue. */
export const MAX_ANSWER_LENGTH = 120
export const MAX_LEAFLET_LENGTH = 600
