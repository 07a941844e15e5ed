import 'server-only'
import { Fault } from '@/lib/kernel/errors'

const tooLarge = (limitBytes: number) => new Fault('too_large', `That is more than ${Math.floor(limitBytes / 1024)} KB. A check needs far less.`)

/**
 * The body of a request as JSON. Reads no further than the limit, whatever the header promises.
 * @throws Fault too_large; bad_input when it is no JSON
 */
export async function readJson(request: Request, limitBytes: number): Promise<unknown> {
  if (Number(request.headers.get('content-length')) > limitBytes) throw tooLarge(limitBytes)
  const reader = request.body?.getReader()
  const parts: Uint8Array[] = []
  let size = 0
  while (reader) {
    const { done, value } = await reader.read()
    if (done) break
    size += value.byteLength
    if (size > limitBytes) {
      await reader.cancel()
      throw tooLarge(limitBytes)
    }
    parts.push(value)
  }
  try {
    return JSON.parse(Buffer.concat(parts).toString('utf8'))
  } catch (cause) {
    throw new Fault('bad_input', 'This is no JSON. Send an object with the answers.', { cause })
  }
}
