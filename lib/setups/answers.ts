import type { CartridgeType } from '../match/inputs'
import { readField } from './field-reading'
import type { Given, RawAnswers, Trouble } from './trouble'
import { isFromLeaflet } from './leaflet'
import {
  CARTRIDGE_CHOICES,
  COMPLIANCE_CONDITIONS,
  MEANINGS,
  NEXT_KINDS,
  OTHER_TYPES,
  PRESENTS,
  VELOCITIES,
  type CartridgeChoice,
  type ComplianceCondition,
  type Meaning,
  type NextKind,
  type NumberField,
  type OtherType,
  type Present,
  type ValueField,
  type VelocityChoice,
} from './terms'

/** A value that was read, in the unit that its key names, with where it came from. */
export interface Stated extends Given {
  origin: 'printed' | 'owner'
}
type MaybeStated = Stated | null

/** A capacitance: said, or a length times the capacitance of a metre (null: the usual one), or not known. */
export type WireAnswer = { picofarads: MaybeStated } | { metres: Stated; picofaradsPerMetre: MaybeStated }

/** Everything that was answered, read. Null is "not known". */
export interface Answers {
  /** As typed; what is stored and linked. */
  given: RawAnswers
  preamp: string | null
  board: string | null
  present: { kind: Present; left: string; right: string }
  cartridge: {
    id: string | null
    name: string
    type: CartridgeType
    mono: boolean
    /** As printed, before it is brought to the reference level. */
    outputMillivolts: MaybeStated
    velocity: VelocityChoice
    velocityCentimetresPerSecond: MaybeStated
    meaning: Meaning
    coilOhms: MaybeStated
    inductanceMillihenries: MaybeStated
    loadOhms: MaybeStated
    capacitancePicofarads: MaybeStated
    massGrams: MaybeStated
    /** As printed, before it is brought to 10 Hz. µm/mN. */
    compliance: MaybeStated
    complianceAt: ComplianceCondition
    trackingForceGrams: MaybeStated
  }
  arm: {
    name: string
    effectiveMassGrams: MaybeStated
    wiringPicofarads: MaybeStated
    fixingsGrams: MaybeStated
    leadName: string
    lead: WireAnswer
  }
  stepUp: {
    name: string
    ratio: MaybeStated
    primaryOhms: MaybeStated
    secondaryOhms: MaybeStated
    primaryHenries: MaybeStated
    leadPicofarads: MaybeStated
  } | null
  output: 'unbalanced' | 'balanced'
  next: {
    kind: NextKind
    name: string
    maximumVolts: MaybeStated
    inputKilohms: MaybeStated
    /** Other inputs on the same output. */
    alsoKilohms: Stated[]
    cable: WireAnswer
  }
  wishedMillivolts: MaybeStated
}

export const choiceOf = (raw: RawAnswers): CartridgeChoice => oneOf(CARTRIDGE_CHOICES, raw.type, 'unknown')

function oneOf<T extends string>(words: readonly T[], text: string | undefined, otherwise: T): T {
  return words.find((word) => word === text) ?? otherwise
}

/** What a cartridge of this type is asked, in the order of the form; the last four are folded away. */
export function fieldsAsked(type: CartridgeChoice): readonly ValueField[] {
  if (type === 'other') return []
  const electrical: ValueField[] = ['output', 'coil', 'inductance', 'load']
  // A moving coil's own capacitance range is printed out of habit and decides nothing.
  return type === 'moving-coil' ? electrical : [...electrical, 'capacitance']
}
export const FOLDED_FIELDS: readonly ValueField[] = ['mass', 'compliance', 'force']

/**
 * Reads all answers. A value in trouble counts as not known, so that what can be said so far can be said.
 * Answers to questions that this type is not asked are kept as typed and left out of account.
 */
export function readAnswers(given: RawAnswers): { answers: Answers; troubles: Trouble[] } {
  const choice = choiceOf(given)
  const troubles: Trouble[] = []
  const read = (field: NumberField, asked = true): MaybeStated => {
    if (!asked) return null
    const { given: value, trouble } = readField(field, given, choice)
    if (trouble) troubles.push(trouble)
    return value && { ...value, origin: isFromLeaflet(field, given) ? 'printed' : 'owner' }
  }
  const asked = fieldsAsked(choice)
  const electrical = choice !== 'other'
  const hasStepUp = given.stepUp === 'yes'
  const velocity = oneOf(VELOCITIES, given.velocity, 'none')

  const cartridge: Answers['cartridge'] = {
    id: given.cart ?? null,
    name: (given.name ?? '').trim(),
    type: typeOf(choice, given, troubles),
    mono: given.mono === 'yes',
    outputMillivolts: read('output', asked.includes('output')),
    velocity,
    velocityCentimetresPerSecond: read('velocityOther', electrical && velocity === 'other'),
    meaning: oneOf(MEANINGS, given.meaning, 'not-said'),
    coilOhms: read('coil', asked.includes('coil')),
    inductanceMillihenries: read('inductance', asked.includes('inductance')),
    loadOhms: read('load', asked.includes('load')),
    capacitancePicofarads: read('capacitance', asked.includes('capacitance')),
    massGrams: read('mass', electrical),
    compliance: read('compliance', electrical),
    complianceAt: oneOf(COMPLIANCE_CONDITIONS, given.complianceAt, 'not-said'),
    trackingForceGrams: read('force', electrical),
  }
  const below = loadBelowCoil(cartridge, given)
  if (below) {
    troubles.push(below)
    cartridge.loadOhms = null
  }
  const answers: Answers = {
    given,
    preamp: given.preamp ?? null,
    board: given.board ?? null,
    present: { kind: oneOf(PRESENTS, given.present, 'unknown'), left: given.left ?? '', right: given.right ?? '' },
    cartridge,
    arm: {
      name: (given.arm ?? '').trim(),
      effectiveMassGrams: read('armMass'),
      wiringPicofarads: read('armWiring'),
      fixingsGrams: read('fixings'),
      leadName: (given.leadName ?? '').trim(),
      lead: readWire('lead', given, read),
    },
    stepUp: hasStepUp
      ? {
          name: (given.stepUpName ?? '').trim(),
          ratio: read('ratio'),
          primaryOhms: read('primaryCoil'),
          secondaryOhms: read('secondaryCoil'),
          primaryHenries: read('primaryInductance'),
          leadPicofarads: read('stepUpLead'),
        }
      : null,
    output: given.out === 'balanced' ? 'balanced' : 'unbalanced',
    next: {
      kind: oneOf(NEXT_KINDS, given.next, 'unknown'),
      name: (given.nextName ?? '').trim(),
      maximumVolts: read('nextMax'),
      inputKilohms: read('nextLoad'),
      alsoKilohms: [read('alsoAmplifier'), read('alsoRecorder'), read('alsoSubwoofer')].filter((value) => value !== null),
      cable: readWire('cable', given, read),
    },
    wishedMillivolts: read('wish'),
  }
  return { answers, troubles }
}

function typeOf(choice: CartridgeChoice, given: RawAnswers, troubles: Trouble[]): CartridgeType {
  if (choice !== 'other') return choice
  const other: OtherType | undefined = OTHER_TYPES.find((type) => type === given.other)
  if (other) return other
  troubles.push({
    key: 'other',
    sentence: 'Say which of the three it is, or choose Don\'t know.',
    fix: { label: "Choose Don't know", set: { type: 'unknown' } },
  })
  return 'unknown'
}

function readWire(which: 'lead' | 'cable', given: RawAnswers, read: (field: NumberField) => MaybeStated): WireAnswer {
  const as = which === 'lead' ? given.leadAs : given.cableAs
  if (as === 'unknown') return { picofarads: null }
  if (as !== 'metres') return { picofarads: read(which) }
  const metres = read(`${which}Metres`)
  const picofaradsPerMetre = read(`${which}PerMetre`)
  return metres ? { metres, picofaradsPerMetre } : { picofarads: null }
}

/** A load under the coil's own resistance takes more than half of the signal: nearly always a slip. */
function loadBelowCoil({ loadOhms, coilOhms }: Answers['cartridge'], given: RawAnswers): Trouble | null {
  if (!loadOhms || !coilOhms || loadOhms.high >= coilOhms.low) return null
  const sentence = `A load of ${loadOhms.text} is below the coil's own ${coilOhms.text}, and more than half the signal would be lost. Swap the two?`
  const set: RawAnswers = {
    load: coilOhms.text,
    loadTo: '',
    loadHow: 'one',
    coil: loadOhms.text,
    coilTo: '',
    coilHow: 'one',
  }
  // With magnets the load is the standard one, written without its k.
  if (given.type !== 'moving-coil' && loadOhms.high * 1e3 < 1e6) {
    const kilohms = `${loadOhms.low} kΩ`
    return {
      key: 'load',
      sentence: `A load of ${loadOhms.text} is below the coil's own ${coilOhms.text}. Did you mean ${kilohms}?`,
      fix: { label: `Use ${kilohms}`, set: { load: kilohms, loadTo: '', loadHow: 'one' } },
    }
  }
  return { key: 'load', sentence, fix: { label: 'Swap', set } }
}
