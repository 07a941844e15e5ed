/** What can foreseeably go wrong, and the HTTP status each answers with. */
export const FAULT_STATUS = {
  bad_input: 422,
  sign_in: 401,
  not_allowed: 403,
  not_found: 404,
  conflict: 409,
  too_large: 413,
  too_many: 429,
} as const

export type FaultCode = keyof typeof FAULT_STATUS

/** One sentence for each field that has something wrong, by the field's name. */
export type FieldSentences = Record<string, string>

interface FaultExtras {
  /** For the log only. Never shown. */
  detail?: Record<string, unknown>
  fields?: FieldSentences
  /** With `too_many`: when asking again makes sense. */
  retryAfterSeconds?: number
  cause?: unknown
}

/**
 * Foreseen trouble: a code for the machine, a sentence for the person, details for the log.
 * Anything unforeseen is left to rise as it is.
 */
export class Fault extends Error {
  readonly code: FaultCode
  readonly status: number
  readonly detail: Record<string, unknown>
  readonly fields: FieldSentences
  readonly retryAfterSeconds?: number

  constructor(code: FaultCode, words: string, extras: FaultExtras = {}) {
    super(words, { cause: extras.cause })
    this.name = 'Fault'
    this.code = code
    this.status = FAULT_STATUS[code]
    this.detail = extras.detail ?? {}
    this.fields = extras.fields ?? {}
    this.retryAfterSeconds = extras.retryAfterSeconds
  }
}
