/**
 * From the preamp's input to its output at 1 kHz.
 *
 * | symbol | name                        | unit  | source                                     |
 * |--------|-----------------------------|-------|--------------------------------------------|
 * | g      | gain at 1 kHz               | dB    | printed per setting                        |
 * | dBV    | level re 1 V RMS            | dBV   | definition                                 |
 * | dBu    | level re √0.6 V RMS         | dBu   | definition                                 |
 * | 2 V    | full scale of a digital source | V RMS | common practice, no source              |
 */
import { DBU_ZERO_VOLTS } from './constants'
import { fromDecibels, toDecibels } from './decibels'

export const DIGITAL_SOURCE_VOLTS = 2
/** A balanced output swings both lines: twice the voltage between them. Never part of a gain unless added. */
export const BALANCED_GAIN_DECIBELS = 20 * Math.log10(2)

/** Output RMS at 1 kHz. `balanced` adds 6.02 dB, only where the printed gain is that of one line. @returns volts */
export function outputVolts({
  inputVolts,
  gainDecibels,
  balanced = false,
}: {
  inputVolts: number
  gainDecibels: number
  balanced?: boolean
}): number {
  return inputVolts * fromDecibels(balanced ? gainDecibels + BALANCED_GAIN_DECIBELS : gainDecibels)
}

/** Level re 1 V RMS; −Infinity for 0 V. @returns dBV */
export function dbvOf(volts: number): number {
  return toDecibels(volts)
}

/** Level re √0.6 V RMS; −Infinity for 0 V. @returns dBu */
export function dbuOf(volts: number): number {
  return toDecibels(volts / DBU_ZERO_VOLTS)
}

/** RMS of a sine so many decibels above a nominal one. @returns volts RMS */
export function peakLevelVolts({ nominalVolts, decibelsAbove }: { nominalVolts: number; decibelsAbove: number }): number {
  return nominalVolts * fromDecibels(decibelsAbove)
}

/** Gain at 1 kHz that brings the input to a wanted output. Infinity without input. @returns dB */
export function gainNeededDecibels({ inputVolts, wantedVolts }: { inputVolts: number; wantedVolts: number }): number {
  return toDecibels(wantedVolts / inputVolts)
}

/** Level over the full scale of a digital source, 2 V RMS. @returns dB, negative when the record plays softer */
export function reDigitalSourceDecibels(volts: number): number {
  return toDecibels(volts / DIGITAL_SOURCE_VOLTS)
}
