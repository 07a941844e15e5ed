import { randomBytes } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { root } from './run.mjs'

/** Writes .env.local from .env.example with a secret of its own. What is there already is never touched. */
export function writeEnvFile() {
  const file = join(root, '.env.local')
  if (existsSync(file)) return
  const secret = randomBytes(32).toString('base64url')
  const example = readFileSync(join(root, '.env.example'), 'utf8')
  const text = example.replace(/^# Copied to .*\n\n?/, '').replace(/^APP_SECRET=.*$/m, `APP_SECRET=${secret}`)
  writeFileSync(file, text, { mode: 0o600 })
  console.log('Wrote .env.local with a new secret.')
}

/**
 * The address people type. On this machine it follows the port; an address given by hand stays as it is.
 * @param {number} port
 */
export function publicAddress(port) {
  const written = readFileSync(join(root, '.env.local'), 'utf8').match(/^PUBLIC_ADDRESS=(.*)$/m)?.[1].trim()
  const address = process.env.PUBLIC_ADDRESS ?? written ?? ''
  return address === '' || /^http:\/\/(localhost|127\.0\.0\.1)(:\d+)?$/.test(address)
    ? `http://localhost:${port}`
    : address
}
