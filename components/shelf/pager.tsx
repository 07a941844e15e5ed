import { PlaceLink } from '@/components/shell/place-link'

/** The pages of a list. */
export function Pager({ page, pages, pathOf }: { page: number; pages: number; pathOf: (page: number) => string }) {
  if (pages < 2) return null
  return (
    <nav className="pgr" aria-label="Pages of the list">
      {page > 1 && (
        <PlaceLink href={pathOf(page - 1)} rel="prev">
          The page before
        </PlaceLink>
      )}
      <span>
        Page {page} of {pages}
      </span>
      {page < pages && (
        <PlaceLink href={pathOf(page + 1)} rel="next">
          The next page
        </PlaceLink>
      )}
    </nav>
  )
}
