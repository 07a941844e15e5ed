import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { checkNode } from '@/scripts/steps/node-version.mjs'
import { checkPort } from '@/scripts/steps/serve.mjs'
import { pageTotals, unitTotals } from '@/scripts/steps/totals.mjs'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'setdown-test-'))
})
afterEach(() => rmSync(folder, { recursive: true, force: true }))

function report(content: object): string {
  const file = join(folder, 'report.json')
  writeFileSync(file, JSON.stringify(content))
  return file
}

test('an old Node is refused with both numbers, a new one is not', () => {
  expect(() => checkNode('18.20.0')).toThrow('This needs Node 20.11 or newer, and 18.20.0 is running it.')
  expect(() => checkNode('20.10.9')).toThrow()
  expect(() => checkNode('20.11.0')).not.toThrow()
  expect(() => checkNode('22.1.0')).not.toThrow()
})

test('unit tests are added up, and a file that cannot be loaded counts as failed', () => {
  const counts = { numPassedTests: 7, numFailedTests: 0, numPendingTests: 1 }
  expect(unitTotals(report({ ...counts, success: true }))).toEqual({ passed: 7, failed: 0, skipped: 1 })
  expect(unitTotals(report({ ...counts, success: false }))).toEqual({ passed: 7, failed: 1, skipped: 1 })
})

test('a browser test that passed only on a second try has failed', () => {
  const stats = { expected: 5, unexpected: 1, flaky: 1, skipped: 0 }
  expect(pageTotals(report({ stats }))).toEqual({ passed: 5, failed: 2, skipped: 0 })
})

test('a report that was never written counts nothing as passed', () => {
  const missing = join(folder, 'none.json')
  expect(unitTotals(missing).passed + pageTotals(missing).passed).toBe(0)
})

test('a port that is taken is refused, with another to try', async () => {
  const other = createServer()
  const port = await new Promise<number>((resolve) =>
    other.listen(0, () => {
      const address = other.address()
      resolve(typeof address === 'object' && address ? address.port : 0)
    }),
  )
  await expect(checkPort(port)).rejects.toThrow(`PORT=${port + 1} npm run up`)
  await new Promise((resolve) => other.close(resolve))
  await expect(checkPort(port)).resolves.toBeUndefined()
  expect(() => checkPort(Number.NaN)).toThrow('PORT must be a whole number')
})
