import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { parseEnv, SettingsError } from '@/lib/server/env'

const good = {
  DATA_DIR: './data',
  PUBLIC_ADDRESS: 'http://localhost:3000',
  APP_SECRET: 'x'.repeat(32),
  LOG_LEVEL: 'warn',
}

function sentencesFor(source: Record<string, string | undefined>): string[] {
  try {
    parseEnv(source)
  } catch (trouble) {
    if (trouble instanceof SettingsError) return trouble.sentences
    throw trouble
  }
  return []
}

test('good settings are read, with the database inside the data folder', () => {
  expect(parseEnv(good)).toEqual({
    dataFolder: './data',
    databaseFile: 'data/setdown.db',
    publicAddress: 'http://localhost:3000',
    appSecret: 'x'.repeat(32),
    logLevel: 'warn',
    mail: { from: { name: 'Oskerby Audio Works', address: 'workshop@oskerby.example' }, smtp: null },
  })
})

test('the example file runs as it is', () => {
  const lines = readFileSync('.env.example', 'utf8').split('\n')
  const example = Object.fromEntries(
    lines.filter((line) => /^\w+=/.test(line)).map((line) => line.split(/=(.*)/s).slice(0, 2)),
  )
  expect(sentencesFor(example)).toEqual([])
})

test('each wrong setting gets one sentence that names it and says what would do', () => {
  const sentences = sentencesFor({ DATA_DIR: ' ', PUBLIC_ADDRESS: 'oskerby', APP_SECRET: 'short', LOG_LEVEL: 'loud' })
  expect(sentences).toHaveLength(4)
  for (const name of Object.keys(good)) {
    expect(sentences.filter((sentence) => sentence.startsWith(name))).toHaveLength(1)
  }
})

test('nothing set at all names every setting that has no default', () => {
  expect(sentencesFor({}).map((sentence) => sentence.split(' ')[0])).toEqual(['DATA_DIR', 'PUBLIC_ADDRESS', 'APP_SECRET'])
})

test.each(['http://localhost:3000/path', 'ftp://localhost', 'localhost:3000', 'http://localhost/?a=1'])(
  'the address %s is refused',
  (address) => {
    expect(sentencesFor({ ...good, PUBLIC_ADDRESS: address })).toHaveLength(1)
  },
)

test('the secret of the example file is refused where strangers can come', () => {
  const secret = 'change-me-change-me-change-me-change-me'
  expect(sentencesFor({ ...good, APP_SECRET: secret })).toEqual([])
  expect(sentencesFor({ ...good, APP_SECRET: secret, PUBLIC_ADDRESS: 'https://setup.example.org' })).toHaveLength(1)
})
