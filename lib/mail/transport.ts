import type { Sender } from '@/lib/server/env-mail'

/** A mail on the way, whole. */
export interface OutgoingMail {
  /** Without its brackets. */
  messageId: string
  from: Sender
  /** One address. */
  to: string
  subject: string
  html: string
  plain: string
  /** When it was asked for, in ms. */
  date: number
}

/** A way out. */
export interface Transport {
  /**
   * Hands a mail over.
   * @returns what the other side answered
   * @throws DeliveryFailure when it was not taken
   */
  deliver(mail: OutgoingMail): Promise<string>
}

/** A mail that was not taken: what was answered, and whether asking again is of any use. */
export class DeliveryFailure extends Error {
  constructor(
    answer: string,
    readonly permanent: boolean,
    options?: ErrorOptions,
  ) {
    super(answer, options)
    this.name = 'DeliveryFailure'
  }
}
