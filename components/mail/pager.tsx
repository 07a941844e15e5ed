import { PlaceLink } from '@/components/shell/place-link'

interface Props {
  page: number
  pages: number
  /** The address of a page of the list. */
  pathOf: (page: number) => string
}

/** Where one is in a long list, and the ways on. Nothing for a list of one page. */
export function Pager({ page, pages, pathOf }: Props) {
  if (pages === 1) return null
  return (
    <nav className="pgr" aria-label="Pages">
      <span>
        Page {page} of {pages}
      </span>
      {page > 1 && <PlaceLink href={pathOf(page - 1)}>Newer</PlaceLink>}
      {page < pages && <PlaceLink href={pathOf(page + 1)}>Older</PlaceLink>}
    </nav>
  )
}
