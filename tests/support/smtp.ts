import { readFileSync } from 'node:fs'
import { connect, createServer, type AddressInfo } from 'node:net'
import { simpleParser, type ParsedMail } from 'mailparser'
import { SMTPServer, type SMTPServerOptions, type SMTPServerSession } from 'smtp-server'
import { onTestFinished } from 'vitest'
import type { SmtpSettings } from '@/lib/server/env-mail'

/** Trusted by nobody unless told to: for the loopback address, made by hand. */
export const CERTIFICATE = readFileSync('tests/fixtures/mail/localhost.crt', 'utf8')
const KEY = readFileSync('tests/fixtures/mail/localhost.key', 'utf8')

export interface ReceivedMail {
  raw: string
  parsed: ParsedMail
  /** To whom it was handed over, which need not be what its header says. */
  recipients: string[]
  encrypted: boolean
  user: string | undefined
}

/** What the server answers: nothing for taking it, or an error with a reply code. */
type Answer = Error | undefined | Promise<Error | undefined>

export interface Behaviour extends SMTPServerOptions {
  onRecipient?: (address: string, session: SMTPServerSession) => Answer
  /** Called once the whole mail is there and before the server says so. */
  onWhole?: (mail: ReceivedMail) => Answer
}

export interface TestServer {
  port: number
  received: ReceivedMail[]
  /** Listens no more. */
  stop: (done: () => void) => void
  /** How a client reaches it, in the clear unless said otherwise. */
  settings: (changes?: Partial<SmtpSettings>) => SmtpSettings
}

/** A reply with a code, such as 550. */
export function reply(responseCode: number, message: string): Error {
  return Object.assign(new Error(message), { responseCode })
}

/** A mail server on the loopback address for as long as the test runs. What it takes is in `received`. */
export async function smtpServer({ onRecipient, onWhole, ...options }: Behaviour = {}): Promise<TestServer> {
  const received: ReceivedMail[] = []
  const server = new SMTPServer({
    key: KEY,
    cert: CERTIFICATE,
    authOptional: true,
    disableReverseLookup: true,
    logger: false,
    closeTimeout: 1,
    ...options,
    onRcptTo: ({ address }, session, callback) => void Promise.resolve(onRecipient?.(address, session)).then(callback),
    onData(stream, session, callback) {
      void readAll(stream).then(async (raw) => {
        const mail: ReceivedMail = {
          raw,
          parsed: await simpleParser(raw),
          recipients: session.envelope.rcptTo.map(({ address }) => address),
          encrypted: session.secure,
          user: session.user,
        }
        const refusal = await onWhole?.(mail)
        if (!refusal) received.push(mail)
        callback(refusal)
      }, callback)
    },
  })
  // Clients that hang up are what some tests are about.
  server.on('error', () => undefined)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  onTestFinished(() => new Promise<void>((resolve) => server.close(resolve)))
  const { port } = server.server.address() as AddressInfo
  return {
    port,
    received,
    stop: (done) => server.close(done),
    settings: (changes) => ({ host: '127.0.0.1', port, security: 'none', credentials: null, ...changes }),
  }
}

/** A line to a server that goes dead after so many bytes from the client, until it is mended. */
export async function droppingLine(port: number, bytes: number): Promise<{ port: number; mend: () => void }> {
  let mended = false
  const line = createServer((client) => {
    const server = connect(port, '127.0.0.1')
    const dropBoth = () => {
      client.destroy()
      server.destroy()
    }
    let passed = 0
    client.on('data', (part) => {
      passed += part.byteLength
      if (mended || passed <= bytes) return server.write(part)
      server.write(part.subarray(0, part.byteLength - (passed - bytes)), dropBoth)
    })
    server.on('data', (part) => client.write(part))
    for (const end of [client, server]) end.on('error', dropBoth).on('close', dropBoth)
  })
  await new Promise<void>((resolve) => line.listen(0, '127.0.0.1', resolve))
  onTestFinished(() => new Promise<void>((resolve) => void line.close(() => resolve())))
  return { port: (line.address() as AddressInfo).port, mend: () => void (mended = true) }
}

async function readAll(stream: NodeJS.ReadableStream): Promise<string> {
  const parts: Buffer[] = []
  for await (const part of stream) parts.push(Buffer.from(part))
  return Buffer.concat(parts).toString('utf8')
}
