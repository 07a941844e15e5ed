'use client'

import { useEffect, useState } from 'react'
import { VerdictMark } from '../ui/verdict-mark'
import { roomText } from '@/lib/setups/format'
import { tightestStage } from '@/lib/setups/sentences/headings'
import { VERDICT_SHORT } from '@/lib/setups/sentences/short-verdicts'
import { useWhatIf } from './what-if'

/** A verdict that changes with every press is read out once the hand rests. */
const SETTLED_MILLISECONDS = 700

/** On top of the drawing while something is tried out: what it comes to, and the way back. */
export function TryStrip() {
  const { shown, trying, clash } = useWhatIf()
  const room = tightestStage(shown.stages)?.roomDecibels
  const spoken = useSettled(trying ? `Trying out. ${VERDICT_SHORT[shown.verdict]}.${room ? ` At worst ${roomText(room.low)}.` : ''}` : '')
  return (
    <>
      <p className="vh" role="status">
        {clash ?? spoken}
      </p>
      {(trying || clash) && <Strip />}
    </>
  )
}

/** The same while the figures are in view and the drawing is not. */
export function FollowStrip() {
  const { trying } = useWhatIf()
  return trying ? (
    <div className="follow no-p">
      <Strip />
    </div>
  ) : null
}

function Strip() {
  const { shown, trying, clash, backToAdvice } = useWhatIf()
  const back = () => {
    backToAdvice()
    // The button goes away with the strip; the focus must not fall out of the sheet.
    document.getElementById('main')?.focus({ preventScroll: true })
  }
  return (
    <div className="try no-p">
      <b>Trying out. Nothing is saved.</b>
      {trying && (
        <span className="vl">
          <VerdictMark mark={shown.verdict} />
          {VERDICT_SHORT[shown.verdict]}
        </span>
      )}
      {clash && <span className="clash">{clash}</span>}
      <button type="button" className="b sm" onClick={back}>
        Back to the advice
      </button>
    </div>
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
