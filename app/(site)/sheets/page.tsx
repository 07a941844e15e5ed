import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { OpenByCode } from '@/components/setups/open-by-code'
import { readSheetCode } from '@/lib/setups/codes'

export const metadata: Metadata = { title: 'Open a sheet', robots: { index: false } }

interface Props {
  searchParams: Promise<{ code?: string | string[] }>
}

/** Opens a sheet by the code that was printed on it. */
export default async function OpenSheetPage({ searchParams }: Props) {
  const { code } = await searchParams
  const typed = Array.isArray(code) ? code[0] : code
  const read = typed && readSheetCode(typed)
  if (read) redirect(`/sheets/${read}`)
  return (
    <main id="main" className="w lost">
      <h1>Open a sheet</h1>
      <p className="lead">Its code stands at the foot of the printed page, in four groups of four.</p>
      <OpenByCode code={typed} refused={typed ? refusal(typed) : undefined} />
    </main>
  )
}

function refusal(typed: string): string {
  return /^\s*\d+\s*$/.test(typed)
    ? 'That is a number. It opens nothing; the code has four groups of four, such as k7m2-w9qd-h4tx-p3rt.'
    : 'A code has four groups of four, such as k7m2-w9qd-h4tx-p3rt. It has no a, e, i, l, o, u, 0 or 1.'
}
