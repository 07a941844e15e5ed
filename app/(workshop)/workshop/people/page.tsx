import type { Metadata } from 'next'
import { InviteForm } from '@/components/accounts/invite-form'
import { PeopleTable } from '@/components/accounts/people-table'
import { dayWords, ROLE_WORDS } from '@/lib/accounts/format'
import { listInvitations, listPeople } from '@/lib/accounts/queries'
import { ownContext } from '@/lib/server/enter'
import { orNotFound } from '@/lib/server/or-not-found'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { changeRoleAction, disableAction, enableAction, inviteAction } from './actions'

export const metadata: Metadata = { title: 'People' }

export default async function PeoplePage({ searchParams }: { searchParams: SearchParams }) {
  const context = await ownContext('/workshop/people')
  const text = await oneParam(searchParams, 'text')
  const { people, more } = await orNotFound(() => listPeople(context, { text }))
  const invitations = listInvitations(context)
  return (
    <main id="main" className="w pg ppl acct">
      <h1>People</h1>
      <section className="two apt" aria-labelledby="invite">
        <div>
          <h2 id="invite">Let someone in</h2>
          <p>Owners come by themselves. Staff and admins get a mail with a link that lasts a week.</p>
        </div>
        <div>
          <InviteForm action={inviteAction} />
          {invitations.length > 0 && (
            <>
              <h3>On their way</h3>
              <ul>
                {invitations.map(({ email, role, expiresAt }) => (
                  <li key={email}>
                    {email}, {ROLE_WORDS[role].toLowerCase()}, until {dayWords(expiresAt)}
                  </li>
                ))}
              </ul>
            </>
          )}
        </div>
      </section>
      <section aria-labelledby="people">
        <h2 id="people">Everyone</h2>
        <form className="row" role="search">
          <label className="tf">
            <span className="vh">Name or mail address</span>
            <input className="tx-in" name="text" defaultValue={text} type="search" placeholder="Name or mail address" />
          </label>
          <button className="b" type="submit">
            Find
          </button>
        </form>
        <PeopleTable people={people} changeRole={changeRoleAction} disable={disableAction} enable={enableAction} />
        {more > 0 && <p className="note">{more} more. Find them by name or address.</p>}
        {people.length === 0 && <p>Nobody by that name or address.</p>}
      </section>
    </main>
  )
}
