import type { CartridgeEntry } from '@/lib/catalogue/schema'

/**
 * What cartridges of each type come to in practice. Source: collected from makers' sheets and manuals, read in part,
 * memory in part:
 *
 * | type | output at 5 cm/s | coil Ω | inductance | usual load |
 * |---|---|---|---|---|
 * | moving magnet | 2.5–10 mV | 400–1500 | 250–900 mH | 47k, 100–500 pF |
 * | moving iron / induced magnet | 2–6 mV | 300–1000 | 30–550 mH | 47k, 100–400 pF |
 * | high-output moving coil | 1–2.5 mV | 70–200 | 0.06–2 mH | 1k–47k |
 * | low-output moving coil | 0.1–0.7 mV | 2–45 | 2–60 µH | 30 Ω–1k |
 */
export interface RangesInPractice {
  outputMillivolts: [number, number]
  coilOhms: [number, number]
  inductanceMillihenries: [number, number]
  /** A printed load must share some resistance with this. */
  loadOhms: [number, number]
  /** Null where capacitance does not matter. */
  loadPicofarads: [number, number] | null
}

const RANGES = {
  'moving-magnet': {
    outputMillivolts: [2.5, 10],
    coilOhms: [400, 1500],
    inductanceMillihenries: [250, 900],
    loadOhms: [47_000, 47_000],
    loadPicofarads: [100, 500],
  },
  'moving-iron': {
    outputMillivolts: [2, 6],
    coilOhms: [300, 1000],
    inductanceMillihenries: [30, 550],
    loadOhms: [47_000, 47_000],
    loadPicofarads: [100, 400],
  },
  'high-output': {
    outputMillivolts: [1, 2.5],
    coilOhms: [70, 200],
    inductanceMillihenries: [0.06, 2],
    loadOhms: [1000, 47_000],
    loadPicofarads: null,
  },
  'low-output': {
    outputMillivolts: [0.1, 0.7],
    coilOhms: [2, 45],
    inductanceMillihenries: [0.002, 0.06],
    loadOhms: [30, 1000],
    loadPicofarads: null,
  },
} satisfies Record<string, RangesInPractice>

/** The ranges a cartridge is held against; null for what is no magnet, iron or coil, or a coil of unknown strength. */
export function rangesFor({ type, variety }: Pick<CartridgeEntry, 'type' | 'variety'>): RangesInPractice | null {
  if (type === 'moving-magnet' || type === 'moving-iron') return RANGES[type]
  if (type !== 'moving-coil') return null
  return variety === 'high-output' || variety === 'low-output' ? RANGES[variety] : null
}
