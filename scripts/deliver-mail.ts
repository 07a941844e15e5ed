import { configuredDelivery } from '@/lib/mail/delivery'
import { deliverDue } from '@/lib/mail/worker'
import { settingsOrExit } from './support/settings-or-exit'

// Delivers what is due now and ends. The server does so by itself; this is for when it stands still.
settingsOrExit()
void deliverDue(configuredDelivery()).then((attempts) =>
  console.log(`${attempts} ${attempts === 1 ? 'mail was' : 'mails were'} tried. The outbox says what came of it.`),
)
