'use client'

import { STEP_PATHS } from '@/lib/setups/views-steps'
import type { CartridgeOffer } from '@/lib/shelf/views'
import { withCartridge } from '@/lib/shelf/views-answers'
import { useCheckForm } from './form-context'
import { Yours } from './yours'

/** The cartridges on the shelf of whoever is signed in. */
export function YourCartridges({ offers }: { offers: readonly CartridgeOffer[] }) {
  const { raw } = useCheckForm()
  // By another name it is another cartridge.
  const chosen = offers.find(({ id, answers }) => id === raw.own && answers.name === raw.name)?.id
  return <Yours id="yours" help="From your shelf, with its leaflet." offers={offers} path={STEP_PATHS.cartridge} chosen={chosen} fill={withCartridge} />
}
