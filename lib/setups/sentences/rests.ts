import type { CartridgeType, MatchInputs } from '../../match/inputs'
import type { Quantity, Range } from '../../match/quantity'
import type { Figures } from '../../match/result'
import { added, counted, figureText, sentenceCase, valueText } from '../format'
import type { NumberField, Step } from '../terms'
import type { Dimension } from '../units'

/** A value that the sheet rests on: used here, where it sits, where it came from. */
export interface RestRow {
  key: string
  value: string
  used: string
  /** In display units, for the bar; null where the value has no place on a scale. */
  bar: { min: number; max: number; low: number; high: number; unit: string } | null
  from: string
  /** The question to answer where this is an estimate; null where it is known. */
  enter: { step: Step; field: NumberField } | null
  /** Left out on paper. */
  screenOnly: boolean
}

const estimated = ({ origin }: Quantity) => origin === 'typical' || origin === 'unknown'

/** Where a value came from, with what stood on the leaflet where that says more. */
function cameFrom(quantity: Quantity, step: Step): string {
  const { origin, printed, condition } = quantity
  if (origin === 'typical') return printed ? `Estimate, ${printed}` : step === 'cartridge' ? 'Estimate, usual for this type' : 'Estimate, usual'
  if (origin === 'unknown') return 'Estimate, whatever the type'
  const who = origin === 'printed' ? 'The leaflet, in our list' : origin === 'measured' ? 'Measured' : 'You'
  if (!condition || !printed) return who
  if (condition === AS_USED) return origin === 'owner' ? 'You, as the leaflet prints it' : who
  return `${who}: ${printed}${/^at /.test(condition) ? ' ' : /^\d/.test(condition) ? ' at ' : /^per /.test(condition) ? ' ' : ', '}${condition}`
}

/** The condition that needs no bringing to the reference level. */
const AS_USED = '5 cm/s peak, sideways'

interface Asked {
  key: string
  value: string
  quantity: Quantity
  dimension: Dimension
  /** Display unit, how many of them one base unit is, and the ends of the scale in it. */
  scale: [unit: string, perBase: number, min: number, max: number]
  step: Step
  field: NumberField
  screenOnly?: boolean
  suffix?: string
  /** Said instead of what the origin says. */
  from?: string
}

function toRow({ key, value, quantity, dimension, scale: [unit, perBase, min, max], step, field, screenOnly, suffix, from }: Asked): RestRow {
  return {
    key,
    value,
    used: `${valueText(quantity, dimension)}${suffix ?? ''}`,
    bar: { min, max, low: quantity.low * perBase, high: quantity.high * perBase, unit },
    from: from ?? cameFrom(quantity, step),
    enter: estimated(quantity) ? { step, field } : null,
    screenOnly: screenOnly ?? false,
  }
}

const isCoil = (type: CartridgeType) => type === 'moving-coil'

/** Base units of grams and µm/mN are a thousandth of SI. */
const thousandfold = <T extends Range>(quantity: T): T => ({ ...quantity, low: quantity.low * 1e3, nominal: quantity.nominal * 1e3, high: quantity.high * 1e3 })

/** The values of a check in the order of the signal, as a sheet lists them. */
export function restRows(inputs: MatchInputs, figures: Figures | null): RestRow[] {
  const { cartridge, arm, next, stepUp } = inputs
  const wiring: Quantity = added([arm.wiringFarads, arm.leadFarads])
  const inductanceFrom = cartridge.coilHenries.low < 20e-3 ? 0.001 : cartridge.coilHenries.low < 0.1 ? 10 : 100
  const rows = [
    toRow({
      key: 'output',
      value: 'Output at 5 cm/s peak, sideways',
      quantity: cartridge.outputVolts,
      dimension: 'volts',
      scale: ['mV', 1e3, 0.1, 10],
      step: 'cartridge',
      field: 'output',
      suffix: ' RMS',
    }),
    toRow({
      key: 'inductance',
      value: 'Inductance',
      quantity: cartridge.coilHenries,
      dimension: 'henries',
      scale: ['mH', 1e3, inductanceFrom, inductanceFrom < 1 && cartridge.coilHenries.high < 2e-3 ? 2 : 1000],
      step: 'cartridge',
      field: 'inductance',
    }),
    toRow({
      key: 'wiring',
      value: 'Arm and lead',
      quantity: wiring,
      dimension: 'farads',
      scale: ['pF', 1e12, 20, 600],
      step: 'arm',
      field: 'lead',
      ...(estimated(wiring) && arm.leadFarads.printed ? { from: `Estimate, ${arm.leadFarads.printed} lead` } : {}),
    }),
    toRow({
      key: 'coil',
      value: 'Coil resistance',
      quantity: cartridge.coilOhms,
      dimension: 'ohms',
      scale: ['Ω', 1, 2, 2000],
      step: 'cartridge',
      field: 'coil',
    }),
    makersLoad(inputs, figures),
    ...(stepUp
      ? [toRow({ key: 'ratio', value: 'Step-up', quantity: stepUp.ratio, dimension: 'decibels', scale: [': 1', 1, 2, 60], step: 'arm', field: 'ratio' })]
      : []),
    toRow({
      key: 'compliance',
      value: 'Compliance at 10 Hz',
      quantity: thousandfold(cartridge.complianceMetresPerNewton),
      dimension: 'compliance',
      scale: ['µm/mN', 1, 3, 50],
      step: 'cartridge',
      field: 'compliance',
      screenOnly: true,
    }),
    toRow({
      key: 'arm-mass',
      value: 'Effective mass of the arm',
      quantity: thousandfold(arm.effectiveMassKilograms),
      dimension: 'grams',
      scale: ['g', 1, 3, 50],
      step: 'arm',
      field: 'armMass',
      screenOnly: true,
    }),
    toRow({
      key: 'next',
      value: 'Most that the next input takes',
      quantity: next.maximumVolts,
      dimension: 'volts',
      scale: ['V', 1, 0.5, 20],
      step: 'plays-into',
      field: 'nextMax',
      screenOnly: true,
      suffix: ' RMS',
    }),
  ]
  return rows.map((row) => (row.key === 'ratio' ? { ...row, used: row.used.replace(/ dB$/, ' : 1') } : row))
}

/** What the maker asks for, with what the advice comes to beside it. */
function makersLoad({ cartridge }: MatchInputs, figures: Figures | null): RestRow {
  const { recommendedLoadOhms: load, recommendedFarads: farads, type } = cartridge
  const parts = [load && figureOrMore(load, 'ohms'), farads && figureOrMore(farads, 'farads')].filter((part) => part !== null)
  const usual = isCoil(type) ? 'Eight times the coil' : '47 kΩ, as usual'
  const yours = farads && figures ? `. Yours comes to ${figureText(figures.totalFarads, 'farads')}` : ''
  return {
    key: 'load',
    value: "Maker's load",
    used: parts.length > 0 ? parts.join(', ') : usual,
    bar: farads
      ? { min: 20, max: 600, low: farads.low * 1e12, high: Math.min(farads.high * 1e12, 600), unit: 'pF' }
      : load
        ? { min: 10, max: 100_000, low: load.low, high: Math.min(load.high ?? 100_000, 100_000), unit: 'Ω' }
        : null,
    from: parts.length > 0 ? `As printed${yours}` : 'Nothing printed',
    enter: parts.length > 0 ? null : { step: 'cartridge', field: 'load' },
    screenOnly: false,
  }
}

function figureOrMore({ low, high }: { low: number; high: number | null }, dimension: Dimension): string {
  return valueText({ low, nominal: low, high: high ?? Infinity, origin: 'printed' }, dimension)
}

/** "Two values are estimates", "All of it is known". */
export function restsHeading(rows: readonly RestRow[]): string {
  const count = rows.filter(({ enter }) => enter !== null).length
  if (count === 0) return 'All of it is known'
  return sentenceCase(counted(count, 'value is an estimate', 'values are estimates'))
}
