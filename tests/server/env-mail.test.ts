import { expect, test } from 'vitest'
import { parseEnv, SettingsError } from '@/lib/server/env'

const base = { DATA_DIR: './data', PUBLIC_ADDRESS: 'http://localhost:3000', APP_SECRET: 'x'.repeat(32) }
const server = { ...base, SMTP_HOST: 'mail.example.org', MAIL_FROM: 'Workshop <workshop@example.org>' }

const mailFor = (source: Record<string, string>) => parseEnv(source).mail

function sentencesFor(source: Record<string, string>): string[] {
  try {
    parseEnv(source)
  } catch (trouble) {
    if (trouble instanceof SettingsError) return trouble.sentences
    throw trouble
  }
  return []
}

test('without a host mail stays here, whatever else is set', () => {
  expect(mailFor({ ...base, SMTP_HOST: ' ', SMTP_USER: 'ann' }).smtp).toBeNull()
})

test('with a host the way is encrypted unless said otherwise, at the usual port', () => {
  expect(mailFor(server)).toEqual({
    from: { name: 'Workshop', address: 'workshop@example.org' },
    smtp: { host: 'mail.example.org', port: 587, security: 'starttls', credentials: null },
  })
  expect(mailFor({ ...server, SMTP_SECURITY: 'tls' }).smtp?.port).toBe(465)
  expect(mailFor({ ...server, SMTP_SECURITY: 'none' }).smtp?.port).toBe(25)
  expect(mailFor({ ...server, SMTP_PORT: '2525' }).smtp?.port).toBe(2525)
})

test('a sender may come without a name', () => {
  expect(mailFor({ ...server, MAIL_FROM: 'workshop@example.org' }).from).toEqual({ name: '', address: 'workshop@example.org' })
})

test.each([
  [{ SMTP_HOST: 'mail.example.org/path' }, 'SMTP_HOST'],
  [{ SMTP_PORT: '70000' }, 'SMTP_PORT'],
  [{ SMTP_SECURITY: 'ssl' }, 'SMTP_SECURITY'],
  [{ SMTP_USER: 'ann' }, 'SMTP_USER'],
  [{ SMTP_PASSWORD: 'secret' }, 'SMTP_USER'],
  [{ SMTP_USER: 'ann', SMTP_PASSWORD: 'secret', SMTP_SECURITY: 'none' }, 'SMTP_SECURITY'],
  [{ MAIL_FROM: '' }, 'MAIL_FROM'],
  [{ MAIL_FROM: 'Workshop\r\nBcc: bob@example.org <workshop@example.org>' }, 'MAIL_FROM'],
  [{ MAIL_FROM: 'Workshop <workshop>' }, 'MAIL_FROM'],
])('%j gets one sentence that names %s', (wrong, name) => {
  expect(sentencesFor({ ...server, ...wrong })).toEqual([expect.stringMatching(new RegExp(`^${name}\\b`))])
})

test('a password may travel readable on this machine alone', () => {
  expect(sentencesFor({ ...server, SMTP_HOST: '127.0.0.1', SMTP_SECURITY: 'none', SMTP_USER: 'ann', SMTP_PASSWORD: 'secret' })).toEqual([])
})
