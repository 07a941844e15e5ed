import { createHash } from 'node:crypto'
import { existsSync, readFileSync, readdirSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { root, runTool } from './run.mjs'

/** Everything a build is made from. */
const SOURCES = ['app', 'components', 'content', 'db', 'emails', 'lib', 'public']
const FILES = [
  'package-lock.json',
  'tsconfig.json',
  'next.config.mjs',
  'postcss.config.mjs',
  'tailwind.config.ts',
  'proxy.ts',
  'instrumentation.ts',
]
const STAMP = '.next/built-from'

function sourceHash() {
  const hash = createHash('sha256').update(process.version)
  const inFolders = SOURCES.filter((folder) => existsSync(join(root, folder))).flatMap((folder) =>
    readdirSync(join(root, folder), { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => join(entry.parentPath ?? entry.path, entry.name)),
  )
  for (const file of [...FILES.map((name) => join(root, name)), ...inFolders.sort()]) {
    hash.update(file.slice(root.length)).update('\0').update(readFileSync(file)).update('\0')
  }
  return hash.digest('hex')
}

/** Builds. With `onlyIfChanged`, a build made from the same sources is kept. */
export async function build({ onlyIfChanged = false } = {}) {
  const stamp = join(root, STAMP)
  const wanted = sourceHash()
  if (onlyIfChanged && existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return
  await runTool('next/dist/bin/next', ['build'])
  writeFileSync(stamp, wanted)
}
