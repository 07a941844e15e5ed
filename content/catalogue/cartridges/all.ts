import type { CartridgeEntry } from '@/lib/catalogue/schema'
import { HIGH_OUTPUT_COILS } from './moving-coil-high'
import { LOW_OUTPUT_COILS } from './moving-coil-low'
import { MOVING_IRONS } from './moving-iron'
import { MOVING_MAGNETS } from './moving-magnet'
import { SPECIAL_CARTRIDGES } from './special'

/** Every cartridge of the demo catalogue. Makers, models and figures are invented. */
export const CARTRIDGES: CartridgeEntry[] = [
  ...MOVING_MAGNETS,
  ...MOVING_IRONS,
  ...HIGH_OUTPUT_COILS,
  ...LOW_OUTPUT_COILS,
  ...SPECIAL_CARTRIDGES,
]
