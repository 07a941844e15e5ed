import 'server-only'
import { log } from '@/lib/server/log'
import { claimNext, type ClaimedMail } from './claim'
import { deliver, putBack, type Delivery } from './deliver'

/** How often it looks for mail while there is none. */
const LOOK_EVERY_MS = 1000
/** How long it waits after trouble with the database itself. */
const REST_AFTER_TROUBLE_MS = 30_000
/** So many mails on their way at once: few, since a mail server takes it ill otherwise. */
const LANES = 2

export interface Worker {
  /** Takes no more mail, and resolves when what is under way has ended. */
  stop: () => Promise<void>
  /** Puts back what is under way, at once: for a process that ends now. */
  abandon: () => void
}

/** Delivers what is due, and goes on doing so until it is stopped. */
export function startWorker(delivery: Delivery, { lookEveryMs = LOOK_EVERY_MS }: { lookEveryMs?: number } = {}): Worker {
  const underWay = new Set<ClaimedMail>()
  const stopping = new AbortController()

  async function work() {
    while (!stopping.signal.aborted) {
      const waitMs = await deliverOne(delivery, underWay).then(
        (found) => (found ? 0 : lookEveryMs),
        (trouble: unknown) => {
          log().error({ err: trouble }, 'The outbox could not be worked on.')
          return REST_AFTER_TROUBLE_MS
        },
      )
      if (waitMs > 0) await pause(waitMs, stopping.signal)
    }
  }

  const lanes = Array.from({ length: LANES }, work)
  return {
    async stop() {
      stopping.abort()
      await Promise.all(lanes)
    },
    abandon() {
      stopping.abort()
      for (const mail of underWay) putBack(delivery, mail)
    },
  }
}

/** Delivers what is due now, one mail after the other. @returns how many attempts that took */
export async function deliverDue(delivery: Delivery): Promise<number> {
  let attempts = 0
  while (await deliverOne(delivery, new Set())) attempts += 1
  return attempts
}

async function deliverOne(delivery: Delivery, underWay: Set<ClaimedMail>): Promise<boolean> {
  const mail = claimNext(delivery.db, delivery.clock())
  if (!mail) return false
  underWay.add(mail)
  try {
    await deliver(delivery, mail)
  } finally {
    underWay.delete(mail)
  }
  return true
}

/** Waits, or less when it is told to stop. Keeps no process alive by itself. */
function pause(ms: number, signal: AbortSignal): Promise<void> {
  return new Promise((resolve) => {
    const done = () => {
      clearTimeout(timer)
      signal.removeEventListener('abort', done)
      resolve()
    }
    const timer = setTimeout(done, ms)
    timer.unref()
    signal.addEventListener('abort', done)
    if (signal.aborted) done()
  })
}
