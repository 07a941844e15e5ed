import type { Metadata } from 'next'
import { ArmFields } from '@/components/check/arm-fields'
import { CheckFormPage } from '@/components/check/check-form'
import { openCheck, type AddressParams } from '../open-check'

export const metadata: Metadata = { title: 'Arm and cable' }

export default async function ArmPage({ searchParams }: { searchParams: AddressParams }) {
  return (
    <CheckFormPage
      {...await openCheck(searchParams)}
      step="arm"
      heading="Which arm and lead?"
      lead="The lead adds capacitance, the arm decides where it all resonates. Both are usual enough to go on without."
      next="Next: plays into"
      send="/check/next"
    >
      <ArmFields />
    </CheckFormPage>
  )
}
