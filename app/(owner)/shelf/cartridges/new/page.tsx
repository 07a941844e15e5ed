import type { Metadata } from 'next'
import Link from 'next/link'
import { CartridgeForm } from '@/components/shelf/cartridge-form'
import { ownContext } from '@/lib/server/enter'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { answersFrom, toQuery } from '@/lib/setups/schema'
import { cartridgeAnswersOf } from '@/lib/shelf/views-answers'
import { addCartridgeAction } from '../actions'

export const metadata: Metadata = { title: 'Add a cartridge' }

export default async function AddCartridgePage({ searchParams }: { searchParams: SearchParams }) {
  const answers = cartridgeAnswersOf(answersFrom(await searchParams))
  const fromSheet = await oneParam(searchParams, 'fromSheet')
  await ownContext(`/shelf/cartridges/new?${toQuery(answers)}${fromSheet && `&fromSheet=${encodeURIComponent(fromSheet)}`}`)
  return (
    <main id="main" className="w pg shelf">
      <p className="crumb">
        <Link href="/shelf">My sheets</Link> / Add a cartridge
      </p>
      <h1>Which cartridge is it?</h1>
      <p className="lead">Type its name: what is in our list fills in by itself. Everything else can be left as it is.</p>
      <CartridgeForm action={addCartridgeAction} answers={answers} begin={{ hours: '', notes: '' }} values={fromSheet ? { fromSheet } : {}} button="Put it on my shelf" />
    </main>
  )
}
