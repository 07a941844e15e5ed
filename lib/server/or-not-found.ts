import 'server-only'
import { notFound } from 'next/navigation'
import { Fault } from '@/lib/kernel/errors'

/** Reads what a page shows; a thing that is not there, or not for whoever asks, makes the page one that does not exist. */
export async function orNotFound<Result>(read: () => Result | Promise<Result>): Promise<Result> {
  try {
    return await read()
  } catch (trouble) {
    if (trouble instanceof Fault && trouble.code === 'not_found') notFound()
    throw trouble
  }
}
