import type { Metadata } from 'next'
import { CheckFormPage } from '@/components/check/check-form'
import { PlaysIntoFields } from '@/components/check/plays-into-fields'
import { newId } from '@/lib/kernel/ids'
import { pickPreamp } from '@/lib/setups/views-preamp'
import { makeSheet } from '../actions'
import { openCheck, type AddressParams } from '../open-check'

export const metadata: Metadata = { title: 'Plays into' }

export default async function PlaysIntoPage({ searchParams }: { searchParams: AddressParams }) {
  const check = await openCheck(searchParams)
  const { board } = pickPreamp(check.models, check.answers)
  return (
    <CheckFormPage
      {...check}
      step="plays-into"
      heading="What does it play into?"
      lead="How much the next input takes before it distorts decides the gain. After this comes your sheet."
      next="Make the sheet"
      send={makeSheet}
      sendKey={newId('frm')}
    >
      <PlaysIntoFields hasBalancedOutput={board?.preamp.hasBalancedOutput ?? false} />
    </CheckFormPage>
  )
}
