import { spawn, type ChildProcess } from 'node:child_process'
import { once } from 'node:events'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { expect, onTestFinished, test } from 'vitest'
import { openDatabase } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { outbox } from '@/db/schema/mail'
import { CLAIM_LASTS_MS } from '@/lib/mail/claim'
import { deliverDue } from '@/lib/mail/worker'
import { post, testDelivery } from '../support/post'
import { smtpServer, type ReceivedMail } from '../support/smtp'

const MAILS = 6

/** Another process that delivers what is due, as `npm run mail:deliver` does. */
function deliverElsewhere(folder: string, port: number): ChildProcess {
  return spawn(process.execPath, ['--import', 'tsx', 'scripts/deliver-mail.ts'], {
    env: {
      ...process.env,
      TSX_TSCONFIG_PATH: 'scripts/tsconfig.mail.json',
      DATA_DIR: folder,
      SMTP_HOST: '127.0.0.1',
      SMTP_PORT: String(port),
      SMTP_SECURITY: 'none',
      MAIL_FROM: 'Oskerby workshop <workshop@oskerby.example>',
    },
    stdio: 'ignore',
  })
}

/** Ends a process the way a power cut does: it gets no chance to do anything. */
async function killed(child: ChildProcess) {
  child.kill('SIGKILL')
  await once(child, 'exit')
}

test('a process that is killed while it delivers loses nothing, and a double can be told by its Message-ID', { timeout: 120_000 }, async () => {
  const folder = mkdtempSync(join(tmpdir(), 'setdown-killed-'))
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }))
  const db = openDatabase(join(folder, 'setdown.db'))
  migrateDatabase(db)
  const ids = Array.from({ length: MAILS }, (_, index) => post(db, `owner-${index}@oskerby.example`))

  // What the server has taken, in order, whether or not it could still say so.
  const taken: ReceivedMail[] = []
  let cut: { takenBefore: number; moment: 'before its words' | 'before the answer'; kill: () => Promise<void> } | undefined
  async function cutAt(moment: string) {
    if (cut?.moment !== moment || cut.takenBefore !== taken.length) return
    const { kill } = cut
    cut = undefined
    await kill()
  }
  const server = await smtpServer({
    async onRecipient() {
      await cutAt('before its words')
      return undefined
    },
    async onWhole(mail) {
      taken.push(mail)
      await cutAt('before the answer')
      return undefined
    },
  })

  for (const [takenBefore, moment] of [
    [2, 'before its words'],
    [5, 'before the answer'],
  ] as const) {
    const child = deliverElsewhere(folder, server.port)
    onTestFinished(() => void child.kill('SIGKILL'))
    const gone = once(child, 'exit')
    cut = { takenBefore, moment, kill: () => killed(child) }
    await gone
    expect(child.signalCode).toBe('SIGKILL')
    expect(taken).toHaveLength(takenBefore)
    // The mail that it held waits for its claim to run out: here, as if that much time had gone by.
    db.update(outbox).set({ claimedUntil: 0 }).run()
  }

  const { delivery } = testDelivery(db, server.settings())
  await deliverDue({ ...delivery, clock: () => Date.now() + CLAIM_LASTS_MS })
  expect(db.select({ status: outbox.status }).from(outbox).all()).toEqual(ids.map(() => ({ status: 'sent' })))

  const messageIds = taken.map(({ parsed }) => parsed.messageId)
  expect([...new Set(messageIds)].toSorted()).toEqual(ids.map((id) => `<${id}@localhost>`).toSorted())
  // One was taken twice: a receiver sees the same Message-ID and the same words.
  expect(taken).toHaveLength(MAILS + 1)
  const [first, second] = taken.filter(({ parsed }) => parsed.messageId === messageIds[4])
  expect(second.parsed.html).toBe(first.parsed.html)
  expect(second.parsed.text).toBe(first.parsed.text)
})
