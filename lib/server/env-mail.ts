import 'server-only'
import { z } from 'zod'
import { isOneAddress } from '@/lib/mail/address'
import { MAKER } from '@/lib/maker/terms'

/** How the way to the mail server is kept private. */
export const SMTP_SECURITIES = ['starttls', 'tls', 'none'] as const
export type SmtpSecurity = (typeof SMTP_SECURITIES)[number]

/** Where each usually listens. RFC 8314 (465), RFC 6409 (587), RFC 5321 (25). */
const USUAL_PORTS: Record<SmtpSecurity, number> = { tls: 465, starttls: 587, none: 25 }

export interface Sender {
  name: string
  address: string
}

export interface SmtpSettings {
  host: string
  port: number
  security: SmtpSecurity
  credentials: { user: string; password: string } | null
}

export interface MailEnv {
  from: Sender
  /** Null: mail is kept in the local mailbox and goes nowhere. */
  smtp: SmtpSettings | null
}

/** A setting left empty counts as not set. */
const optional = z
  .string()
  .optional()
  .transform((text) => text?.trim() || undefined)

export const MAIL_FIELDS = {
  SMTP_HOST: optional.refine((host) => !host || /^[\w.:-]+$/.test(host), 'SMTP_HOST must be a host by itself, such as mail.example.org.'),
  SMTP_PORT: optional.refine((port) => !port || isPort(port), 'SMTP_PORT must be a whole number from 1 to 65535.'),
  SMTP_SECURITY: optional.pipe(
    z.enum(SMTP_SECURITIES, 'SMTP_SECURITY must be starttls, tls or none.').default('starttls'),
  ),
  SMTP_USER: optional,
  SMTP_PASSWORD: z.string().optional(),
  MAIL_FROM: optional.refine(
    (text) => !text || readSender(text) !== null,
    'MAIL_FROM must be an address, with or without a name: Oskerby workshop <workshop@example.org>.',
  ),
}

type MailSettings = z.infer<z.ZodObject<typeof MAIL_FIELDS>>

/** What is wrong between the settings of mail, each alone being right. */
export function checkMailSettings(settings: MailSettings, { addIssue }: Pick<z.RefinementCtx, 'addIssue'>) {
  const { SMTP_HOST, SMTP_SECURITY, SMTP_USER, SMTP_PASSWORD, MAIL_FROM } = settings
  if (!SMTP_HOST) return
  if (!MAIL_FROM) addIssue('MAIL_FROM is missing. With a mail server set, name the address that mail comes from.')
  if (!SMTP_USER !== !SMTP_PASSWORD) addIssue('SMTP_USER and SMTP_PASSWORD go together: set both, or neither.')
  else if (SMTP_USER && SMTP_SECURITY === 'none' && !isLoopback(SMTP_HOST))
    addIssue('SMTP_SECURITY is none, and anyone on the way could read SMTP_PASSWORD. Set it to starttls or tls.')
}

export function toMailEnv(settings: MailSettings): MailEnv {
  const { SMTP_HOST, SMTP_PORT, SMTP_SECURITY, SMTP_USER, SMTP_PASSWORD, MAIL_FROM } = settings
  const from = (MAIL_FROM && readSender(MAIL_FROM)) || { name: MAKER.fullName, address: MAKER.address }
  if (!SMTP_HOST) return { from, smtp: null }
  return {
    from,
    smtp: {
      host: SMTP_HOST,
      port: SMTP_PORT ? Number(SMTP_PORT) : USUAL_PORTS[SMTP_SECURITY],
      security: SMTP_SECURITY,
      credentials: SMTP_USER && SMTP_PASSWORD ? { user: SMTP_USER, password: SMTP_PASSWORD } : null,
    },
  }
}

/** Reads "Name <address>" or an address by itself; null when it is neither. */
function readSender(text: string): Sender | null {
  const named = /^([^<>"\p{Cc}]*)<([^<>]+)>$/u.exec(text)
  const sender = named ? { name: named[1].trim(), address: named[2].trim() } : { name: '', address: text }
  return isOneAddress(sender.address) ? sender : null
}

const isPort = (text: string) => /^\d{1,5}$/.test(text) && Number(text) >= 1 && Number(text) <= 65_535

const isLoopback = (host: string) => ['localhost', '127.0.0.1', '::1'].includes(host)
