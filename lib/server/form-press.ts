import 'server-only'
import { headers } from 'next/headers'
import type { Context } from '@/lib/kernel/context'
import { env } from './env'
import { addressOf, countRequest, type Limit } from './rate-limit'

/** Forms that make a check or change a sheet. A person presses one now and then. */
const FORM_LIMIT: Limit = { name: 'forms', perAddress: 60, together: 1200, seconds: 60 }

/** Counts a press of such a form. @throws Fault too_many */
export async function countFormPress({ db }: Pick<Context, 'db'>) {
  await countRequest(db, FORM_LIMIT, { address: addressOf(await headers()), secret: env().appSecret })
}
