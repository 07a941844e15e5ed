import { DEMO_PEOPLE, demoPassword, demoSecret } from '@/lib/accounts/demo'
import { personByAddress } from '@/lib/accounts/people'
import { generatorOf } from '@/lib/accounts/second-factor'
import { currentTime } from '@/lib/kernel/clock'
import { database } from '@/lib/server/database'
import { settingsOrExit } from './support/settings-or-exit'

// Prints how to sign in as each of the demo's people. The passwords are this installation's own. For the admin it prints
// what an authenticator app would show now; run it again for the next code.
settingsOrExit()
const db = database()
const now = currentTime()

for (const { email, role } of DEMO_PEOPLE) {
  const person = personByAddress(db, email)
  if (!person?.demo) continue
  const closed = person.disabledAt === null ? '' : '  (closed)'
  console.log(`${role.padEnd(5)}  ${email.padEnd(28)}  ${demoPassword(email)}${closed}`)
  if (role !== 'admin') continue
  const authenticator = generatorOf(demoSecret(email), email)
  const seconds = Math.ceil(authenticator.remaining({ timestamp: now }) / 1000)
  console.log(`       code from the authenticator: ${authenticator.generate({ timestamp: now })}, for ${seconds} s more`)
  console.log(`       its secret, for an app of your own: ${authenticator.secret.base32}`)
  console.log('       the next code: npm run demo:sign-ins')
}
