import type { MatchInputs } from '../../match/inputs'
import type { Gate } from '../../match/result'
import { figureText } from '../format'
import { namesOf } from './names'

/** Answers for what no figure here would be true of. No arithmetic, so no numbers but the one that was given. */

export function gateTitle(gate: Gate): string {
  if (gate.reason === 'current-input') return 'This input is another kind.'
  const titles = {
    ceramic: 'It does not suit: a ceramic cartridge is another kind.',
    'strain-gauge': 'It does not suit: a strain gauge is another kind.',
    optical: 'It does not suit: an optical cartridge is another kind.',
  }
  return titles[gate.type]
}

export function gateLead(gate: Gate, inputs: MatchInputs): string[] {
  const { preamp, cartridge } = namesOf(inputs)
  if (gate.reason === 'current-input') {
    return [
      `${preamp.replace(/^the/, 'The')} takes the current of a coil, not its voltage, so there is no load to choose and our figures would be wrong for it.`,
      `What counts is the resistance of the coil: for ${cartridge} we have ${figureText(gate.coilOhms, 'ohms')}. Hold that against the range in the manual.`,
    ]
  }
  const answers = {
    ceramic: [
      `${preamp.replace(/^the/, 'The')} is made for magnets and coils. A ceramic or crystal cartridge follows how far the groove swings, not how fast, and is many times stronger.`,
      'It goes into a line input of very high resistance, about 1 MΩ. A phono input would be far too loud and would equalise it twice.',
    ],
    'strain-gauge': [
      `${preamp.replace(/^the/, 'The')} is made for magnets and coils. A strain gauge makes no voltage of its own and needs a supply on its leads.`,
      'It goes into the unit that its maker sells with it, and that into a line input.',
    ],
    optical: [
      `${preamp.replace(/^the/, 'The')} is made for magnets and coils. An optical cartridge needs light and a supply on its leads, and follows how far the groove swings.`,
      'It goes into the unit that its maker sells with it, and that into a line input.',
    ],
  }
  return answers[gate.type]
}

/** What would do, for the list under the verdict. */
export function gateRemedies(gate: Gate): string[] {
  if (gate.reason === 'current-input') return ['A preamp whose input takes voltage.']
  if (gate.type === 'ceramic') return ['A line input of about 1 MΩ.', 'A moving magnet or moving coil cartridge.']
  return ['The unit made for it by its maker.', 'A moving magnet or moving coil cartridge.']
}
