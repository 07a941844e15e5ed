/**
 * Figures for a file of cases, as JSON on standard output.
 * Usage: npm run -s evaluate -- FILE
 */
import { readFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { casesOf, evaluateCase } from './evaluate/evaluate-cases'

function main(file: string | undefined): number {
  if (!file) {
    console.error('Name a file of cases: npm run -s evaluate -- FILE')
    return 1
  }
  let cases
  try {
    // npm changes to the project folder; a relative name is meant from where the command was typed.
    cases = casesOf(JSON.parse(readFileSync(resolve(process.env['INIT_CWD'] ?? '.', file), 'utf8')))
  } catch (problem) {
    console.error(`Cannot read ${file}: ${problem instanceof Error ? problem.message : String(problem)}`)
    return 1
  }
  const results = cases.map((item) => [
    item.id,
    evaluateCase(item, (key) => console.error(`${item.id}: no figure "${key}" in kind "${item.kind}".`)),
  ])
  process.stdout.write(`${JSON.stringify(Object.fromEntries(results), null, 1)}\n`)
  return 0
}

process.exitCode = main(process.argv[2])
