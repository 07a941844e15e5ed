import type { Metadata } from 'next'
import Link from 'next/link'
import { PressForm } from '@/components/forms/press-form'
import { CartridgeForm } from '@/components/shelf/cartridge-form'
import { HoursForm } from '@/components/shelf/hours-form'
import { ownContext } from '@/lib/server/enter'
import { orNotFound } from '@/lib/server/or-not-found'
import type { SearchParams } from '@/lib/server/search-params'
import { answersFrom } from '@/lib/setups/schema'
import { hoursText } from '@/lib/shelf/format'
import { getOwnedCartridge } from '@/lib/shelf/queries'
import { cartridgeAnswersOf } from '@/lib/shelf/views-answers'
import { addHoursAction, archiveCartridgeAction, changeCartridgeAction, restoreCartridgeAction } from '../actions'

export const metadata: Metadata = { title: 'Your cartridge' }

interface Props {
  params: Promise<{ id: string }>
  /** Answers looked up or put right without script; the ones that are kept otherwise. */
  searchParams: SearchParams
}

export default async function CartridgePage({ params, searchParams }: Props) {
  const { id } = await params
  const context = await ownContext(`/shelf/cartridges/${encodeURIComponent(id)}`)
  const cartridge = await orNotFound(() => getOwnedCartridge(context, id))
  const looked = cartridgeAnswersOf(answersFrom(await searchParams))
  const { name, stylusHours, notes, archived } = cartridge
  return (
    <main id="main" className="w pg shelf">
      <p className="crumb">
        <Link href="/shelf">My sheets</Link> / {archived ? 'Put away' : 'Your cartridge'}
      </p>
      <h1>{name}</h1>
      {stylusHours !== null && <p className="lead">Its stylus has played {hoursText(cartridge)}.</p>}
      <section className="two part" aria-labelledby="count">
        <h2 id="count">Count hours</h2>
        <HoursForm key={stylusHours ?? 'none'} action={addHoursAction} cartridgeId={id} counted={stylusHours} />
      </section>
      <section className="two part" aria-labelledby="about">
        <h2 id="about">About it</h2>
        <CartridgeForm
          action={changeCartridgeAction}
          answers={Object.keys(looked).length > 0 ? looked : cartridge.answers}
          begin={{ hours: stylusHours === null ? '' : String(stylusHours), notes }}
          values={{ cartridgeId: id }}
          button="Keep the changes"
        />
      </section>
      <section className="two part" aria-labelledby="away">
        <h2 id="away">{archived ? 'Bring it back' : 'Put it away'}</h2>
        <div>
          <p>{archived ? 'It stands on your shelf again, with its sheets.' : 'Sold, or worn out? Its sheets stay. You can bring it back.'}</p>
          <PressForm action={archived ? restoreCartridgeAction : archiveCartridgeAction} values={{ cartridgeId: id }} button="b">
            {archived ? 'Bring it back' : 'Put it away'}
          </PressForm>
        </div>
      </section>
    </main>
  )
}
