import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { CarryOn } from '@/components/check/carry-on'
import { CheckFormPage } from '@/components/check/check-form'
import { PreampFields } from '@/components/check/preamp-fields'
import { fromQuery, toQuery } from '@/lib/setups/schema'
import { requestContext } from '@/lib/server/request-context'
import { unitOffers } from '@/lib/shelf/offers'
import { openCheck, type AddressParams } from './open-check'

export const metadata: Metadata = { title: 'Check a cartridge' }

export default async function PreampPage({ searchParams }: { searchParams: AddressParams }) {
  const { from, serial } = await searchParams
  // Answers handed on as one text are the same answers in the address.
  if (typeof from === 'string') redirect(`/check?${toQuery(fromQuery(from))}`)
  const check = await openCheck(searchParams)
  return (
    <CheckFormPage
      {...check}
      step="preamp"
      heading="Which preamp is it?"
      lead="Four short questions, then a sheet that says whether your cartridge suits it and which switches to move."
      next="Next: cartridge"
      send="/check/next"
    >
      {check.made.query === '' && <CarryOn />}
      <PreampFields units={unitOffers(await requestContext())} models={check.models} serialTrouble={serial === 'not-figures' || serial === 'no-board' ? serial : null} />
    </CheckFormPage>
  )
}
