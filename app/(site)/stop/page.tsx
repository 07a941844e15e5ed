import type { Metadata } from 'next'
import { StopCard } from '@/components/shell/stop-card'
import { STOP_KINDS, STOP_TEXTS } from '@/lib/cautions/texts'

export const metadata: Metadata = { title: 'Stop here' }

export default function StopPage() {
  return (
    <main id="main" className="w pg">
      <h1>Stop here</h1>
      <p className="lead">
        Find the card that fits and do what it says, from the top. Nobody reads this page with you, so do not wait for
        us.
      </p>
      <div className="stops">
        {STOP_KINDS.map((kind) => (
          <div key={kind}>
            <p className="for">{STOP_TEXTS[kind].about}</p>
            <StopCard kind={kind} />
          </div>
        ))}
      </div>
    </main>
  )
}
