/**
 * Arm and cartridge on the record, below the music.
 *
 * | symbol | name                                           | unit | source                              |
 * |--------|------------------------------------------------|------|-------------------------------------|
 * | M      | effective mass of the arm + cartridge + fixings | kg  |                                     |
 * | c      | dynamic compliance at 10 Hz; 1 µm/mN = 10⁻³ m/N | m/N |                                     |
 * | f      | 1/(2π√(M·c)) = 159.155/√(M[g]·c[µm/mN])         | Hz  | mass on a spring                    |
 * | Q      | of that resonance                              | 1    | stated by the caller                |
 * | T(f)   | s²/(s² + s·ω0/Q + ω0²)                         | 1    | stylus against a head that floats above f |
 */
import { angular } from './constants'
import { powerToDecibels } from './decibels'

/** Resonance of mass and compliance. Infinity when either is 0. @returns hertz */
export function armResonanceHertz({ massKilograms, complianceMetresPerNewton }: { massKilograms: number; complianceMetresPerNewton: number }): number {
  return 1 / (2 * Math.PI * Math.sqrt(massKilograms * complianceMetresPerNewton))
}

/** Compliance that puts the resonance at a frequency with this mass. @returns m/N */
export function complianceForResonance({ massKilograms, hertz }: { massKilograms: number; hertz: number }): number {
  return 1 / (massKilograms * angular(hertz) ** 2)
}

/** Total mass that puts the resonance at a frequency with this compliance. @returns kg */
export function massForResonance({ complianceMetresPerNewton, hertz }: { complianceMetresPerNewton: number; hertz: number }): number {
  return 1 / (complianceMetresPerNewton * angular(hertz) ** 2)
}

export type ComplianceCondition = 'dynamic10Hz' | 'static' | 'dynamic100Hz' | 'unknown'

/**
 * Factor low, nominal and high from a printed compliance to the one at 10 Hz. There is no standard for it: static is
 * about twice the 10 Hz value, 10 Hz about 1.5 to 2 times the 100 Hz value, and a figure without condition may be any
 * of the three (published collections of such figures, read; the factors themselves are common practice).
 */
export const COMPLIANCE_FACTORS: Readonly<Record<ComplianceCondition, { low: number; nominal: number; high: number }>> = {
  dynamic10Hz: { low: 1, nominal: 1, high: 1 },
  static: { low: 0.5, nominal: 0.5, high: 0.5 },
  dynamic100Hz: { low: 1.5, nominal: 1.75, high: 2 },
  unknown: { low: 0.5, nominal: 1, high: 2 },
}

/** Butterworth high-pass, −10·log10(1 + (fc/f)^(2n)); order 0 is no filter, 0 Hz gives −Infinity. @returns dB */
export function highPassDecibels({ hertz, cornerHertz, order }: { hertz: number; cornerHertz: number; order: number }): number {
  if (order === 0 || cornerHertz === 0) return 0
  return -powerToDecibels(1 + (cornerHertz / hertz) ** (2 * order))
}

interface ArmResponse {
  readonly hertz: number
  readonly resonanceHertz: number
  readonly qualityFactor: number
}

/** Squared response of the cartridge on its arm to what the groove does, 1 far above the resonance. @returns 1 */
export function armResponsePower({ hertz, resonanceHertz, qualityFactor }: ArmResponse): number {
  const x = (hertz / resonanceHertz) ** 2
  return (x * x) / ((1 - x) ** 2 + x / qualityFactor ** 2)
}

/** The same in decibels, 0 dB far above the resonance. @returns dB */
export function armResponseDecibels(response: ArmResponse): number {
  return powerToDecibels(armResponsePower(response))
}
