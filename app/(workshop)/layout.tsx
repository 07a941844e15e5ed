import type { Metadata } from 'next'

/** The workshop's own pages: not for a search engine. Who may see what is for each page's verbs to say. */
export const metadata: Metadata = { robots: { index: false, follow: false } }

export default function WorkshopLayout({ children }: { children: React.ReactNode }) {
  return children
}
