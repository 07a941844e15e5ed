import type { Metadata } from 'next'
import { CartridgeFields } from '@/components/check/cartridge-fields'
import { CheckFormPage } from '@/components/check/check-form'
import { YourCartridges } from '@/components/check/your-cartridges'
import { requestContext } from '@/lib/server/request-context'
import { cartridgeOffers } from '@/lib/shelf/offers'
import { openCheck, type AddressParams } from '../open-check'

export const metadata: Metadata = { title: 'Cartridge' }

export default async function CartridgePage({ searchParams }: { searchParams: AddressParams }) {
  return (
    <CheckFormPage
      {...await openCheck(searchParams)}
      step="cartridge"
      heading="Which cartridge is it?"
      lead={'The values are on the leaflet that came with it. If it is long gone, choose "Don\'t know" and carry on.'}
      next="Next: arm and cable"
      send="/check/next"
    >
      <YourCartridges offers={cartridgeOffers(await requestContext())} />
      <CartridgeFields />
    </CheckFormPage>
  )
}
