'use client'

import { usePathname } from 'next/navigation'
import { PlaceLink } from './place-link'

const PLACES = [{ path: '/check', words: 'Check a cartridge' }]
const SHELF = { path: '/shelf', words: 'My sheets' }
const WORKSHOP = { path: '/workshop', words: 'Workshop' }

/** The places one can go, with the present one marked. */
export function MainNav({ shelf, workshop }: { shelf: boolean; workshop: boolean }) {
  const here = usePathname()
  const marked = (path: string) => (here === path ? 'page' : here.startsWith(`${path}/`) ? 'true' : undefined)
  return (
    <nav aria-label="Main">
      {[...PLACES, ...(shelf ? [SHELF] : []), ...(workshop ? [WORKSHOP] : [])].map(({ path, words }) => (
        <PlaceLink key={path} href={path} aria-current={marked(path)}>
          {words}
        </PlaceLink>
      ))}
    </nav>
  )
}
