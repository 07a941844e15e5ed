import 'server-only'
import type { Actor, SignedIn } from '@/lib/access/actor'
import { permit } from '@/lib/access/permit'
import { Fault } from '@/lib/kernel/errors'

/**
 * Whoever asks, as the owner of a shelf.
 * @throws Fault sign_in for a visitor; not_found for someone who has none at this moment
 */
export function mustHaveShelf(actor: Actor, permission: 'shelf:read' | 'unit:add' | 'cartridge:add'): SignedIn {
  permit(actor, permission)
  if (actor.kind === 'visitor') throw new Fault('sign_in', 'Sign in first.')
  return actor
}
