import { readdirSync, readFileSync } from 'node:fs'
import { dirname, join, relative } from 'node:path'
import { describe, expect, test } from 'vitest'

/** A folder's files that hold code, as paths from the project's folder. */
function sources(folder: string): string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && /\.tsx?$/.test(entry.name))
    .map((entry) => join(relative('.', entry.parentPath), entry.name))
}

/** `import type` and `export type … from` vanish when the code is built. */
const typeImports = /^(?:import|export) type\b[^'"]*?from ['"][^'"]+['"]/gm
const imports = /(?:^(?:import|export)\b[^'"]*?from |^import |\bimport\()['"]([^'"]+)['"]/gm

/** What a file imports, inside the project as a path without its ending, outside as the package's name. */
function importsOf(file: string, { types = false } = {}): string[] {
  const text = readFileSync(file, 'utf8')
  const kept = types ? text : text.replaceAll(typeImports, '')
  return [...kept.matchAll(imports)]
    .map(([, name]) => name)
    .filter((name) => !name.endsWith('.css') && name !== 'server-only')
    .map((name) => {
      if (name.startsWith('@/')) return name.slice(2)
      return name.startsWith('.') ? join(dirname(file), name) : name
    })
}

// First match wins. What is not named here (app, scripts, tests) may import anything.
const directions = [
  { from: /^lib\/match\//, may: /^lib\/match(\/|$)/, types: true },
  { from: /^lib\/[^/]+\/terms\.ts$/, may: /^$/ },
  { from: /^lib\/cautions\//, may: /^$/ },
  {
    from: /^lib\/[^/]+\/(schema|views|format)(-[a-z-]+)?\.ts$/,
    may: /^(lib\/(?!server\/|kernel\/|access\/).*|zod$)/,
  },
  { from: /^lib\/kernel\//, may: /^(lib\/kernel\/|node:)/ },
  { from: /^lib\/catalogue\//, may: /^(?!app\/|components\/|tests\/|scripts\/|lib\/setups\/)/ },
  { from: /^db\//, may: /^(db\/|lib\/[^/]+\/terms$|drizzle-orm|better-sqlite3$|node:)/ },
  {
    from: /^components\//,
    may: /^(components\/|lib\/match(\/|$)|lib\/[^/]+\/(terms|schema|views|format)(-[a-z-]+)?$|lib\/setups\/sentences\/|lib\/cautions\/texts$|react$|next\/|@hookform\/resolvers\/zod$|[a-z][^/]*$)/,
  },
  { from: /^lib\//, may: /^(?!app\/|components\/|tests\/|scripts\/)/ },
]

const held = ['lib', 'db', 'components'].flatMap(sources)

describe('imports go one way only', () => {
  test.each(directions)('from $from', ({ from, may, types }) => {
    const files = held.filter((file) => directions.find((each) => each.from.test(file))?.from === from)
    const strays = files.flatMap((file) =>
      importsOf(file, { types }).filter((name) => !may.test(name)).map((name) => `${file} imports ${name}`),
    )
    expect(strays).toEqual([])
  })

  test('nothing a component draws on, however far away, needs a server', () => {
    const needsServer = /^(db\/|lib\/server\/|node:|better-sqlite3$|drizzle-orm|pino$)/
    const seen = new Set<string>()
    const follow = (file: string, way: string[]): string[] => {
      if (seen.has(file)) return []
      seen.add(file)
      return importsOf(file).flatMap((name) => {
        if (needsServer.test(name)) return [[...way, name].join(' > ')]
        const next = [`${name}.ts`, `${name}.tsx`, `${name}/index.ts`].find((path) => held.includes(path))
        return next ? follow(next, [...way, next]) : []
      })
    }
    const clientSide = held.filter((file) => file.startsWith('components/'))
    expect(clientSide.flatMap((file) => follow(file, [file]))).toEqual([])
  })

  test('what touches the database or the settings cannot reach a browser', () => {
    const open = held.filter(
      (file) =>
        file.startsWith('lib/') &&
        importsOf(file).some((name) => /^(db|lib\/server)\//.test(name)) &&
        !readFileSync(file, 'utf8').startsWith("import 'server-only'"),
    )
    expect(open).toEqual([])
  })

  test('only the one opener opens a database', () => {
    const openers = [...held, ...sources('app'), ...sources('scripts')].filter((file) =>
      importsOf(file).some((name) => name === 'better-sqlite3'),
    )
    expect(openers).toEqual(['db/client.ts'])
  })
})
