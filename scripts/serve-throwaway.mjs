/**
 * The built product with demo data in a folder that goes away with it, for browser tests. Whoever starts it may name the
 * folder and the secret, to look into the one and to make cookies with the other.
 */
import { randomBytes } from 'node:crypto'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { runScript, tellTrouble } from './steps/run.mjs'
import { checkPort, serve } from './steps/serve.mjs'

await tellTrouble(async () => {
  const port = Number(process.env.PORT)
  await checkPort(port)
  const folder = process.env.DATA_DIR ?? mkdtempSync(join(tmpdir(), 'setdown-'))
  const env = {
    DATA_DIR: folder,
    PUBLIC_ADDRESS: `http://127.0.0.1:${port}`,
    APP_SECRET: process.env.APP_SECRET ?? randomBytes(32).toString('hex'),
    LOG_LEVEL: 'error',
  }
  process.on('exit', () => rmSync(folder, { recursive: true, force: true }))
  await runScript('scripts/migrate.ts', env)
  await runScript('scripts/seed.ts', env)
  serve(port, env).on('exit', (code) => process.exit(code ?? 0))
})
