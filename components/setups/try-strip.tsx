'use client'

import { useEffect, useState } from 'react'
import { VerdictMark } from '../ui/verdict-mark'
import { VERDICT_SHORT } from '@/lib/setups/sentences/short-verdicts'
import { tightestStage } from '@/lib/setups/sentences/headings'
import { roomText } from '@/lib/setups/format'
import { useWhatIf } from './what-if'

/** A verdict that changes with every press is read out once the hand rests. */
const SETTLED_MILLISECONDS = 700

/** On top of the drawing while something is tried out: what it comes to, and the way back. */
export function TryStrip() {
  const { shown, trying, clash, backToAdvice } = useWhatIf()
  const verdict = VERDICT_SHORT[shown.verdict]
  const room = tightestStage(shown.stages)?.roomDecibels
  const spoken = useSettled(trying ? `Trying out. ${verdict}.${room ? ` ${roomText(room.low)} at worst.` : ''}` : '')
  return (
    <>
      <p className="vh" role="status">
        {clash ?? spoken}
      </p>
      {(trying || clash) && (
        <div className="try no-p">
          <b>Trying out. Nothing is saved.</b>
          {trying && (
            <span className="vl">
              <VerdictMark mark={shown.verdict} />
              {verdict}
            </span>
          )}
          {clash && <span className="clash">{clash}</span>}
          <button type="button" className="b sm" onClick={backToAdvice}>
            Back to the advice
          </button>
        </div>
      )}
    </>
  )
}

/** The text as it was when it last stopped changing for a while. */
function useSettled(text: string): string {
  const [settled, setSettled] = useState('')
  useEffect(() => {
    const timer = window.setTimeout(() => setSettled(text), SETTLED_MILLISECONDS)
    return () => window.clearTimeout(timer)
  }, [text])
  return settled
}
