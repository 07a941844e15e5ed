import type { CartridgeType, MatchInputs, NextInput } from '../../match/inputs'
import { isExact, type Quantity } from '../../match/quantity'
import { added, dayText, sentenceCase, valueText } from '../format'

/** What a sheet is about: one row a thing, value over note. */
export interface TitleRow {
  label: string
  value: string
  note: string
}

const TYPES: Record<CartridgeType, string> = {
  'moving-magnet': 'moving magnet',
  'moving-iron': 'moving iron',
  'moving-coil': 'moving coil',
  ceramic: 'ceramic or crystal',
  'strain-gauge': 'strain gauge',
  optical: 'optical',
  unknown: 'type not known',
}

const NEXT: Record<NextInput['kind'], string> = {
  line: 'Amplifier, line input',
  digital: 'Digital input',
  recorder: 'Recorder',
  headphones: 'Headphone stage',
  phono: 'A phono input',
  unknown: 'Not known',
}

const estimated = ({ origin }: Quantity) => origin === 'typical' || origin === 'unknown'

/** "5.4 mV RMS at 5 cm/s peak, sideways", "7 mV at 5 cm/s, not said of what: 4.9 to 7.0 mV RMS". */
function outputNote({ outputVolts, coilOhms, coilHenries }: MatchInputs['cartridge']): string {
  if (estimated(outputVolts)) {
    return estimated(coilOhms) && estimated(coilHenries) ? 'nothing else known' : `output not known, reckoned with ${valueText(outputVolts, 'volts')}`
  }
  const { printed, condition } = outputVolts
  const used = `${valueText(outputVolts, 'volts')} RMS`
  if (!condition) return used
  const asPrinted = `${printed ?? ''} at ${condition}`.replace('at per', 'per').replace('at groove', ', groove').replace(' ,', ',').trim()
  return isExact(outputVolts) && condition === '5 cm/s peak, sideways' ? `${used} at ${condition}` : `${asPrinted}: ${used}`
}

/** The rows above the sheet's own. */
export function titleRows(inputs: MatchInputs): TitleRow[] {
  const { preamp, cartridge, arm, next, stepUp } = inputs
  const name = cartridge.name.trim()
  const wiring = added([arm.wiringFarads, arm.leadFarads])
  const voltageMode = cartridge.type !== 'ceramic' && cartridge.type !== 'strain-gauge' && cartridge.type !== 'optical'
  const lead = arm.leadFarads.printed ? `, ${arm.leadFarads.printed}${/\dm?\b/.test(arm.leadFarads.printed) ? ' lead' : ''}` : ''
  return [
    { label: 'Preamp', value: preamp.modelName, note: preamp.boardName },
    {
      label: 'Cartridge',
      value: name || (cartridge.type === 'unknown' ? 'Your cartridge' : sentenceCase(TYPES[cartridge.type])),
      note: [name || cartridge.type === 'unknown' ? TYPES[cartridge.type] : '', voltageMode ? outputNote(cartridge) : ''].filter(Boolean).join(', '),
    },
    {
      label: 'Arm and lead',
      value: valueText(wiring, 'farads'),
      note: `${estimated({ ...wiring }) ? 'estimated' : 'as given'}${lead}${stepUp ? `, step-up ${stepUp.name}`.trimEnd() : ''}`,
    },
    {
      label: 'Plays into',
      value: next.name.trim() || NEXT[next.kind],
      note: `${valueText(next.maximumVolts, 'volts')} RMS at most, ${valueText(next.inputOhms, 'ohms')}`,
    },
  ]
}

/** "4471, revision A" over its day and the rules it was reckoned by. */
export function sheetRow(sheet: { number: number; letter: string; createdAt: number; rulesVersion: number }): TitleRow {
  return {
    label: 'Sheet',
    value: `${sheet.number}, revision ${sheet.letter}`,
    note: `${dayText(sheet.createdAt)}. Rules, version ${sheet.rulesVersion}`,
  }
}

export { TYPES as TYPE_WORDS }
