import 'server-only'
import type { Database } from '@/db/client'
import type { Actor } from '@/lib/access/actor'
import { permit, type Permitted } from '@/lib/access/permit'
import type { Permission } from '@/lib/access/rules'
import { Fault } from '@/lib/kernel/errors'
import { mustBePerson, type Person } from './people'

type AccountPermission = Extract<Permission, `account:${string}`>

/**
 * The row of whoever asks, for doing something to their own account.
 * @throws Fault sign_in for a visitor; not_allowed, not_found as `permit` says
 */
export function mustBeSelf<P extends AccountPermission>(db: Pick<Database, 'select'>, actor: Actor, permission: P): Permitted<Person, P> {
  if (actor.kind === 'visitor') throw new Fault('sign_in', 'Sign in first.')
  return permit(actor, permission, mustBePerson(db, actor.id))
}
