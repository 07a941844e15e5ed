/**
 * Constants of nature and of the record, in SI.
 *
 * | name                         | unit | origin                                                      |
 * |------------------------------|------|-------------------------------------------------------------|
 * | Boltzmann constant           | J/K  | SI definition of 2019, exact                                |
 * | standard gravity             | m/s² | third General Conference on Weights and Measures, 1901, exact |
 * | 0 °C                         | K    | SI, exact                                                   |
 * | playback time constants      | s    | IEC 60098 (RIAA): 3180, 318, 75 µs                          |
 * | added playback time constant | s    | IEC 60098 amendment 4: 7950 µs, on playback only            |
 * | reference frequency          | Hz   | IEC 60098, every response here is 0 dB at exactly 1 kHz     |
 * | nominal velocities           | m/s  | 5 cm/s peak lateral = 3.54 cm/s peak = 2.5 cm/s RMS per channel |
 * | zero of dBu                  | V    | √0.6 V, one milliwatt into 600 Ω                            |
 */

export const BOLTZMANN_JOULES_PER_KELVIN = 1.380649e-23
export const STANDARD_GRAVITY = 9.80665
export const ZERO_CELSIUS_KELVIN = 273.15

export const BASS_BOOST_SECONDS = 3180e-6
export const BASS_TURNOVER_SECONDS = 318e-6
export const TREBLE_SECONDS = 75e-6
export const ADDED_BASS_CUT_SECONDS = 7950e-6

export const REFERENCE_HERTZ = 1000
export const AUDIO_LOW_HERTZ = 20
export const AUDIO_HIGH_HERTZ = 20_000

export const NOMINAL_LATERAL_PEAK_METRES_PER_SECOND = 0.05
export const NOMINAL_CHANNEL_PEAK_METRES_PER_SECOND = 0.05 / Math.SQRT2
export const NOMINAL_CHANNEL_RMS_METRES_PER_SECOND = 0.025

export const DBU_ZERO_VOLTS = Math.sqrt(0.6)

/** Angular frequency 2πf. @returns rad/s */
export function angular(hertz: number): number {
  return 2 * Math.PI * hertz
}
