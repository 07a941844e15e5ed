import { env, SettingsError, type Env } from '@/lib/server/env'
import { loadEnv } from './load-env'

/** The settings, or one sentence for each wrong one and an exit code that stops whatever waits for it. */
export function settingsOrExit(): Env {
  loadEnv()
  try {
    return env()
  } catch (trouble) {
    if (!(trouble instanceof SettingsError)) throw trouble
    console.error(trouble.message)
    process.exit(1)
  }
}
