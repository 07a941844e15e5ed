import 'server-only'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { permit } from '@/lib/access/permit'
import { enqueue } from '@/lib/mail/enqueue'
import { countAttempt, LIMITS } from './attempts'
import { personByAddress } from './people'
import type { InviteInput } from './schema'
import { issueLink, voidLinks } from './tokens'

const KNOWN = 'This address has an account. Change its role in the list.'

/**
 * Sends someone a link into the workshop. A new one makes the one before void.
 * @throws Fault sign_in, not_found as `permit` says; bad_input for an address that has an account; too_many
 */
export function invitePerson({ db, actor, now }: Context, { email, role }: InviteInput) {
  permit(actor, 'people:invite')
  if (actor.kind === 'visitor') throw new Fault('sign_in', 'Sign in first.')
  countAttempt(db, LIMITS.invitationsByAdmin, actor.id, now)
  db.transaction((tx) => {
    // An admin sees the whole list of people, so this gives nothing away.
    if (personByAddress(tx, email)) throw new Fault('bad_input', KNOWN, { fields: { email: KNOWN } })
    voidLinks(tx, ['invite'], email, now)
    const { goodUntil, ...link } = issueLink(tx, { purpose: 'invite', email, role, personId: actor.id }, now)
    enqueue(tx, { template: 'invitation', to: email, now, goodUntil, props: { ...link, role, invitedBy: actor.name } })
  })
}
