import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { EntryPage } from '@/components/accounts/entry-page'
import { SignInForm } from '@/components/accounts/sign-in-form'
import { WhatFor } from '@/components/accounts/what-for'
import { pathWithin } from '@/lib/kernel/path-within'
import { FIRST_PAGE } from '@/lib/server/enter'
import { requestActor } from '@/lib/server/request-context'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { signInAction } from './actions'

export const metadata: Metadata = { title: 'Sign in' }

export default async function SignInPage({ searchParams }: { searchParams: SearchParams }) {
  const next = pathWithin(await oneParam(searchParams, 'next'), FIRST_PAGE)
  if ((await requestActor()).kind === 'person') redirect(next)
  const note = (await oneParam(searchParams, 'set')) === 'password' ? 'Your new password is set. Sign in with it.' : undefined
  return (
    <EntryPage aside={<WhatFor />}>
      <SignInForm action={signInAction} next={next} note={note} />
    </EntryPage>
  )
}
