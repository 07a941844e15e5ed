import { eq } from 'drizzle-orm'
import { describe, expect, test } from 'vitest'
import { people } from '@/db/schema/accounts'
import { askForLink } from '@/lib/accounts/ask-for-link'
import { askForReset } from '@/lib/accounts/ask-for-reset'
import { askToChangeAddress } from '@/lib/accounts/ask-to-change-address'
import { disablePerson } from '@/lib/accounts/disable-person'
import { join } from '@/lib/accounts/join'
import { signInWithPassword } from '@/lib/accounts/sign-in-with-password'
import { Fault } from '@/lib/kernel/errors'
import type { Context } from '@/lib/kernel/context'
import { mails } from '../support/mails'
import { AT_HOME } from '../support/origins'
import { world } from '../support/world'

const ASKED = 'bob@brandreth.example'
const PASSWORD = 'a wren on a tarn'

/** All that comes back to whoever asks. */
async function answerTo(run: () => unknown): Promise<unknown> {
  try {
    return { answer: await run() }
  } catch (trouble) {
    if (!(trouble instanceof Fault)) throw trouble
    return { code: trouble.code, message: trouble.message, fields: trouble.fields, retryAfterSeconds: trouble.retryAfterSeconds }
  }
}

/** Everything that someone can ask about an address that is not theirs. */
const QUESTIONS: [name: string, ask: (context: Context) => unknown][] = [
  ['signing in', (context) => signInWithPassword(context, { email: ASKED, password: 'a guess of mine' }, AT_HOME)],
  ['joining', (context) => join(context, { name: 'Bob', email: ASKED, password: PASSWORD }, AT_HOME)],
  ['joining with a common password', (context) => join(context, { name: 'Bob', email: ASKED, password: 'password123' }, AT_HOME)],
  ['asking for a link', (context) => askForLink(context, { email: ASKED }, AT_HOME)],
  ['asking for a new password', (context) => askForReset(context, { email: ASKED }, AT_HOME)],
  ['asking to change one’s own address to it', (context) => askToChangeAddress(context, { email: ASKED }, AT_HOME)],
]

/** The address has no account, one, one with a password, one that is closed, one about to be deleted. */
const STATES = ['none', 'one', 'with a password', 'closed', 'about to go'] as const

function worldWhere(state: (typeof STATES)[number]) {
  const here = world()
  const set = (values: Partial<typeof people.$inferInsert>) =>
    here.db.update(people).set(values).where(eq(people.id, here.person('bob').id)).run()
  if (state === 'one') here.person('bob')
  if (state === 'with a password') set({ passwordHash: '$argon2id$v=19$m=19456,t=2,p=1$c29tZXNhbHRzb21lc2FsdA$hLXKmEVFQUDSmfkqAvJkvzQGbIwWLmVbQZ9GJbO1tbE' })
  if (state === 'closed') disablePerson(here.as('iris'), { personId: here.person('bob').id })
  if (state === 'about to go') set({ deletionAskedAt: 1 })
  return here
}

describe.each(QUESTIONS)('%s', (_name, ask) => {
  // Passwords are slow to look at on purpose, and this looks at sixty.
  test('gives the same answer whatever the address is to us, as often as it is asked', { timeout: 120_000 }, async () => {
    const answers = await Promise.all(
      STATES.map(async (state) => {
        const here = worldWhere(state)
        const context = here.as('ann')
        const all = []
        for (let k = 0; k < 12; k++) all.push(await answerTo(() => ask(context)))
        return all
      }),
    )
    for (const each of answers.slice(1)) expect(each).toEqual(answers[0])
  })
})

test('who has the mailbox is told: by mail alone', async () => {
  const here = world()
  here.person('bob')
  await join(here.at(), { name: 'Bob', email: ASKED, password: PASSWORD }, AT_HOME)
  expect(mails(here.db)).toEqual([
    {
      template: 'already-joined',
      to: ASKED,
      props: { link: 'http://localhost:3000/sign-in', resetLink: 'http://localhost:3000/reset-password' },
    },
  ])
})
