'use client'

import { useState, useSyncExternalStore } from 'react'

const never = () => () => undefined

/** False on the server and while the page is still plain, true once it can act. */
function useCanAct(): boolean {
  return useSyncExternalStore(never, () => true, () => false)
}

async function copied(text: string): Promise<boolean> {
  try {
    await navigator.clipboard.writeText(text)
    return true
  } catch {
    return false
  }
}

/** Hands the link on: by the device's own list where it has one, else into the clipboard. A plain link before script. */
export function ShareButton({ address, primary }: { address: string; primary: boolean }) {
  const canAct = useCanAct()
  const [said, setSaid] = useState('')
  const look = primary ? 'b pri' : 'b'
  if (!canAct) {
    return (
      <a className={look} href="#keep">
        Share
      </a>
    )
  }
  const share = async () => {
    if (navigator.share) {
      // Closing the list without choosing is no trouble.
      await navigator.share({ url: address }).catch(() => undefined)
      return
    }
    if (await copied(address)) setSaid('Link copied')
    // Where copying is not allowed either, the link stands further down.
    else document.getElementById('keep')?.scrollIntoView()
  }
  return (
    <button type="button" className={look} onClick={share}>
      <span aria-live="polite">{said || 'Share'}</span>
    </button>
  )
}

/** Only with script: without it the browser's own menu prints. */
export function PrintButton() {
  return useCanAct() ? (
    <button type="button" className="b" onClick={() => window.print()}>
      Print
    </button>
  ) : null
}

/** Copies the link, and says so. Where that is not allowed the link stands there to be copied by hand. */
export function CopyLink({ address }: { address: string }) {
  const canAct = useCanAct()
  const [state, setState] = useState<'untried' | 'copied' | 'refused'>('untried')
  const copy = async () => setState((await copied(address)) ? 'copied' : 'refused')
  return (
    <>
      {canAct && (
        <button type="button" className="lnk" onClick={copy}>
          Copy the link
        </button>
      )}
      <span role="status">{state === 'copied' ? ' Copied' : ''}</span>
      {(!canAct || state === 'refused') && <span className="addr">{address}</span>}
    </>
  )
}
