import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { root, run } from './run.mjs'

/** What npm says it installed, against what the lock file asks for. Packages of other systems do not count. */
function isInstalled() {
  const record = join(root, 'node_modules/.package-lock.json')
  if (!existsSync(record)) return false
  const installed = JSON.parse(readFileSync(record, 'utf8')).packages
  const wanted = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8')).packages
  return Object.entries(wanted).every(
    ([path, { version, optional, devOptional, peer }]) =>
      path === '' || optional || devOptional || peer || installed[path]?.version === version,
  )
}

/** Installs what the lock file asks for, unless it is there already. */
export async function install() {
  if (isInstalled()) return
  console.log('Installing. The first time this takes a few minutes: the database is compiled on this machine.')
  await run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'])
}
