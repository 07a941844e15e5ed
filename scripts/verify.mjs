/** Every check there is, in order, from a fresh copy. Ends with the totals; exits non-zero if anything failed. */
import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { needBrowser, tellSimulator } from './steps/browser.mjs'
import { build } from './steps/build.mjs'
import { install } from './steps/install.mjs'
import { checkNode } from './steps/node-version.mjs'
import { root, run, runTool, tellTrouble, Trouble } from './steps/run.mjs'
import { pageTotals, unitTotals } from './steps/totals.mjs'

const unitReport = join(root, 'test-results/unit.json')
const pageReport = join(root, 'test-results/pages.json')

const steps = [
  ['What the tests need', () => install().then(needBrowser).then(tellSimulator)],
  ['Types', () => run('npm', ['run', '--silent', 'types'])],
  ['Lint', () => run('npm', ['run', '--silent', 'lint'])],
  [
    'Unit and reference tests',
    () =>
      runTool('vitest/vitest.mjs', ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${unitReport}`]),
  ],
  ['Build', () => build()],
  [
    'Browser tests',
    () => runTool('@playwright/test/cli.js', ['test', '--reporter=list,json'], { PLAYWRIGHT_JSON_OUTPUT_FILE: pageReport }),
  ],
]

const seconds = (since) => `${((Date.now() - since) / 1000).toFixed(1)} s`

await tellTrouble(async () => {
  checkNode()
  for (const report of [unitReport, pageReport]) rmSync(report, { force: true })
  let trouble
  for (const [name, work] of steps) {
    const began = Date.now()
    console.log(`\n== ${name}`)
    try {
      await work()
    } catch (caught) {
      if (!(caught instanceof Trouble)) throw caught
      trouble = caught
    }
    console.log(`== ${name}: ${trouble ? 'failed' : 'done'} in ${seconds(began)}`)
    if (trouble) break
  }

  const totals = [unitTotals(unitReport), pageTotals(pageReport)]
  const sum = (key) => totals.reduce((total, each) => total + each[key], 0)
  const failed = Math.max(sum('failed'), trouble ? 1 : 0)
  if (sum('skipped') > 0) console.log(`\n${sum('skipped')} skipped`)
  if (trouble) console.error(`\n${trouble.message}`)
  console.log(`\n${sum('passed')} passed, ${failed} failed`)
  process.exit(failed === 0 ? 0 : 1)
})
