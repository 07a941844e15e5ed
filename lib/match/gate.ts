import type { MatchInputs } from './inputs'
import type { Gate } from './result'

/**
 * What no arithmetic here applies to. Ceramic and crystal cartridges follow amplitude and want about 1 MΩ; strain
 * gauges and optical ones carry a supply voltage on their wires; a current-mode input has no load to set, and its
 * gain depends on the coil. A moving coil of ordinary magnet output passes: its numbers decide, not its name.
 */
export function gateOf({ cartridge, preamp }: MatchInputs): Gate | null {
  const { type } = cartridge
  if (type === 'ceramic' || type === 'strain-gauge' || type === 'optical') return { reason: 'not-magnetic', type }
  if (preamp.inputMode === 'current') {
    const { low, nominal, high } = cartridge.coilOhms
    return { reason: 'current-input', coilOhms: { low, nominal, high } }
  }
  return null
}
