import { spawnSync } from 'node:child_process'
import { existsSync } from 'node:fs'
import { run, Trouble } from './run.mjs'

const browser = process.env.CHROMIUM ?? '/usr/bin/chromium'

/** Browser tests drive Debian's Chromium. Installs it where it is missing and we may, else says what to do. */
export async function needBrowser() {
  if (existsSync(browser)) return
  const mayInstall = process.getuid?.() === 0 && existsSync('/usr/bin/apt-get') && !process.env.CHROMIUM
  if (!mayInstall) {
    throw new Trouble(
      `Browser tests need Chromium at ${browser}. On Debian, as root: apt-get install chromium. ` +
        'Elsewhere, name its path: CHROMIUM=/path/to/chromium npm run verify',
    )
  }
  const env = { DEBIAN_FRONTEND: 'noninteractive' }
  await run('apt-get', ['update', '-q'], env)
  await run('apt-get', ['install', '-y', '-q', '--no-install-recommends', 'chromium'], env)
}

/** Says whether circuits are simulated anew or read from what was stored. */
export function tellSimulator() {
  const found = spawnSync('ngspice', ['--version']).status === 0
  console.log(
    found
      ? 'ngspice is installed: its circuits are simulated anew.'
      : 'ngspice is not installed: its circuits are checked against stored output only.',
  )
}
