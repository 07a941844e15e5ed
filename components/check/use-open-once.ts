'use client'

import { useState } from 'react'

/** True from the first time that there was a reason to open on: emptying a box must not fold away what it stands in. */
export function useOpenOnce(reason: boolean): boolean {
  const [open, setOpen] = useState(reason)
  if (reason && !open) setOpen(true)
  return open
}
