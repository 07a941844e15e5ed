import 'server-only'
import { sql } from 'drizzle-orm'
import { revisions } from '@/db/schema/setups'
import type { UnknownName } from '@/lib/match/inputs'
import type { Finding, Gate, VerdictKind } from '@/lib/match/result'
import type { Gist } from './format'

const inResult = <T>(path: string) => sql<T>`json_extract(${revisions.result}, ${path})`

/** The few words of a revision's result that a table shows, so that its curves stay in the database. */
export const gistColumns = {
  verdict: inResult<VerdictKind>('$.match.verdict'),
  gate: inResult<Gate['reason'] | null>('$.match.gate.reason'),
  next: inResult<UnknownName | null>('$.match.next.unknown'),
  /** JSON. */
  findings: inResult<string | null>('$.match.chosen.findings'),
}

interface Columns {
  verdict: VerdictKind
  gate: Gate['reason'] | null
  next: UnknownName | null
  findings: string | null
}

export function toGist({ verdict, gate, next, findings }: Columns): Gist {
  return { verdict, gate, next, findings: findings === null ? [] : (JSON.parse(findings) as Pick<Finding, 'code' | 'worst'>[]) }
}
