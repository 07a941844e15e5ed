import type { MatchInputs } from '../../match/inputs'
import type { FindingCode, Remedy, VerdictKind } from '../../match/result'
import { amount, decibels, gainText, roomText } from '../format'
import { namesOf } from './names'

/** Another model of the same maker, checked with the same answers. */
export interface Alternative {
  modelName: string
  verdict: VerdictKind
  gainDecibels: number
  /** The tighter of the preamp's and the next input's room, at worst. */
  roomDecibels: number
}

const ABOUT_ROOM: ReadonlySet<FindingCode> = new Set(['headroom-tight', 'headroom-loud-records', 'next-input-tight'])

const article = (name: string) => (/^[aeiou]/i.test(name) ? 'An' : 'A')

/** "A Tarn 2 at 36 dB would have 8.2 dB of room." or "A Merrin 5 would do it." */
export function alternativeSentence({ modelName, gainDecibels, roomDecibels }: Alternative, about: FindingCode): string {
  const one = `${article(modelName)} ${modelName}`
  if (ABOUT_ROOM.has(about) && roomDecibels > 0) {
    return `${one} at ${gainText(gainDecibels)} would have ${roomText(roomDecibels)}.`
  }
  return `${one} would do it.`
}

/** Leads shorter than this are not to be had: then the capacitance inside is too much already, farads. */
const SHORTEST_LEAD_FARADS = 20e-12

const NEEDS: Record<Extract<Remedy, { kind: 'other-model' }>['needs'], string> = {
  gain: 'A preamp with more gain.',
  load: 'A preamp that loads it less.',
  'magnet-input': 'A preamp with an MM input.',
  'voltage-input': 'A preamp that takes voltage, not current.',
  room: 'A preamp that takes more before it distorts.',
}

/** What would make it fit, said as a thing to get or to do. */
export function remedySentence(remedy: Remedy, inputs: MatchInputs, alternatives: readonly Alternative[]): string {
  const names = namesOf(inputs)
  switch (remedy.kind) {
    case 'attenuator':
      return `An attenuator of ${decibels(remedy.decibels)} in the cable to ${names.next}.`
    case 'more-gain':
      return `It takes ${decibels(remedy.decibels)} more gain than there is.`
    case 'other-input':
      return `The ${remedy.pathId.toUpperCase()} input of ${names.preamp}.`
    case 'step-up':
      return `A step-up transformer of ${ratios(remedy)} into the MM input.`
    case 'without-step-up':
      return 'Leave out your step-up transformer.'
    case 'load-plug':
      return `A loading plug of ${amount(remedy.ohms, 'ohms')} at the input, both sides.`
    case 'lead':
      return remedy.farads < SHORTEST_LEAD_FARADS
        ? `No arm lead is short enough: what is inside ${names.preamp} is too much already.`
        : `An arm lead of ${amount(remedy.farads, 'farads')} at most.`
    case 'line-input':
      return `A line input of ${names.next.replace(/^that phono input$/, 'your amplifier')}.`
    case 'other-model':
      return alternatives[0] ? `${article(alternatives[0].modelName)} ${alternatives[0].modelName}.` : NEEDS[remedy.needs]
  }
}

function ratios({ ratioLow, ratioHigh }: { ratioLow: number; ratioHigh: number }): string {
  const [low, high] = [ratioLow.toFixed(0), ratioHigh.toFixed(0)]
  return low === high ? `1:${low}` : `1:${low} to 1:${high}`
}

const WITH_A_PLUG: ReadonlySet<Remedy['kind']> = new Set([
  'attenuator',
  'other-input',
  'step-up',
  'without-step-up',
  'load-plug',
  'lead',
  'line-input',
  'other-model',
])

/** True where doing it means moving a plug, so its caution has to stand before it. */
export function movesAPlug({ kind }: Remedy): boolean {
  return WITH_A_PLUG.has(kind)
}
