import { describe, expect, test } from 'vitest'
import { ARMS } from '@/content/catalogue/arms'
import { CARTRIDGES } from '@/content/catalogue/cartridges/all'
import { INPUTS } from '@/content/catalogue/inputs'
import { LEADS } from '@/content/catalogue/leads'
import { STEP_UPS } from '@/content/catalogue/step-ups'
import { toArmView, toCartridgeView, toInputView, toLeadView, toStepUpView } from '@/lib/catalogue/views'
import { readAnswers, type Stated } from '@/lib/setups/answers'
import { toCartridge } from '@/lib/setups/inputs'
import {
  answersFromArm,
  answersFromCartridge,
  answersFromInput,
  answersFromLead,
  answersFromStepUp,
} from '@/lib/setups/schema-picked'
import { toQuery, fromQuery } from '@/lib/setups/schema'
import { expectWithin } from '../support/tolerances'

/** What the answers read as, after a round trip through an address; nothing of them may be in trouble. */
function read(answers: Parameters<typeof toQuery>[0]) {
  const { answers: result, troubles } = readAnswers(fromQuery(toQuery(answers)))
  expect(troubles).toEqual([])
  return result
}

const magnetic = CARTRIDGES.filter(({ type }) => type.startsWith('moving'))

describe('a cartridge chosen from the list', () => {
  test.each(CARTRIDGES.map((entry) => [`${entry.maker} ${entry.name}`, entry] as const))('%s fills the form without trouble', (_, entry) => {
    const view = toCartridgeView(entry)
    const { cartridge } = read(answersFromCartridge(view))
    expect(cartridge.name).toBe(view.name)
    expect(cartridge.type).toBe(view.type)
    expect(cartridge.mono).toBe(view.channels === 'mono')
  })

  test.each(magnetic.map((entry) => [`${entry.maker} ${entry.name}`, entry] as const))('%s reads as printed', (_, entry) => {
    const { cartridge } = read(answersFromCartridge(toCartridgeView(entry)))
    const pairs: [Stated | null, { low: number | null; nominal: number | null; high: number | null } | null][] = [
      [cartridge.outputMillivolts, entry.outputMillivolts],
      [cartridge.coilOhms, entry.coilOhms],
      [cartridge.inductanceMillihenries, entry.inductanceMillihenries],
      [cartridge.loadOhms, entry.loadOhms],
      [cartridge.massGrams, entry.massGrams],
      [cartridge.compliance, entry.complianceMicrometresPerMillinewton],
      [cartridge.trackingForceGrams, entry.trackingForceGrams],
    ]
    for (const [stated, printed] of pairs) {
      expect(stated === null).toBe(printed === null)
      if (!stated || !printed) continue
      expect(stated.origin).toBe('printed')
      if (printed.low !== null) expectWithin(stated.low, printed.low, { relative: 1e-4 })
      if (printed.high !== null) expectWithin(stated.high, printed.high, { relative: 1e-4 })
      if (printed.low !== null && printed.high !== null && printed.nominal !== null) {
        expectWithin(stated.nominal, printed.nominal, { relative: 2e-2 })
      }
    }
  })

  test('an entry chosen over another leaves nothing of the first behind', () => {
    const [first, second] = [magnetic.find(({ inductanceMillihenries }) => inductanceMillihenries), magnetic.find(({ inductanceMillihenries }) => !inductanceMillihenries)]
    if (!first || !second) throw new Error('The demo catalogue has leaflets with and without inductance.')
    const { cartridge } = read(answersFromCartridge(toCartridgeView(second), answersFromCartridge(toCartridgeView(first))))
    expect(cartridge.inductanceMillihenries).toBeNull()
  })

  test('other answers stay', () => {
    const answers = answersFromCartridge(toCartridgeView(magnetic[0]), { preamp: 'tarn-2', armMass: '11' })
    expect(answers).toMatchObject({ preamp: 'tarn-2', armMass: '11' })
  })

  test('an RMS velocity that does not say which way is kept as half said', () => {
    const view = toCartridgeView(magnetic[0])
    const output = view.outputMillivolts
    if (!output) throw new Error('The first demo leaflet has an output.')
    const answers = answersFromCartridge({
      ...view,
      outputMillivolts: { ...output, low: 4, nominal: 4, high: 4, printed: '4 mV', velocity: { form: 'atVelocity', centimetresPerSecond: 5, kind: 'rms', direction: null } },
    })
    // RMS is 3 dB more than peak, one channel 3 dB more than sideways (geometry of the groove).
    const { outputVolts } = toCartridge(read(answers).cartridge)
    expectWithin(outputVolts.low, 2e-3, { relative: 1e-3 })
    expectWithin(outputVolts.high, 2.828e-3, { relative: 1e-3 })
  })
})

describe('arms, transformers, leads and inputs from the list', () => {
  test.each(ARMS.map((entry) => [entry.id, entry] as const))('arm %s', (_, entry) => {
    const { arm } = read(answersFromArm(toArmView(entry)))
    if (entry.effectiveMassGrams) expectWithin(arm.effectiveMassGrams?.low, entry.effectiveMassGrams.low, { relative: 1e-4 })
    else expect(arm.effectiveMassGrams).toBeNull()
  })

  test.each(STEP_UPS.flatMap((entry) => entry.taps.map((tap) => [`${entry.id} ${tap.id}`, entry, tap] as const)))('transformer %s', (_, entry, tap) => {
    const { stepUp } = read(answersFromStepUp(toStepUpView(entry), tap))
    // A label of impedances is written to three figures.
    expectWithin(stepUp?.ratio?.low, tap.ratio.low, { relative: 5e-3 })
    expectWithin(stepUp?.ratio?.high, tap.ratio.high, { relative: 5e-3 })
  })

  test.each(LEADS.flatMap((entry) => entry.lengthsMetres.map((metres, i) => [`${entry.id} ${metres} m`, entry, i] as const)))('lead %s', (_, entry, i) => {
    const view = toLeadView(entry)
    const { arm } = read(answersFromLead(view, view.lengths[i]))
    const lead = arm.lead
    if ('metres' in lead) expect(lead.metres.nominal).toBe(view.lengths[i].metres)
    else expectWithin(lead.picofarads?.nominal, view.lengths[i].picofarads?.nominal ?? NaN, { relative: 1e-3 })
  })

  test.each(INPUTS.map((entry) => [entry.id, entry] as const))('input %s', (_, entry) => {
    const { next } = read(answersFromInput(toInputView(entry)))
    expect(next.kind).toBe(entry.kind)
    if (entry.inputKilohms) expectWithin(next.inputKilohms?.nominal, entry.inputKilohms.nominal, { relative: 1e-2 })
  })
})
