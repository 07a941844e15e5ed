import 'server-only'
import { createTransport } from 'nodemailer'
import type { SmtpSettings } from '@/lib/server/env-mail'
import { compose } from './compose'
import { failureOf, tidyAnswer } from './failure'
import type { Transport } from './transport'

/** So long each silence may last, and so long the whole. */
export interface Patience {
  connectMs: number
  silenceMs: number
  wholeMs: number
}

/** Much longer than a working server needs, and shorter than an attempt may hold its row. */
const PATIENCE: Patience = { connectMs: 15_000, silenceMs: 45_000, wholeMs: 90_000 }

interface Options {
  /** How this machine introduces itself. */
  helloName: string
  /** Certificates to trust besides the well-known ones, PEM. */
  trusted?: string
  patience?: Patience
}

/** Delivers over SMTP, one connection a mail. Encryption that was asked for and cannot be had is a failure. */
export function smtpTransport(settings: SmtpSettings, { helloName, trusted, patience = PATIENCE }: Options): Transport {
  const { host, port, security, credentials } = settings
  const mailer = createTransport({
    host,
    port,
    name: helloName,
    secure: security === 'tls',
    requireTLS: security === 'starttls',
    ignoreTLS: security === 'none',
    tls: trusted ? { ca: trusted } : undefined,
    auth: credentials ? { user: credentials.user, pass: credentials.password } : undefined,
    // A server that offers no sign-in, where one is set, is the wrong server.
    forceAuth: credentials !== null,
    connectionTimeout: patience.connectMs,
    greetingTimeout: patience.silenceMs,
    socketTimeout: patience.silenceMs,
    // Its own log would hold addresses and bodies.
    logger: false,
  })
  return {
    async deliver(mail) {
      try {
        const { response } = await mailer.sendMail({ ...compose(mail), signal: AbortSignal.timeout(patience.wholeMs) })
        return tidyAnswer(response)
      } catch (trouble) {
        throw failureOf(trouble)
      }
    },
  }
}
