import type { ComparedSide, ComparisonView } from '@/lib/shelf/views-compare'

/** What the two are called in short: letters where they are of one sheet, numbers besides where not. */
export function labelsOf({ a, b, sameSheet }: Pick<ComparisonView, 'a' | 'b' | 'sameSheet'>): { a: string; b: string } {
  const label = ({ number, letter }: ComparedSide) => (sameSheet ? letter : `${number} ${letter}`)
  return { a: label(a), b: label(b) }
}

/** The heading of the page. */
export function comparisonTitle({ a, b, sameSheet }: Pick<ComparisonView, 'a' | 'b' | 'sameSheet'>): string {
  return sameSheet ? `Revision ${a.letter} beside ${b.letter}` : `Sheet ${a.number} beside ${b.number}`
}
