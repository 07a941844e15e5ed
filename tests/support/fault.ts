import { Fault } from '@/lib/kernel/errors'

/** The fault that something ends in; an error when it ends well, or in something unforeseen. */
export async function faultOf(run: () => unknown): Promise<Fault> {
  try {
    await run()
  } catch (trouble) {
    if (trouble instanceof Fault) return trouble
    throw trouble
  }
  throw new Error('It went well, and a fault was expected.')
}
