import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join, resolve } from 'node:path'
import { afterAll, describe, expect, test } from 'vitest'
import { casesOf, evaluateCase, type Case } from '../../scripts/evaluate/evaluate-cases'
import { expectWithin } from '../support/tolerances'

const movingMagnet = { coil_resistance_ohm: 700, coil_inductance_mH: 500, load_resistance_ohm: 47_000, load_capacitance_total_pF: 250 }
const caseOf = (kind: string, inputs: Record<string, unknown>, keys: string[] | null = null): Case => ({
  id: 'one',
  kind,
  inputs,
  expected: keys && Object.fromEntries(keys.map((key) => [key, 0])),
})

describe('evaluating a case', () => {
  test('without expected figures all of its kind are given, none of them unknown', () => {
    const kinds: [string, Record<string, unknown>, number][] = [
      ['mm_loading', movingMagnet, 26],
      ['step_up', { coil_resistance_ohm: 8, coil_inductance_mH: 0.02, transformer_ratio_n: 15, primary_inductance_H: 3, load_resistance_ohm: 47_000, emf_mV_rms: 0.3 }, 16],
      ['noise', { ...movingMagnet, nominal_emf_mV_rms: 4, preamp_en_nV_rtHz: 4, preamp_in_pA_rtHz: 0.3, temperature_C: 25 }, 18],
    ]
    for (const [kind, inputs, count] of kinds) {
      const result = evaluateCase(caseOf(kind, inputs), (key) => expect.unreachable(key))
      expect(Object.keys(result)).toHaveLength(count)
      expect(Object.values(result).filter((value) => value !== null && typeof value !== 'number')).toEqual([])
    }
  })

  test('the frequency stands in the key, in hertz or kilohertz', () => {
    const result = evaluateCase(caseOf('mm_loading', movingMagnet, ['response_12345Hz_re_emf_dB', 'response_12.345kHz_re_emf_dB', 'deviation_500Hz_re_1kHz_dB']))
    const [first, second, third] = Object.values(result) as number[]
    expect(first).toBe(second)
    expect(third).toBeLessThan(0)
  })

  test('a peak that does not exist is null', () => {
    const result = evaluateCase(caseOf('mc_loading', { ...movingMagnet, load_capacitance_total_pF: 20 }, ['peak_frequency_Hz', 'peak_height_re_1kHz_dB']))
    expect(result).toEqual({ peak_frequency_Hz: null, peak_height_re_1kHz_dB: null })
  })

  test('overload knows the third topology', () => {
    const inputs = {
      ...movingMagnet,
      emf_sensitivity_mV_per_cm_s: 1,
      overload_1kHz_mV_rms: 100,
      overload_topology: 'first_stage_bass_eq',
      iec_7950us: false,
      record_amplitude_limit_um_peak: 50,
      record_velocity_limit_cm_s_peak: 25,
      record_acceleration_limit_g_peak: 3000,
    }
    const result = evaluateCase(caseOf('overload', inputs, ['allowed_input_1000Hz_mV_peak', 'allowed_input_20Hz_mV_peak'])) as Record<string, number>
    expectWithin(result['allowed_input_1000Hz_mV_peak'], 100 * Math.SQRT2, { relative: 1e-9 })
    // Source: reckoned, |1 + jω·318 µs|/|1 + jω·3180 µs| at 1 kHz over the same at 20 Hz.
    const gain = (f: number) => Math.hypot(1, 2 * Math.PI * f * 318e-6) / Math.hypot(1, 2 * Math.PI * f * 3180e-6)
    expectWithin(result['allowed_input_20Hz_mV_peak'], (100 * Math.SQRT2 * gain(1000)) / gain(20), { relative: 1e-9 })
  })

  test('an unknown kind, a missing input and an unknown word are said in a sentence', () => {
    expect(evaluateCase(caseOf('toString', {}))).toEqual({ error: 'No such kind of case: "toString".' })
    expect(evaluateCase(caseOf('mm_loading', { ...movingMagnet, coil_resistance_ohm: undefined }))).toEqual({
      error: 'Input "coil_resistance_ohm" is missing or not a number.',
    })
    expect(evaluateCase(caseOf('velocity', { spec_velocity_cm_s: 5, spec_velocity_kind: 'mean' }))).toHaveProperty('error')
  })

  test('a key that the kind does not know is null and reported', () => {
    const unknown: string[] = []
    expect(evaluateCase(caseOf('mm_loading', movingMagnet, ['colour']), (key) => unknown.push(key))).toEqual({ colour: null })
    expect(unknown).toEqual(['colour'])
  })

  test('a file may be a bare list; anything else is refused', () => {
    expect(casesOf([{ id: 'a', kind: 'velocity', inputs: {} }])).toHaveLength(1)
    expect(() => casesOf({ rows: [] })).toThrow('no list of cases')
  })
})

describe('the command', () => {
  const folder = mkdtempSync(join(tmpdir(), 'setdown-evaluate-'))
  afterAll(() => rmSync(folder, { recursive: true, force: true }))
  const run = (file: string) => spawnSync(process.execPath, [resolve('node_modules/tsx/dist/cli.mjs'), resolve('scripts/evaluate.ts'), file], { encoding: 'utf8' })

  test('prints one JSON object and nothing else, whatever is in the cases', () => {
    const file = join(folder, 'cases.json')
    writeFileSync(file, JSON.stringify({ cases: [{ id: 'a', kind: 'mm_loading', inputs: movingMagnet, expected: { q_factor: 1 } }, { id: 'b', kind: 'other', inputs: {} }] }))
    const { status, stdout } = run(file)
    expect(status).toBe(0)
    expect(JSON.parse(stdout)).toEqual({ a: { q_factor: expect.any(Number) }, b: { error: 'No such kind of case: "other".' } })
  })

  test('a file that cannot be read ends with 1 and an empty output', () => {
    const { status, stdout, stderr } = run(join(folder, 'absent.json'))
    expect(status).toBe(1)
    expect(stdout).toBe('')
    expect(stderr).toContain('Cannot read')
  })
})
