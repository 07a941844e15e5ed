import type { PreampEntry } from '@/lib/catalogue/schema-preamp'
import { EMBER_3 } from './ember-3'
import { MERRIN_5 } from './merrin-5'
import { SEDGE_1 } from './sedge-1'
import { TARN_2 } from './tarn-2'

/** Every preamp of the demo maker. */
export const PREAMPS: PreampEntry[] = [SEDGE_1, TARN_2, MERRIN_5, EMBER_3]
