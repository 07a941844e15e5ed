import type { VerdictKind } from '../../match/result'

/** Verdicts in rows, on drawings and in strips. */
export const VERDICT_SHORT: Record<VerdictKind, string> = {
  suits: 'Suits',
  'suits-with-changes': 'Suits, with changes',
  'suits-with-a-limit': 'Suits, with a limit',
  'does-not-suit': 'Does not suit',
  'cannot-say': 'Cannot say yet',
}
