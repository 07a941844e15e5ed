import 'server-only'
import { headers } from 'next/headers'
import type { Origin } from '@/lib/accounts/origin'
import { addressOf } from './rate-limit'

/** The longest line that a browser says about itself and that we look at. */
const LONGEST_LINE = 400

/** Where the request at hand came from. */
export async function requestOrigin(): Promise<Origin> {
  const sent = await headers()
  return { address: addressOf(sent), userAgent: (sent.get('user-agent') ?? '').slice(0, LONGEST_LINE) }
}
