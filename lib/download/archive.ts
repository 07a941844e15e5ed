import 'server-only'
import { Readable } from 'node:stream'
import { ZipFile } from 'yazl'
import { mustBeSelf } from '@/lib/accounts/self'
import type { Context } from '@/lib/kernel/context'
import { accountHeld, cartridgesHeld, mailsHeld, sessionsHeld, unitsHeld } from './held'
import { readMe } from './read-me'
import { sheetText } from './sheet-text'
import { revisionsHeld, sheetJson, sheetsHeld } from './sheets-held'

const asJson = (value: unknown) => `${JSON.stringify(value, null, 2)}\n`

/**
 * Everything that is held about whoever asks, as one archive. It is written while it is read: sheets are taken out of
 * the database one at a time, as fast as the other side takes them.
 * @throws Fault sign_in; not_allowed
 */
export function everythingHeld({ db, actor, now }: Context): Readable {
  const person = mustBeSelf(db, actor, 'account:download')
  const sheets = sheetsHeld(db, person)
  const zip = new ZipFile()
  const out = Readable.from(zip.outputStream, { objectMode: false })
  zip.on('error', (trouble: Error) => out.destroy(trouble))

  const options = { mtime: new Date(now) }
  const add = (path: string, make: () => string) =>
    zip.addReadStreamLazy(path, options, (hand) => {
      let text: string
      try {
        text = make()
      } catch (trouble) {
        // Only the second argument of a call that went well is looked at.
        hand(trouble, Readable.from([]))
        return
      }
      hand(null, Readable.from([Buffer.from(text)]))
    })

  add('README.txt', () => readMe({ name: person.name, email: person.email, now, sheets: sheets.length }))
  add('account.json', () => asJson(accountHeld(db, person)))
  add('sessions.json', () => asJson(sessionsHeld(db, person)))
  add('units.json', () => asJson(unitsHeld(db, person)))
  add('cartridges.json', () => asJson(cartridgesHeld(db, person)))
  add('mails.json', () => asJson(mailsHeld(db, person)))
  add('sheets.json', () => asJson(sheets.map(({ id: _id, ...sheet }) => sheet)))
  for (const sheet of sheets) {
    add(`sheets/${sheet.number}/sheet.txt`, () => sheetText(sheet, revisionsHeld(db, sheet.id)))
    add(`sheets/${sheet.number}/sheet.json`, () => asJson(sheetJson(sheet, revisionsHeld(db, sheet.id))))
  }
  zip.end()
  return out
}
