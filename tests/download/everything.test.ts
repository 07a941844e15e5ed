import { eq } from 'drizzle-orm'
import { describe, expect, test } from 'vitest'
import { people } from '@/db/schema/accounts'
import { mailboxMessages } from '@/db/schema/mail'
import { revisions, sheets } from '@/db/schema/setups'
import { everythingHeld } from '@/lib/download/archive'
import type { Context } from '@/lib/kernel/context'
import { enqueue } from '@/lib/mail/enqueue'
import { addRevision } from '@/lib/setups/add-revision'
import { archiveSheet } from '@/lib/shelf/archive-sheet'
import { nameSheet } from '@/lib/shelf/name-sheet'
import { setPositions } from '@/lib/shelf/set-positions'
import { ACT_CAUTIONS } from '@/lib/cautions/texts'
import { faultOf } from '../support/fault'
import { COIL, FINCH, shelfWorlds, type ShelfWorld } from '../support/shelf'
import { unzip } from '../support/unzip'
import { NOW, type CastName } from '../support/world'

const here = shelfWorlds()

async function filesOf(context: Context): Promise<Map<string, string>> {
  const parts: Buffer[] = []
  for await (const part of everythingHeld(context)) parts.push(part as Buffer)
  return new Map([...unzip(Buffer.concat(parts))].map(([path, bytes]) => [path, bytes.toString('utf8')]))
}
const json = (files: Map<string, string>, path: string) => JSON.parse(files.get(path) ?? 'null') as Record<string, unknown>

/** Someone's whole shelf, with marks that are theirs alone in every place a text can stand. */
function fill(world: ShelfWorld, who: CastName, { serial, mark }: { serial: string; mark: string }) {
  const context = world.as(who)
  const { email } = world.person(who)
  const unitId = world.unitOf(who, { serial, name: `${mark} unit`, boughtFrom: `${mark} shop` })
  setPositions(context, { unitId, known: 'yes', left: 'bank.10000010', right: 'bank.10000010' })
  const cartridgeId = world.cartridgeOf(who)
  const first = world.sheetOf(who, { ...FINCH, name: `${mark} cartridge`, arm: `${mark} arm` }, { unitId: null, cartridgeId })
  addRevision(world.as(who), first.code, (answers) => ({ ...answers, output: '5' }))
  nameSheet(context, { number: first.number, name: `${mark} sheet` })
  const second = world.sheetOf(who, COIL)
  archiveSheet(context, { number: second.number })
  enqueue(world.db, { to: email, template: 'new-sign-in', props: { link: 'http://localhost:3000/account', at: NOW, browser: `${mark} browser`, way: 'link' }, now: NOW })
  world.db
    .insert(mailboxMessages)
    .values({ id: `msg_${who}`, messageId: `${who}@x`, recipient: email.toUpperCase(), subject: 'Letter', html: '', plain: `${mark} letter`, raw: '', receivedAt: NOW })
    .run()
  return { first, second }
}

describe('everything of one person', () => {
  test('is in it, and nothing of anyone else', async () => {
    const world = here()
    const { first, second } = fill(world, 'ann', { serial: '19311', mark: 'Gannet' })
    fill(world, 'bob', { serial: '20577', mark: 'Plover' })
    world.sheetOf(null, { ...FINCH, name: 'Stint cartridge' })
    const files = await filesOf(world.as('ann'))
    const all = [...files].flat().join('\n')

    expect(all).not.toMatch(/Plover|20577|bob@brandreth\.example|Stint/i)
    expect(all).not.toContain(world.person('bob').id)
    for (const theirs of ['Gannet unit', 'Gannet shop', 'Gannet cartridge', 'Gannet arm', 'Gannet sheet', 'Gannet letter', '19311', 'ann@brandreth.example']) expect(all, theirs).toContain(theirs)

    expect([...files.keys()].sort()).toEqual(
      [
        'README.txt',
        'account.json',
        'cartridges.json',
        'mails.json',
        'sessions.json',
        'sheets.json',
        ...[first, second].flatMap(({ number }) => [`sheets/${number}/sheet.json`, `sheets/${number}/sheet.txt`]),
        'units.json',
      ].sort(),
    )
  })

  test('with every revision of every sheet, what went in and what came out, and put away ones as well', async () => {
    const world = here()
    const { first, second } = fill(world, 'ann', { serial: '19311', mark: 'Gannet' })
    const files = await filesOf(world.as('ann'))
    const sheet = json(files, `sheets/${first.number}/sheet.json`) as { code: string; revisions: { letter: string; answers: object; inputs: object; result: { match: { verdict: string } } }[] }
    expect(sheet.code).toBe(first.code)
    expect(sheet.revisions.map(({ letter, result }) => [letter, result.match.verdict])).toEqual([
      ['A', 'suits'],
      ['B', 'suits'],
    ])
    expect(sheet.revisions[0].answers).toMatchObject({ name: 'Gannet cartridge' })
    expect(json(files, `sheets/${second.number}/sheet.json`).putAwayAt).toBe(new Date(NOW).toISOString())
    expect(json(files, 'account.json')).toMatchObject({ email: 'ann@brandreth.example', role: 'owner', hasPassword: false })
    expect(json(files, 'sessions.json')).not.toHaveLength(0)
    expect(json(files, 'units.json')).toMatchObject([{ serial: '19311', positions: [{ left: 'bank.10000010', source: 'told' }] }])
  })

  test('as text that a person can read, and no move without its caution, whole', async () => {
    const world = here()
    const { first, second } = fill(world, 'ann', { serial: '19311', mark: 'Gannet' })
    const files = await filesOf(world.as('ann'))
    const text = files.get(`sheets/${first.number}/sheet.txt`) ?? ''
    expect(text).toMatch(/^Sheet \d+, Gannet sheet\n/)
    expect(text).toContain('Revision A, Friday 6 March 2026')
    expect(text).toContain('Revision B')
    expect(text).toContain('It suits.')
    expect(text).toMatch(/Cartridge +Gannet cartridge/)
    const moving = files.get(`sheets/${second.number}/sheet.txt`) ?? ''
    const { title, before, after, why } = ACT_CAUTIONS.switch
    for (const words of [title, before, after, why]) expect(moving).toContain(words)
    expect(moving.indexOf(title)).toBeLessThan(moving.indexOf('It suits'))
  })

  test('no secret is in it, nor anything that one is checked by', async () => {
    const world = here()
    fill(world, 'ann', { serial: '19311', mark: 'Gannet' })
    world.db.update(people).set({ passwordHash: '$argon2id$known-by-its-looks' }).where(eq(people.id, world.person('ann').id)).run()
    const all = [...(await filesOf(world.as('ann')))].flat().join('\n')
    expect(all).not.toContain('argon2id')
    expect(all).not.toMatch(/hash"|secret"/i)
  })

  test('someone with nothing gets their account and a README that says what is what', async () => {
    const world = here()
    const files = await filesOf(world.as('bob'))
    expect(json(files, 'units.json')).toEqual([])
    for (const path of ['account.json', 'sessions.json', 'units.json', 'cartridges.json', 'mails.json', 'sheets.json']) expect(files.get('README.txt')).toContain(path)
  })
})

test('a visitor has nothing to download', async () => {
  const world = here()
  expect((await faultOf(() => everythingHeld(world.at()))).code).toBe('sign_in')
})

test('sheets are read one at a time, while the archive is taken', { timeout: 60_000 }, async () => {
  const world = here()
  const { number } = world.sheetOf('ann')
  const row = world.db.select().from(sheets).where(eq(sheets.number, number)).get()
  const revision = world.db.select().from(revisions).get()
  if (!row || !revision) throw new Error('There is no sheet to copy.')
  for (let index = 0; index < 40; index++) {
    world.db.insert(sheets).values({ ...row, id: `sht_${index}`, number: 5000 + index, code: `code-${index}`, requestKey: null }).run()
    world.db.insert(revisions).values({ ...revision, id: `rev_${index}`, sheetId: `sht_${index}` }).run()
  }
  const stream = everythingHeld(world.as('ann'))
  const taken: Buffer[] = []
  for await (const part of stream) {
    taken.push(part as Buffer)
    // What is put away halfway is still in it; what was not read yet is read later, so it shows.
    if (taken.length === 1) world.db.update(revisions).set({ rulesVersion: 999 }).run()
  }
  const files = unzip(Buffer.concat(taken))
  expect(files.size).toBe(7 + 2 * 41)
  expect(files.get('sheets/5039/sheet.json')?.toString('utf8')).toContain('"rulesVersion": 999')
})

test('a sheet that cannot be read breaks the archive off, so that nobody takes it for whole', async () => {
  const world = here()
  world.sheetOf('ann')
  world.db.$client.exec("update revisions set result = 'not json'")
  await expect(filesOf(world.as('ann'))).rejects.toThrow()
})
