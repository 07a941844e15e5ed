import { SettingsError } from '@/lib/server/env'
import { beat } from '@/lib/server/heartbeat'
import { nobodysContext } from '@/lib/server/nobodys-context'

/** Never answered from a cache, nor while building. */
export const dynamic = 'force-dynamic'

const answer = (status: number, body: object) =>
  Response.json(body, { status, headers: { 'Cache-Control': 'no-store' } })

/** 200 when the database takes a write and gives it back, 503 when it does not, 500 when the settings are wrong. */
export function GET() {
  try {
    beat(nobodysContext())
    return answer(200, { status: 'ok', database: 'ok' })
  } catch (trouble) {
    if (trouble instanceof SettingsError) return answer(500, { status: 'settings', sentences: trouble.sentences })
    return answer(503, { status: 'unavailable', database: 'unavailable' })
  }
}
