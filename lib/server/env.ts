import 'server-only'
import { join } from 'node:path'
import { z } from 'zod'
import { checkMailSettings, MAIL_FIELDS, toMailEnv, type MailEnv } from './env-mail'

const SECRET_LENGTH = 32
/** The secret of `.env.example` runs on a desk, and must not guard anything in earnest. */
const EXAMPLE_SECRET = /^change-me/

const Settings = z.object({
  DATA_DIR: z.string('DATA_DIR is missing. Name the folder where the database lives, such as ./data.').trim()
    .min(1, 'DATA_DIR is empty. Name the folder where the database lives, such as ./data.'),
  PUBLIC_ADDRESS: z
    .string('PUBLIC_ADDRESS is missing. Give the address people type, such as http://localhost:3000.')
    .trim()
    .refine(isOrigin, 'PUBLIC_ADDRESS must be http:// or https:// and a host, with no path behind it.'),
  APP_SECRET: z
    .string('APP_SECRET is missing. It needs at least 32 characters known to nobody; npm run up makes one.')
    .min(SECRET_LENGTH, `APP_SECRET is too short. It needs at least ${SECRET_LENGTH} characters.`),
  LOG_LEVEL: z
    .enum(['silent', 'error', 'warn', 'info', 'debug'], 'LOG_LEVEL must be silent, error, warn, info or debug.')
    .default('info'),
  ...MAIL_FIELDS,
})

/** An example secret is refused where the address says that strangers can reach it. */
const CheckedSettings = Settings.refine(
  (settings) => isLocal(settings.PUBLIC_ADDRESS) || !EXAMPLE_SECRET.test(settings.APP_SECRET),
  'APP_SECRET is still the one of .env.example. Anyone can read that one: make your own.',
).superRefine(checkMailSettings)

export interface Env {
  dataFolder: string
  databaseFile: string
  /** Scheme, host and port, without a slash at the end. */
  publicAddress: string
  appSecret: string
  logLevel: z.infer<typeof Settings>['LOG_LEVEL']
  mail: MailEnv
}

/** Thrown where the settings are wrong; `sentences` says for each what is wrong and what would do. */
export class SettingsError extends Error {
  constructor(readonly sentences: string[]) {
    super(`The settings are wrong.\n${sentences.join('\n')}`)
    this.name = 'SettingsError'
  }
}

/**
 * Reads settings from names and values, such as `process.env`.
 * @throws SettingsError with one sentence for each wrong setting
 */
export function parseEnv(source: Record<string, string | undefined>): Env {
  const parsed = CheckedSettings.safeParse(source)
  if (!parsed.success) throw new SettingsError(parsed.error.issues.map((issue) => issue.message))
  const { DATA_DIR, PUBLIC_ADDRESS, APP_SECRET, LOG_LEVEL } = parsed.data
  return {
    dataFolder: DATA_DIR,
    databaseFile: join(DATA_DIR, 'setdown.db'),
    publicAddress: new URL(PUBLIC_ADDRESS).origin,
    appSecret: APP_SECRET,
    logLevel: LOG_LEVEL,
    mail: toMailEnv(parsed.data),
  }
}

let known: Env | undefined

/** The settings of this process, read on first use: building must not need them. */
export function env(): Env {
  known ??= parseEnv(process.env)
  return known
}

function isOrigin(text: string): boolean {
  if (!URL.canParse(text)) return false
  const { protocol, pathname, search, hash } = new URL(text)
  return /^https?:$/.test(protocol) && pathname === '/' && search === '' && hash === ''
}

/** Whether an address of the site can be reached from this machine alone. */
export function isLocal(address: string): boolean {
  return ['localhost', '127.0.0.1', '[::1]'].includes(new URL(address).hostname)
}
