'use client'

import { createContext, use, useCallback, useMemo, useState, type ReactNode } from 'react'
import { clashInWords } from '../panel/move-words'
import type { Flip } from '../panel/piece'
import type { ControlState } from '@/lib/match/controls'
import type { MatchInputs } from '@/lib/match/inputs'
import { tryOut } from '@/lib/match/match'
import { flip } from '@/lib/match/moves'
import { statesEqual } from '@/lib/match/states'
import type { Outcome } from '@/lib/setups/views'

interface WhatIf {
  inputs: MatchInputs
  /** What the figures show: the advice, or what the flipped switches come to. */
  shown: Outcome
  advice: Outcome
  /** How the switches stand while something is tried out; null while the advice is shown. */
  trying: ControlState | null
  /** Why the last press moved nothing; null when it did. */
  clash: string | null
  press: (pressed: Flip) => void
  backToAdvice: () => void
}

const WhatIfContext = createContext<WhatIf | null>(null)

/** The figures of this sheet and the hand at its drawn switches. Only inside `WhatIfSheet`. */
export function useWhatIf(): WhatIf {
  const whatIf = use(WhatIfContext)
  if (!whatIf) throw new Error('A figure of a sheet stands outside its sheet.')
  return whatIf
}

interface Tried {
  trying: ControlState | null
  outcome: Outcome | null
  clash: string | null
}
const ADVICE: Tried = { trying: null, outcome: null, clash: null }

/**
 * Everything on a sheet that follows its switches. The check itself runs here, in the browser, on the inputs that the
 * sheet was made from. Nothing is saved.
 */
export function WhatIfSheet({ inputs, advice, children }: { inputs: MatchInputs; advice: Outcome; children: ReactNode }) {
  const [{ trying, outcome, clash }, setTried] = useState(ADVICE)

  const press = useCallback(
    ({ control, to }: Flip) => {
      const { preamp } = inputs
      const advised = advice.evaluation.setting.state
      const flipped = flip(preamp, trying ?? advised, control, to)
      if ('clash' in flipped) {
        const words = clashInWords(preamp, flipped.clash, typeof to === 'number' ? to : undefined)
        setTried((last) => ({ ...last, clash: words }))
      } else if (statesEqual(flipped.state, advised)) {
        setTried(ADVICE)
      } else {
        setTried({ trying: flipped.state, outcome: tryOut(inputs, flipped.state), clash: null })
      }
    },
    [inputs, advice, trying],
  )
  const backToAdvice = useCallback(() => setTried(ADVICE), [])

  const whatIf = useMemo(
    () => ({ inputs, advice, shown: outcome ?? advice, trying, clash, press, backToAdvice }),
    [inputs, advice, outcome, trying, clash, press, backToAdvice],
  )
  return <WhatIfContext value={whatIf}>{children}</WhatIfContext>
}
