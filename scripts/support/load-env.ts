import { loadEnvConfig } from '@next/env'

/** Fills `process.env` from .env.local and .env as the started product does; what is set already stays. */
export function loadEnv() {
  loadEnvConfig(process.cwd(), false, { info: () => undefined, error: console.error })
}
