import type { Metadata } from 'next'
import { EntryPage } from '@/components/accounts/entry-page'
import { JoinForm } from '@/components/accounts/join-form'
import { WhatFor } from '@/components/accounts/what-for'
import { joinAction } from './actions'

export const metadata: Metadata = { title: 'Join' }

export default function JoinPage() {
  return (
    <EntryPage aside={<WhatFor />}>
      <JoinForm action={joinAction} />
    </EntryPage>
  )
}
