import 'server-only'
import { deleteDueAccounts } from '@/lib/accounts/delete-due-accounts'
import { sweepAccounts } from '@/lib/accounts/sweep'
import { configuredDelivery } from '@/lib/mail/delivery'
import { sweepOutbox } from '@/lib/mail/sweep'
import { startWorker } from '@/lib/mail/worker'
import { env, isLocal } from './env'
import { log } from './log'
import { nobodysContext } from './nobodys-context'

const HOUR_MS = 60 * 60_000

/** What is done once an hour, nobody asking for it. */
const CHORES = { sweepOutbox, sweepAccounts, deleteDueAccounts }

/**
 * Starts what runs beside the requests: mail on its way out, and the chores. On a signal to stop, mail under way is
 * let finish; what has not finished when the process ends is put back.
 */
export function startBackground() {
  const { mail, publicAddress } = env()
  if (!mail.smtp && !isLocal(publicAddress)) {
    log().warn('No mail server is set: mail goes nowhere, and admins can read every link in it. Set SMTP_HOST.')
  }
  const worker = startWorker(configuredDelivery())
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.once(signal, () => void worker.stop())
  process.once('exit', worker.abandon)
  doChores()
  setInterval(doChores, HOUR_MS).unref()
}

function doChores() {
  for (const [name, chore] of Object.entries(CHORES)) {
    try {
      chore(nobodysContext())
    } catch (trouble) {
      log().error({ err: trouble, chore: name }, 'A chore failed.')
    }
  }
}
