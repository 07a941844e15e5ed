import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  exactly,
  FINDING_CODES,
  match,
  UNKNOWNS,
  WEIGHTS,
  type Evaluation,
  type Finding,
  type MatchInputs,
  type MatchResult,
  type Move,
  type Remedy,
} from '@/lib/match'
import { dayText, decibels, figureText, hertz, hertzRange, listed, roomRange, roomText, tied, valueText, voltsText } from '@/lib/setups/format'
import { doubtRows, doubtsHeading, holdsHeading, whatHolds } from '@/lib/setups/sentences/doubts'
import { findingClause, findingSentence, soundOf } from '@/lib/setups/sentences/findings'
import { gateLead, gateRemedies, gateTitle } from '@/lib/setups/sentences/gate'
import { armFinding, levelFinding, noiseFinding, paperLine, roomFinding, trebleFinding } from '@/lib/setups/sentences/headings'
import { numberMatters, numberTitle, stretchRange, stretchWords, whereToRead } from '@/lib/setups/sentences/number-to-find'
import { otherRows, othersHeading } from '@/lib/setups/sentences/others'
import { alternativeSentence, remedySentence } from '@/lib/setups/sentences/remedies'
import { restRows, restsHeading } from '@/lib/setups/sentences/rests'
import { titleRows } from '@/lib/setups/sentences/title-block'
import { UNKNOWN_WORDS } from '@/lib/setups/sentences/unknowns'
import { afterMovesLabel, verdictLead, verdictTitle } from '@/lib/setups/sentences/verdict'
import { anyInputs, sampleInputs } from '../support/any-inputs'
import { bankPreamp, buttonPreamp, fixedPreamp, plugPreamp } from '../support/preamps'

/** What no text on a screen may hold: characters that the fonts lack, exclamations, numbers that are none or below zero. */
function wellSaid(text: string) {
  expect(text, text).not.toMatch(/[→≈≤≥✓!]/)
  expect(text, text).not.toMatch(/NaN|Infinity|undefined|null|\[object/)
  expect(text, text).not.toMatch(/(^|[\s(])[-−]\s?\d/)
  expect(text, text).not.toMatch(/ {2}| ,| \.|\.\./)
}

function isSentence(text: string) {
  wellSaid(text)
  expect(text, text).toMatch(/^[\p{Lu}\d].*[.]$/u)
}

const inputs = sampleInputs()
const range = (low: number, nominal: number, high: number) => ({ low, nominal, high })

function finding(over: Partial<Finding>): Finding {
  return { code: 'next-input-tight', worst: 'worth-knowing', middle: 'fine', best: 'fine', figure: null, range: null, limit: null, doubt: null, ...over }
}

describe('findings', () => {
  // Figures as each code carries them, SI and decibels: all well, across its limit, all beyond it.
  const ranges = {
    decibels: [range(8, 9, 10), range(-2.9, 0.6, 3), range(-12, -8, -4), range(0, 0, 0), range(-0.04, -0.04, -0.04)],
    volts: [range(0.4, 0.5, 0.6), range(0.02, 0.4, 3), range(1e-4, 2e-4, 3e-4)],
    ohms: [range(46e3, 47e3, 48e3), range(90, 100, 110)],
    farads: [range(160e-12, 190e-12, 220e-12), range(290e-12, 380e-12, 420e-12), range(20e-12, 30e-12, 900e-12)],
    times: [range(9, 10, 11), range(0.4, 3, 40)],
    hertz: [range(9.4, 10, 10.8), range(4, 7, 19)],
  }
  const figures: Record<string, keyof typeof ranges> = {
    'level-low': 'volts',
    'level-high': 'volts',
    'load-below-recommended': 'ohms',
    'load-above-recommended': 'ohms',
    'load-near-coil': 'times',
    'capacitance-low': 'farads',
    'capacitance-high': 'farads',
    'arm-resonance-low': 'hertz',
    'arm-resonance-high': 'hertz',
    'bass-loss': 'hertz',
  }
  const limits: Record<keyof typeof ranges, number> = { decibels: 0, volts: 0.3, ohms: 47e3, farads: 300e-12, times: 8, hertz: 8 }

  test.each(FINDING_CODES)('%s is a sentence at every weight', (code) => {
    const kind = figures[code] ?? 'decibels'
    for (const worst of WEIGHTS) {
      for (const middle of WEIGHTS) {
        for (const each of ranges[kind]) {
          const told = finding({ code, worst, middle, range: each, limit: limits[kind] })
          isSentence(findingSentence(told, inputs))
          wellSaid(`Not this: ${findingClause(told, inputs)}.`)
        }
        isSentence(findingSentence(finding({ code, worst, middle }), inputs))
      }
    }
    wellSaid(soundOf(code))
  })

  test('room is said as room', () => {
    const at = (low: number, nominal: number) => findingSentence(finding({ range: range(low, nominal, nominal), limit: 0 }), inputs)
    expect(at(3.1, 3.1)).toBe("A loud record stays 3.1 dB under your amplifier's limit, and that is enough.")
    expect(at(1.2, 1.3)).toBe("A loud record stays under your amplifier's limit by 1.2 dB.")
    expect(at(0, 0)).toBe("A loud record just reaches your amplifier's limit.")
    expect(at(-0.9, 0.6)).toBe("The very loudest records go over your amplifier's limit, by 0.9 dB at worst; in the middle there is 0.6 dB of room.")
    expect(at(-2.9, -2.9)).toBe("A loud record goes over your amplifier's limit by 2.9 dB.")
  })

  test('what only the far end of the doubt says is said as that', () => {
    const told = { code: 'level-low' as const, worst: 'rules-it-out' as const, range: range(0.05, 0.4, 0.6), limit: 0.3 }
    expect(findingSentence(finding({ ...told, middle: 'fine' }), inputs)).toBe('It may be too quiet, with 0.05 to 0.6 V at usual music level where 0.3 V is wanted.')
    expect(findingSentence(finding({ ...told, middle: 'rules-it-out' }), inputs)).toContain('It is too quiet')
  })

  test('capacitance above what is asked', () => {
    const told = finding({ code: 'capacitance-high', worst: 'limit', range: range(360e-12, 390e-12, 420e-12), limit: 300e-12 })
    expect(findingSentence(told, inputs)).toBe('The capacitance comes to 360 to 420 pF, 60 to 120 pF above what the Sample asks.')
  })

  test('a load that nobody printed is not put into the maker’s mouth', () => {
    const silent = { ...inputs, cartridge: { ...inputs.cartridge, recommendedLoadOhms: null } }
    const told = finding({ code: 'load-below-recommended', worst: 'limit', range: range(10e3, 10e3, 10e3), limit: 44e3 })
    expect(findingSentence(told, silent)).toBe('The load is 10 kΩ, and a magnet wants 47 kΩ, which costs level and treble.')
  })
})

describe('verdicts', () => {
  const reckoned = match(inputs)
  const move = (member: number, side: Move['side'] = 'both'): Move => ({
    control: 'bank',
    member,
    side,
    from: '1',
    to: '0',
    group: 'gain',
    before: '42 dB',
    after: '36 dB',
  })
  const result = (over: Partial<MatchResult>): MatchResult => ({ ...reckoned, ...over })
  const evaluation = (findings: Finding[]): Evaluation => {
    if (!reckoned.chosen) throw new Error('The sample was not reckoned.')
    return { ...reckoned.chosen, findings }
  }
  const said = (over: Partial<MatchResult>, from: MatchInputs = inputs) => {
    const facts = { inputs: from, result: result(over), alternatives: [] }
    return { title: verdictTitle(facts), lead: verdictLead(facts) }
  }

  test('it suits', () => {
    const { title, lead } = said({ verdict: 'suits', moves: [], chosen: evaluation([]) })
    expect(title).toBe('It suits. Leave every switch where it is.')
    expect(lead).toEqual(['The Sample and the Sample are a good match.'])
    expect(said({ verdict: 'suits', moves: [] }, { ...inputs, preamp: fixedPreamp() }).title).toBe('It suits. There is nothing to set.')
    expect(said({ verdict: 'suits', moves: [] }, { ...inputs, preamp: plugPreamp() }).title).toBe('It suits. Leave every setting where it is.')
  })

  test('it suits, with changes, counted in words', () => {
    const changes = (moves: Move[] | null, from = inputs) => said({ verdict: 'suits-with-changes', moves, chosen: evaluation([]), present: null }, from).title
    expect(changes([move(1), move(6)])).toBe('It suits, once you move two switches.')
    expect(changes([move(1)])).toBe('It suits, once you move one switch.')
    expect(changes([move(1, 'left'), move(1, 'right')])).toBe('It suits, once you move two switches.')
    expect(changes(null)).toBe('It suits, with the switches set as below.')
    expect(changes([{ ...move(2), control: 'input' }], { ...inputs, preamp: buttonPreamp() })).toBe('It suits, once you press one button.')
    expect(changes([{ ...move(1), control: 'load', member: null }], { ...inputs, preamp: plugPreamp() })).toBe('It suits, once you change the load plugs.')
    expect(changes([{ ...move(1), control: 'load', member: null }, { ...move(1), control: 'gain', member: null }], { ...inputs, preamp: plugPreamp() })).toBe(
      'It suits, once you change two settings.',
    )
    expect(changes([move(1)], { ...inputs, preamp: bankPreamp() })).toContain('one switch')
  })

  test('what is wrong as it stands, and what puts it right', () => {
    const present = evaluation([
      finding({ code: 'treble-lift', worst: 'worth-knowing', range: range(2, 3, 4) }),
      finding({ code: 'next-input-tight', worst: 'limit', range: range(-3, -2, -1) }),
    ])
    const { lead } = said({ verdict: 'suits-with-changes', moves: [move(1), move(6)], present, chosen: evaluation([]) })
    expect(lead[0]).toBe('As you have it set, it is too loud for your amplifier and too bright. Two switches put both right.')
  })

  test('it suits, with a limit that is named', () => {
    const tight = finding({ code: 'headroom-loud-records', worst: 'limit', middle: 'fine', range: range(-0.9, 0.6, 2.1), limit: 0 })
    const facts = {
      inputs,
      result: result({ verdict: 'suits-with-a-limit', moves: [], chosen: evaluation([tight]) }),
      alternatives: [{ modelName: 'Tarn 2', verdict: 'suits' as const, gainDecibels: 36, roomDecibels: 8.2 }],
    }
    expect(verdictTitle(facts)).toBe('It suits, except on the very loudest records.')
    expect(verdictLead(facts)).toEqual([
      'Nothing to set.',
      'The very loudest records go over the limit of the Sample, by 0.9 dB at worst; in the middle there is 0.6 dB of room.',
      'You hear it as an edge on loud voices and brass.',
      'A Tarn 2 at 36 dB would have 8.2 dB of room.',
    ])
    expect(verdictTitle({ ...facts, result: result({ verdict: 'suits-with-a-limit', moves: [move(1)], chosen: evaluation([tight]) }) })).toBe(
      'It suits, once you move one switch, except on the very loudest records.',
    )
  })

  test('it does not suit, and what would', () => {
    const quiet = finding({ code: 'level-low', worst: 'rules-it-out', middle: 'rules-it-out', range: range(0.03, 0.03, 0.03), limit: 0.3 })
    const facts = {
      inputs,
      result: result({ verdict: 'does-not-suit', chosen: evaluation([quiet]), combinations: 1 }),
      alternatives: [{ modelName: 'Ember 3', verdict: 'suits' as const, gainDecibels: 62, roomDecibels: 5 }],
    }
    expect(verdictTitle(facts)).toBe('It does not suit.')
    expect(verdictLead(facts)).toEqual(['It is too quiet, with 30 mV at usual music level where 0.3 V is wanted.', 'An Ember 3 would do it.'])
  })

  test('it cannot be said yet, and which number would settle it', () => {
    const stretch = { setting: reckoned.chosen?.setting ?? null, finding: null }
    const next = {
      unknown: 'output' as const,
      low: 0.2e-3,
      nominal: 0.7e-3,
      high: 2.5e-3,
      share: 0.9,
      stretches: [
        { ...stretch, from: 0.2e-3, to: 0.85e-3, verdict: 'suits' as const },
        { ...stretch, from: 0.85e-3, to: 2.5e-3, verdict: 'does-not-suit' as const, finding: 'level-high' as const, setting: null },
      ],
    }
    const unknown = { ...inputs, cartridge: { ...inputs.cartridge, outputVolts: { low: 0.2e-3, nominal: 0.7e-3, high: 2.5e-3, origin: 'typical' as const } } }
    const { title, lead } = said({ verdict: 'cannot-say', next, tonight: reckoned.chosen?.setting ?? null }, unknown)
    expect(title).toBe('We cannot say yet.')
    expect(lead).toEqual([
      'Tell us the output in mV and we can.',
      'Until then it may be just right for the Sample or far too strong, and we will not guess.',
      'You can still play it tonight, see Figure 1.',
    ])
    expect(numberTitle(next, unknown)).toBe('Output of the Sample')
    expect(whereToRead(next, unknown)).toContain('Do not measure the coil: a meter can wreck it.')
    expect([0, 1].map((at) => stretchRange(next, at))).toEqual(['under 0.85 mV', 'over 0.85 mV'])
    expect(stretchWords(next.stretches[1], unknown)).toEqual({ verdict: 'Does not suit', todo: 'Too strong' })
  })

  test('the gate has its own answers, with no figure but the one given', () => {
    for (const type of ['ceramic', 'strain-gauge', 'optical'] as const) {
      const gate = { reason: 'not-magnetic' as const, type }
      isSentence(gateTitle(gate))
      gateLead(gate, inputs).forEach(isSentence)
      gateRemedies(gate).forEach(isSentence)
    }
    const current = { reason: 'current-input' as const, coilOhms: range(3, 12, 60) }
    expect(gateLead(current, inputs).join(' ')).toContain('3 to 60 Ω')
    gateRemedies(current).forEach(isSentence)
  })

  test('every remedy is a sentence', () => {
    const remedies: Remedy[] = [
      { kind: 'attenuator', decibels: 7.1 },
      { kind: 'more-gain', decibels: 20 },
      { kind: 'other-input', pathId: 'mm' },
      { kind: 'step-up', ratioLow: 8, ratioHigh: 20 },
      { kind: 'step-up', ratioLow: 10.2, ratioHigh: 10.4 },
      { kind: 'without-step-up' },
      { kind: 'load-plug', ohms: 1234 },
      { kind: 'lead', farads: 0 },
      { kind: 'lead', farads: 80e-12 },
      { kind: 'line-input' },
      ...(['gain', 'load', 'magnet-input', 'voltage-input', 'room'] as const).map((needs): Remedy => ({ kind: 'other-model', needs })),
    ]
    for (const remedy of remedies) isSentence(remedySentence(remedy, inputs, []))
    expect(alternativeSentence({ modelName: 'Merrin 5', verdict: 'suits', gainDecibels: 64, roomDecibels: 3 }, 'level-low')).toBe('A Merrin 5 would do it.')
  })

  test('every unknown says where to read it; no coil and no winding is to be measured', () => {
    for (const unknown of UNKNOWNS) {
      const { read, ask, inSentence } = UNKNOWN_WORDS[unknown]
      isSentence(read)
      wellSaid(`Tell us ${ask} and we can. ${inSentence}`)
    }
    for (const unknown of ['output', 'coilResistance', 'inductance'] as const) expect(UNKNOWN_WORDS[unknown].read).toContain('Do not measure the coil')
    for (const unknown of ['stepUpRatio', 'stepUpPrimary', 'stepUpSecondary', 'stepUpInductance'] as const) {
      expect(UNKNOWN_WORDS[unknown].read).toContain('Do not measure a winding')
    }
  })
})

test('whatever goes in, everything that a sheet says is well said', () => {
  fc.assert(
    fc.property(anyInputs, (any) => {
      const result = match(any)
      const facts = { inputs: any, result, alternatives: [] }
      isSentence(verdictTitle(facts))
      verdictLead(facts).forEach(isSentence)
      for (const { value, note } of titleRows(any)) wellSaid(`${value} ${note}`)
      wellSaid(afterMovesLabel(result))
      const { chosen } = result
      if (!chosen) return
      const shown = { evaluation: chosen, stages: result.stages }
      const headed = [levelFinding(shown, any, result.others), roomFinding(chosen, any), trebleFinding(chosen, result.present), armFinding(chosen, any), noiseFinding(chosen)]
      for (const { heading, paragraphs } of headed) {
        wellSaid(heading)
        paragraphs.forEach(isSentence)
      }
      Object.values(paperLine(chosen)).forEach(wellSaid)
      for (const each of chosen.findings) isSentence(findingSentence(each, any))
      const others = otherRows(result, any)
      wellSaid(othersHeading(others.all))
      for (const { setting, comesTo, why } of others.all) {
        expect(setting).not.toBe('')
        wellSaid(`${setting} ${comesTo}`)
        isSentence(why)
      }
      const rests = restRows(any, chosen.figures)
      wellSaid(restsHeading(rests))
      for (const { used, from } of rests) wellSaid(`${used} ${from}`)
      for (const remedy of result.remedies) isSentence(remedySentence(remedy, any, []))
      const doubts = doubtRows(result, any)
      wellSaid(doubtsHeading(doubts))
      for (const { name, reckonedWith, decides } of doubts) wellSaid(`${name} ${reckonedWith} ${decides}`)
      const held = whatHolds(chosen, any)
      wellSaid(holdsHeading(held))
      for (const { holds } of held) wellSaid(holds)
      wellSaid(numberMatters(result.next, any) ?? '')
      result.next?.stretches.forEach((stretch, at) => {
        const { todo } = stretchWords(stretch, any)
        wellSaid(`${result.next && stretchRange(result.next, at)} ${todo}`)
      })
    }),
    { numRuns: 25, seed: 20260306 },
  )
}, 60_000)

describe('figures in words', () => {
  test('two figures, unless two would make one number of both ends', () => {
    expect(figureText(range(0.4017, 0.47, 0.5499), 'henries')).toBe('400 to 550 mH')
    expect(figureText(range(46_530, 47_000, 47_470), 'ohms')).toBe('47 kΩ')
    expect(figureText(range(975, 980, 1010), 'ohms')).toBe('0.98 to 1 kΩ')
    expect(valueText(exactly(0.475, 'owner'), 'henries')).toBe('475 mH')
    expect(valueText({ low: 6.3639e-3, nominal: 7.7e-3, high: 9e-3, origin: 'owner' }, 'volts')).toBe('6.4 to 9 mV')
    expect(valueText({ low: 100, nominal: 100, high: Infinity, origin: 'printed' }, 'ohms')).toBe('100 Ω or more')
    expect(voltsText(range(0.336, 0.338, 0.344))).toBe('0.34 V')
    expect(voltsText(range(0.02, 0.036, 0.036))).toBe('20 to 36 mV')
  })

  test('decibels and pitches', () => {
    expect([decibels(3.06), decibels(-2.94), decibels(22.4), decibels(0)]).toEqual(['3.1 dB', '2.9 dB', '22 dB', '0.0 dB'])
    expect([hertz(9.44), hertz(1208), hertz(13_100), hertz(60)]).toEqual(['9.4 Hz', '1.2 kHz', '13 kHz', '60 Hz'])
    expect(hertzRange(range(9.4, 10, 10.8))).toBe('9.4 to 10.8 Hz')
    expect(hertzRange(range(900, 950, 1200))).toBe('900 Hz to 1.2 kHz')
  })

  test('room is never below zero', () => {
    expect([roomText(3.1), roomText(-2.9), roomText(-0.04)]).toEqual(['3.1 dB of room', 'over by 2.9 dB', 'no room left'])
    expect(roomRange(range(-0.9, 0.6, 2))).toBe('at worst over by 0.9 dB, in the middle 0.6 dB of room')
  })

  test('lists, days, and numbers that stay with their unit', () => {
    expect(listed(['a', 'b', 'c'])).toBe('a, b and c')
    expect(dayText(Date.UTC(2026, 2, 11, 23, 59))).toBe('Wednesday 11 March 2026')
    expect(tied('the Tarn 2 takes 5.4 mV, 9.4 to 10.8 Hz')).toBe('the Tarn\u00a02 takes 5.4\u00a0mV, 9.4\u00a0to 10.8\u00a0Hz')
  })
})
