import 'server-only'
import { pino, type Logger } from 'pino'
import { env } from './env'

/** Left out of every line: what opens a sheet, what says who asked, what guards the rest. */
const HIDDEN = ['code', 'cookie', 'authorization', 'appSecret', 'address'].flatMap((key) => [key, `*.${key}`, `*.*.${key}`])

let made: Logger | undefined

/** One JSON object a line, on standard output. */
export function log(): Logger {
  made ??= pino({ level: chosenLevel(), redact: { paths: HIDDEN, censor: '(hidden)' }, base: undefined })
  return made
}

/** Trouble with the settings has to reach the log too, so wrong settings do not stop it. */
function chosenLevel(): string {
  try {
    return env().logLevel
  } catch {
    return 'info'
  }
}

/** A path with the code of a sheet taken out: whoever has the code can read the sheet. */
export function withoutCodes(path: string): string {
  return path.replace(/\/sheets\/[^/?#]+/, '/sheets/(hidden)').replace(/[?#].*$/, '')
}
