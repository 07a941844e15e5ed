import type { Metadata } from 'next'

/** Nothing here is for a search engine, and some addresses hold a link that opens something. */
export const metadata: Metadata = { robots: { index: false, follow: false } }

export default function EntryLayout({ children }: { children: React.ReactNode }) {
  return children
}
