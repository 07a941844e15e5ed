import { ARMS } from '@/content/catalogue/arms'
import { CARTRIDGES } from '@/content/catalogue/cartridges/all'
import { INPUTS } from '@/content/catalogue/inputs'
import { LEADS } from '@/content/catalogue/leads'
import { PREAMPS } from '@/content/catalogue/preamps/all'
import { STEP_UPS } from '@/content/catalogue/step-ups'
import type { EntryOf } from './rows'
import type { CatalogueKind } from './terms'

/** The demo catalogue, by kind. All makers and models in it are invented. */
export const DEMO_ENTRIES: { [Kind in CatalogueKind]: EntryOf[Kind][] } = {
  preamps: PREAMPS,
  cartridges: CARTRIDGES,
  arms: ARMS,
  'step-ups': STEP_UPS,
  leads: LEADS,
  inputs: INPUTS,
}
