'use client'

import Link, { useLinkStatus } from 'next/link'
import type { ComponentProps } from 'react'

/** A link to another page that says "One moment" where the page is slow to come. */
export function PlaceLink({ children, ...rest }: ComponentProps<typeof Link>) {
  return (
    <Link {...rest}>
      {children}
      <Waiting />
    </Link>
  )
}

function Waiting() {
  const { pending } = useLinkStatus()
  return pending ? (
    <span className="wait" role="status">
      One moment
    </span>
  ) : null
}
