import 'server-only'
import { sql } from 'drizzle-orm'
import { revisions } from '@/db/schema/setups'
import type { UnknownName } from '@/lib/match/inputs'
import type { FindingCode, Gate, VerdictKind, Weight } from '@/lib/match/result'
import type { Gist } from './format'

const inResult = <T>(path: string) => sql<T>`json_extract(${revisions.result}, ${path})`

/** The few words of a revision's result that a table shows, so that its curves stay in the database. */
export const gistColumns = {
  verdict: inResult<VerdictKind>('$.match.verdict'),
  gate: inResult<Gate['reason'] | null>('$.match.gate.reason'),
  next: inResult<UnknownName | null>('$.match.next.unknown'),
  code: inResult<FindingCode | null>('$.match.chosen.findings[0].code'),
  worst: inResult<Weight | null>('$.match.chosen.findings[0].worst'),
}

interface Columns {
  verdict: VerdictKind
  gate: Gate['reason'] | null
  next: UnknownName | null
  code: FindingCode | null
  worst: Weight | null
}

export function toGist({ verdict, gate, next, code, worst }: Columns): Gist {
  return { verdict, gate, next, finding: code && worst ? { code, worst } : null }
}
