import {
  TYPICAL_ARM,
  TYPICAL_CABLE_FARADS,
  TYPICAL_CABLE_FARADS_PER_METRE,
  TYPICAL_LEAD_FARADS,
  TYPICAL_NEXT,
  typicalCartridge,
} from '../match/typical'
import type { Quantity } from '../match/quantity'
import type { Answers } from './answers'
import { readField } from './field-reading'
import type { RawAnswers, Trouble } from './trouble'
import { FIELDS, oneOf } from './fields'
import { conditionText, footingOf } from './footing'
import { TYPICAL_STEP_UP, toCartridge } from './inputs'
import { isFromLeaflet } from './leaflet'
import type { CartridgeChoice, NextKind, NumberField } from './terms'
import { factorOf, shortNumber, unitSign, written, writtenRange, type Dimension } from './units'

/** What stands beside one value of the form. */
export interface FieldView {
  /** Sign of the unit in the box; empty for a ratio. */
  unit: string
  /** What was understood, where the text says it otherwise; null where it would only be repeated. */
  understood: string | null
  trouble: Trouble | null
  /** What will be used when it is not known. */
  ifUnknown: string
  /** True while it stands as it was filled in from the list. */
  fromList: boolean
}

export function fieldView(field: NumberField, raw: RawAnswers, answers: Answers, type: CartridgeChoice): FieldView {
  const { given, trouble, understood } = readField(field, raw, type)
  const repeated = given?.text === understood
  return {
    unit: unitOf(field, type),
    understood: repeated ? null : understood,
    trouble,
    ifUnknown: ifUnknown(field, answers, type),
    fromList: given !== null && isFromLeaflet(field, raw),
  }
}

function unitOf(field: NumberField, type: CartridgeChoice): string {
  if (field === 'ratio') return ''
  const { dimension, unit, bare } = FIELDS[field]
  return unitSign(factorOf(dimension, bare?.(type) ?? unit) ?? 1, dimension) ?? ''
}

const range = ({ low, high }: { low: number; high: number }, dimension: Dimension, size = 1) => writtenRange(two(low * size), two(high * size), dimension)
const two = (value: number) => Number(value.toPrecision(2))
const willUse = (text: string, of: string) => `We will use ${text}, which is usual for ${of}.`

const NEXT: Record<NextKind, string> = {
  line: 'an amplifier',
  digital: 'a digital input',
  recorder: 'a recorder',
  headphones: 'a headphone stage',
  phono: 'a phono input',
  unknown: 'an input',
}

/** "We will use 400 to 550 mH, which is usual for a moving magnet of this output." */
function ifUnknown(field: NumberField, { cartridge, next }: Answers, type: CartridgeChoice): string {
  const known = toCartridge(cartridge)
  const usual = typicalCartridge(known.type, {
    outputVolts: cartridge.outputMillivolts && known.outputVolts,
    coilOhms: field === 'coil' ? null : cartridge.coilOhms && known.coilOhms,
  })
  const plain = typicalCartridge(known.type)
  const narrowed = (a: Quantity, b: Quantity) => a.low !== b.low || a.high !== b.high
  const of = (what: 'coilOhms' | 'coilHenries') => {
    if (!narrowed(usual[what], plain[what])) return oneOf(type)
    const byCoil = what === 'coilHenries' && type === 'moving-coil' && cartridge.coilOhms
    return `${oneOf(type)} of this ${byCoil ? 'resistance' : 'output'}`
  }
  switch (field) {
    case 'output':
      return willUse(range(plain.outputVolts, 'volts'), oneOf(type))
    case 'coil':
      return willUse(range(usual.coilOhms, 'ohms'), of('coilOhms'))
    case 'inductance':
      return willUse(range(usual.coilHenries, 'henries'), of('coilHenries'))
    case 'load':
      return type === 'moving-coil' ? 'We will look for a load of at least eight times the coil.' : 'We will go by the usual 47 kΩ.'
    case 'capacitance':
      return 'We will look for a level treble instead.'
    case 'mass':
      return willUse(range(plain.massKilograms, 'grams', 1e3), oneOf(type))
    case 'compliance':
      return willUse(range(plain.complianceMetresPerNewton, 'compliance', 1e3), oneOf(type))
    case 'force':
      return 'It goes on the sheet, and no figure rests on it.'
    case 'armMass':
      return willUse(range(TYPICAL_ARM.effectiveMassKilograms, 'grams', 1e3), 'an arm')
    case 'armWiring':
      return willUse(range(TYPICAL_ARM.wiringFarads, 'farads'), 'the wire in an arm')
    case 'fixings':
      return willUse(range(TYPICAL_ARM.fixingsKilograms, 'grams', 1e3), 'screws and nuts')
    case 'lead':
      return willUse(range(TYPICAL_LEAD_FARADS, 'farads'), 'an arm lead')
    case 'leadMetres':
    case 'leadPerMetre':
    case 'cableMetres':
    case 'cablePerMetre':
      return `Where a metre is not known, ${willUse(range(TYPICAL_CABLE_FARADS_PER_METRE, 'faradsPerMetre'), 'a lead').replace('We', 'we')}`
    case 'cable':
      return willUse(range(TYPICAL_CABLE_FARADS, 'farads'), 'a cable of about a metre')
    case 'ratio':
      return willUse(`1:${shortNumber(TYPICAL_STEP_UP.ratio.low)} to 1:${shortNumber(TYPICAL_STEP_UP.ratio.high)}`, 'a step-up')
    case 'primaryCoil':
      return willUse(range(TYPICAL_STEP_UP.primaryOhms, 'ohms'), 'a primary winding')
    case 'secondaryCoil':
      return willUse(range(TYPICAL_STEP_UP.secondaryOhms, 'ohms'), 'a secondary winding')
    case 'primaryInductance':
      return 'Without it we cannot say where its bass begins to fall.'
    case 'stepUpLead':
      return willUse(range(TYPICAL_STEP_UP.secondaryFarads, 'farads'), 'that lead')
    case 'nextMax':
      return willUse(range(TYPICAL_NEXT[next.kind].maximumVolts, 'volts'), NEXT[next.kind])
    case 'nextLoad':
      return willUse(range(TYPICAL_NEXT[next.kind].inputOhms, 'ohms'), NEXT[next.kind])
    default:
      return ''
  }
}

/** The lines under an output: what it was understood to be, and what it is at the reference level. */
export interface OutputView {
  /** "What does the leaflet mean by 5 cm/s?" */
  question: string
  /** "Understood: 5.4 mV RMS at 5 cm/s peak, sideways."; null while there is no value. */
  understood: string | null
  /** "If it does not say, we work with 3.8 to 5.4 mV."; null where no speed is asked about. */
  ifNotSaid: string | null
  /** What is worked with at the reference level, where that is another number. */
  atReference: string | null
}

export function outputView(answers: Answers): OutputView {
  const { cartridge } = answers
  const { outputMillivolts: output, velocity, meaning } = cartridge
  const speed = velocity === 'per-cm' ? 'cm/s' : conditionText({ ...cartridge, meaning: 'not-said' }).replace(', not said of what', '')
  const question = `What does the leaflet mean by ${velocity === 'none' ? 'its cm/s' : speed}?`
  if (!output) return { question, understood: null, ifNotSaid: null, atReference: null }
  const value = `${writtenRange(output.low * 1e-3, output.high * 1e-3, 'volts')} RMS`
  const condition = conditionText(cartridge)
  const joined = velocity === 'per-cm' ? `${value} ${condition}` : velocity === 'none' ? `${value}, ${condition}` : `${value} at ${condition}`
  const working = ({ low, high }: { low: number; high: number }) =>
    range({ low: output.low * low, high: output.high * high }, 'volts', 1e-3)
  const factor = footingOf(cartridge)
  const asIs = Math.abs(factor.low - 1) < 5e-3 && Math.abs(factor.high - 1) < 5e-3
  return {
    question,
    understood: `Understood: ${joined}.`,
    ifNotSaid:
      velocity === 'none'
        ? `We work with ${working(factor)}, since no speed is stated.`
        : `If it does not say, we work with ${working(footingOf({ ...cartridge, meaning: 'not-said' }))}.`,
    atReference: asIs || velocity === 'none' || meaning === 'not-said' ? null : `That is ${working(factor)} at 5 cm/s peak, sideways, where we compare.`,
  }
}

/** "1.2 m of it come to 108 to 120 pF." Null while either is missing. */
export function lengthNote(which: 'lead' | 'cable', { arm, next }: Answers): string | null {
  const wire = which === 'lead' ? arm.lead : next.cable
  if (!('metres' in wire)) return null
  const perMetre = wire.picofaradsPerMetre ?? { low: TYPICAL_CABLE_FARADS_PER_METRE.low * 1e12, high: TYPICAL_CABLE_FARADS_PER_METRE.high * 1e12 }
  const total = range({ low: wire.metres.low * perMetre.low, high: wire.metres.high * perMetre.high }, 'farads', 1e-12)
  const how = wire.picofaradsPerMetre ? '' : ', at what is usual for a metre'
  return `${written(wire.metres.nominal, 'metres')} of it come to ${total}${how}.`
}
