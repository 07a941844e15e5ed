import Link from 'next/link'
import { comparePath } from '@/lib/shelf/format'
import type { ComparisonView } from '@/lib/shelf/views-compare'
import { CompareHead } from './compare-head'
import { CompareRows } from './compare-rows'
import { CompareSwitches } from './compare-switches'
import { CompareTreble } from './compare-treble'
import { labelsOf } from './labels'

/** Two revisions side by side: switches, what went in, what came out, treble. */
export function Comparison({ comparison, now }: { comparison: ComparisonView; now: number }) {
  const { a, b, inputs, outcome, treble, rulesDiffer, shown, stoodKnown } = comparison
  const labels = labelsOf(comparison)
  return (
    <>
      <CompareHead comparison={comparison} now={now} />
      {rulesDiffer && <p className="note">Our rules have changed in between, so part of what differs may come from that.</p>}
      {stoodKnown && (
        <nav className="row shown" aria-label="Which settings">
          <ShownLink path={comparePath(a, b, 'advised')} present={shown === 'advised'}>
            As advised
          </ShownLink>
          <ShownLink path={comparePath(a, b, 'stood')} present={shown === 'stood'}>
            As it stood
          </ShownLink>
        </nav>
      )}
      <CompareSwitches comparison={comparison} />
      <CompareRows heading="What went in" rows={inputs} labels={labels} folded />
      <CompareRows heading="What came out" rows={outcome} labels={labels} />
      {treble && <CompareTreble treble={treble} labels={labels} />}
    </>
  )
}

function ShownLink({ path, present, children }: { path: string; present: boolean; children: React.ReactNode }) {
  return (
    <Link href={path} scroll={false} aria-current={present ? 'true' : undefined}>
      {children}
    </Link>
  )
}
