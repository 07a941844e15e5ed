import { format } from 'node:util'

let unexpected: string[] = []
let expected: RegExp[] = []

/** Collects what a test writes to `console.error`, so that nothing unexpected goes by unseen. */
export function watchConsole() {
  unexpected = []
  expected = []
  console.error = (...parts: unknown[]) => {
    const line = format(...parts)
    if (!expected.some((pattern) => pattern.test(line))) unexpected.push(line)
  }
}

/** Says beforehand that this test will write a matching line to `console.error`. */
export function expectConsoleError(pattern: RegExp) {
  expected.push(pattern)
}

/** Throws with every line that was not announced. */
export function assertQuietConsole() {
  if (unexpected.length > 0) throw new Error(`Unexpected console.error:\n${unexpected.join('\n')}`)
}
