import 'server-only'
import type { z } from 'zod'
import { Fault, type FieldSentences } from '@/lib/kernel/errors'

/** A fault as JSON: its code, its sentence, and one sentence for each field. Never kept by a cache. */
export function answerFault(fault: Fault): Response {
  const { code, message, fields, status, retryAfterSeconds } = fault
  const headers: Record<string, string> = { 'Cache-Control': 'no-store' }
  if (retryAfterSeconds !== undefined) headers['Retry-After'] = String(retryAfterSeconds)
  return Response.json({ error: { code, message, fields } }, { status, headers })
}

/** What a schema refused, as a fault: the first sentence of each field, by the field's name. */
export function faultOfIssues(error: z.ZodError): Fault {
  const fields: FieldSentences = {}
  for (const { path, message } of error.issues) fields[path.map(String).join('.')] ??= message
  return new Fault('bad_input', error.issues[0].message, { fields })
}
