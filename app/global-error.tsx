'use client'

import { TroublePage } from '@/components/shell/trouble-page'
import './globals.css'

/** Where even the frame round the pages broke. */
export default function GlobalErrorPage({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <html lang="en-GB">
      <body>
        <title>This page broke · Oskerby set-up service</title>
        <TroublePage digest={error.digest} tryAgain={reset} />
      </body>
    </html>
  )
}
