import type { Metadata } from 'next'

/** Pages of someone's own: no search engine gets to see them, and none should keep their addresses. */
export const metadata: Metadata = { robots: { index: false, follow: false } }

export default function OwnerLayout({ children }: { children: React.ReactNode }) {
  return children
}
