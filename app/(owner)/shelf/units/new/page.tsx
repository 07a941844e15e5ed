import type { Metadata } from 'next'
import Link from 'next/link'
import { AddUnitForm } from '@/components/shelf/add-unit-form'
import { ModelsToAdd } from '@/components/shelf/models-to-add'
import { listPreamps } from '@/lib/catalogue/queries'
import { ownContext } from '@/lib/server/enter'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { addUnitAction } from '../actions'

export const metadata: Metadata = { title: 'Add a preamp' }

export default async function AddUnitPage({ searchParams }: { searchParams: SearchParams }) {
  const chosen = await oneParam(searchParams, 'model')
  const preamps = listPreamps(await ownContext(chosen ? `/shelf/units/new?model=${encodeURIComponent(chosen)}` : '/shelf/units/new'))
  const model = preamps.find(({ id }) => id === chosen)
  return (
    <main id="main" className="w pg shelf">
      <p className="crumb">
        <Link href="/shelf">My sheets</Link> / {model ? <Link href="/shelf/units/new">Add a preamp</Link> : 'Add a preamp'}
      </p>
      <h1>{model ? `Your ${model.name}` : 'Which preamp is it?'}</h1>
      {model ? <AddUnitForm action={addUnitAction} model={model} boards={model.boards.map(({ id, name }) => ({ id, name }))} /> : <ModelsToAdd preamps={preamps} />}
    </main>
  )
}
