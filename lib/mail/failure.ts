import type { NodemailerError } from 'nodemailer/lib/errors'
import { DeliveryFailure } from './transport'

const LONGEST_ANSWER = 400

/** Commands whose refusal is about this one mail: who sends it, who gets it, what is in it. */
const ABOUT_THE_MAIL = new Set(['MAIL FROM', 'RCPT TO', 'DATA', 'BDAT'])

/** Refusals that come where a mail is named and are about us signing in or encrypting. RFC 4954, RFC 3207. */
const ABOUT_US = new Set([530, 534, 535, 538])

/** What happened, where no server said anything. */
const SENTENCES: Record<string, string> = {
  ABORT_ERR: 'The server was too slow.',
  EABORT: 'The server was too slow.',
  ETIMEDOUT: 'The server did not answer in time.',
  ECONNECTION: 'The server closed the connection in the middle.',
  EDNS: 'The mail server’s name cannot be found.',
  ENOAUTH: 'The server offers no sign-in, and one is set.',
  EAUTH: 'The server did not accept the user and password.',
  ECONNREFUSED: 'Nothing listens at the mail server’s port.',
  ECONNRESET: 'The server closed the connection in the middle.',
  EPIPE: 'The server closed the connection in the middle.',
}

/** The many codes of a certificate that does not hold, or of an encryption that does not come about. */
const ENCRYPTION = /TLS|SSL|CERT|ALTNAME/

function sentenceFor(codes: string[]): string {
  if (codes.some((code) => ENCRYPTION.test(code))) return 'The way to the server could not be encrypted.'
  const known = codes.find((code) => SENTENCES[code])
  return known ? SENTENCES[known] : 'The mail could not be handed over.'
}

/**
 * What an answer may keep: one line, without links. Some servers quote the mail back, and a link in it can sign
 * someone in.
 */
export function tidyAnswer(answer: string): string {
  return answer
    .replace(/https?:\/\/\S+/gi, '(link)')
    .replace(/[\s\p{Cc}]+/gu, ' ')
    .trim()
    .slice(0, LONGEST_ANSWER)
}

/**
 * What a failed attempt means. For good is only what a server said about this mail with a code of 500 or more
 * (RFC 5321, 4.2.1); wrong passwords, missing encryption and whatever the network does can be mended and are tried
 * again.
 */
export function failureOf(trouble: unknown): DeliveryFailure {
  const { code = '', originalCode = '', command = '', response, permanent = false, responseCode = 0 } = trouble as NodemailerError
  const aboutTheMail = ABOUT_THE_MAIL.has(command) && !ABOUT_US.has(responseCode)
  const said = response ? `It said: ${response}` : `(${originalCode || code || 'no code'})`
  const answer = aboutTheMail && response ? response : `${sentenceFor([originalCode, code])} ${said}`
  return new DeliveryFailure(tidyAnswer(answer), permanent && aboutTheMail, { cause: trouble })
}
