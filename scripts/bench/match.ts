import { PREAMPS } from '@/content/catalogue/preamps/all'
import { toPreamp } from '@/lib/catalogue/to-preamp'
import { between, exactly, match, tryOut, TYPICAL_NEXT, UNKNOWNS, type MatchInputs, type Preamp } from '@/lib/match'
import { resolveSetting } from '@/lib/match/settings'
import { enumerateStates } from '@/lib/match/states'
import { plainFigures } from '@/tests/support/plain-check'
import { boxOf } from '@/tests/support/plain-box'

const ROUNDS = 60
const WARM_UP = 20
/** Draws that a plain sampling needs for ranges that hold 99 % (tests/match/honest-ranges.test.ts uses as many). */
const PLAIN_DRAWS = 1000
/** The plain sampling takes seconds a combination: a few are timed, the rest is their number times that. */
const PLAIN_STATES = 3

function largestPreamp(): Preamp {
  const boards = PREAMPS.flatMap((entry) => entry.boards.map((board) => toPreamp(entry, board)))
  return boards.reduce((most, board) => (enumerateStates(board).length > enumerateStates(most).length ? board : most))
}

/** A moving magnet of which output, inductance, lead, compliance and the amplifier's limit are not known. */
function fiveUnknown(preamp: Preamp): MatchInputs {
  const { asDelivered } = preamp
  return {
    preamp,
    present: { left: asDelivered, right: asDelivered },
    cartridge: {
      name: 'Bench',
      type: 'moving-magnet',
      outputVolts: between(3.8e-3, 5.4e-3),
      coilOhms: exactly(700),
      coilHenries: between(0.4, 0.55),
      recommendedLoadOhms: null,
      recommendedFarads: null,
      massKilograms: exactly(6e-3),
      complianceMetresPerNewton: between(10e-3, 20e-3),
      trackingForceNewtons: null,
      channels: 'stereo',
    },
    arm: { effectiveMassKilograms: exactly(12e-3), fixingsKilograms: exactly(1e-3), wiringFarads: exactly(20e-12), leadFarads: between(80e-12, 200e-12) },
    stepUp: null,
    output: 'unbalanced',
    next: { kind: 'line', name: 'Bench', ...TYPICAL_NEXT.line, inputOhms: exactly(47_000), cableFarads: exactly(100e-12) },
    wishedVolts: null,
    temperatureKelvin: 298.15,
  }
}

function quantiles(run: () => void): { median: number; p95: number } {
  for (let k = 0; k < WARM_UP; k++) run()
  const times = Array.from({ length: ROUNDS }, () => {
    const start = performance.now()
    run()
    return performance.now() - start
  }).sort((a, b) => a - b)
  return { median: times[Math.floor(ROUNDS / 2)], p95: times[Math.floor(ROUNDS * 0.95)] }
}

function plainMilliseconds(inputs: MatchInputs): number {
  const states = enumerateStates(inputs.preamp)
  const timed = Array.from({ length: PLAIN_STATES }, (_, k) => states[Math.floor((k * states.length) / PLAIN_STATES)])
  const start = performance.now()
  for (const state of timed) {
    const setting = resolveSetting(inputs.preamp, state)
    if ('clash' in setting) throw new Error('Enumerated states never clash.')
    const box = boxOf(inputs, setting)
    for (let k = 0; k < PLAIN_DRAWS; k++) {
      const at = Object.fromEntries(UNKNOWNS.map((name) => [name, box[name].low + (box[name].high - box[name].low) * Math.random()]))
      plainFigures(inputs, setting, at as Parameters<typeof plainFigures>[2])
    }
  }
  return ((performance.now() - start) / PLAIN_STATES) * states.length
}

export function benchMatch(): void {
  const preamp = largestPreamp()
  const inputs = fiveUnknown(preamp)
  const whole = quantiles(() => match(inputs))
  const step = quantiles(() => tryOut(inputs, preamp.asDelivered))
  const plain = plainMilliseconds(inputs)
  const show = (milliseconds: number) => `${milliseconds.toFixed(2)} ms`
  console.log(`  ${preamp.modelName}, ${enumerateStates(preamp).length} combinations`)
  console.log(`  whole check         median ${show(whole.median)}, p95 ${show(whole.p95)}`)
  console.log(`  one step of what-if median ${show(step.median)}, p95 ${show(step.p95)}`)
  console.log(`  plain sampling, ${PLAIN_DRAWS} draws of every combination: ${(plain / 1000).toFixed(1)} s, ${Math.round(plain / whole.median)} times as long`)
}
