import { eq } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { outbox } from '@/db/schema/mail'
import type { Delivery } from '@/lib/mail/deliver'
import { enqueue } from '@/lib/mail/enqueue'
import { smtpTransport, type Patience } from '@/lib/mail/smtp-transport'
import type { SmtpSettings } from '@/lib/server/env-mail'
import { NOW } from './world'

const SITE = 'http://localhost:3000'

/** Longer than a loopback server needs, short enough to wait for. */
const IMPATIENT: Patience = { connectMs: 2000, silenceMs: 300, wholeMs: 2000 }
const PATIENT: Patience = { connectMs: 20_000, silenceMs: 20_000, wholeMs: 60_000 }

interface Options {
  trusted?: string
  impatient?: boolean
}

/** Delivering to a server of the tests, with a clock that a test sets. */
export function testDelivery(db: Database, settings: SmtpSettings, { trusted, impatient = false }: Options = {}) {
  const time = { now: NOW }
  const transport = smtpTransport(settings, { helloName: 'localhost', trusted, patience: impatient ? IMPATIENT : PATIENT })
  const delivery: Delivery = {
    db,
    transport,
    from: { name: 'Oskerby workshop', address: 'workshop@oskerby.example' },
    site: SITE,
    clock: () => time.now,
    random: () => 0.5,
  }
  return { delivery, time }
}

/** Puts a mail with a one-time link into the outbox. @returns the row's id */
export function post(db: Database, to = 'ann@oskerby.example', { goodUntil }: { goodUntil?: number } = {}): string {
  const link = `${SITE}/sign-in/link?token=once-and-secret`
  return enqueue(db, { template: 'link', to, props: { link, minutes: 15 }, now: NOW, goodUntil })
}

export function rowOf(db: Database, id: string) {
  const row = db.select().from(outbox).where(eq(outbox.id, id)).get()
  if (!row) throw new Error(`There is no mail ${id}.`)
  return row
}
