'use client'

import { TroublePage } from '@/components/shell/trouble-page'

export default function ErrorPage({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return <TroublePage digest={error.digest} tryAgain={reset} />
}
