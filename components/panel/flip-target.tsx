import type { KeyboardEvent, ReactNode } from 'react'

const NEXT = ['ArrowRight', 'ArrowDown']
const PREVIOUS = ['ArrowLeft', 'ArrowUp']

interface Box {
  x: number
  y: number
  width: number
  height: number
}

/**
 * A set of drawn controls that arrow keys go through: switches each by themselves, or places of which one is chosen.
 */
export function FlipRow({ label, choice, children }: { label: string; choice: boolean; children: ReactNode }) {
  return (
    <g role={choice ? 'radiogroup' : 'group'} aria-label={label} data-row="">
      {children}
    </g>
  )
}

interface FlipTargetProps {
  /** "Switch 3, load, both sides" */
  label: string
  choice: boolean
  on: boolean
  /** What can be pressed. */
  box: Box
  /** The drawn slot inside it, which gets the thick edge. */
  slot: Box
  /** A second place to press the same thing; not read aloud and not reached by keyboard. */
  double?: boolean
  onPress: () => void
}

/** A drawn switch, place, plug or button as something a hand, a key or a screen reader can operate. */
export function FlipTarget({ label, choice, on, box, slot, double = false, onPress }: FlipTargetProps) {
  const onKeyDown = (event: KeyboardEvent<SVGGElement>) => {
    if (event.key === ' ' || event.key === 'Enter') {
      event.preventDefault()
      onPress()
      return
    }
    const step = NEXT.includes(event.key) ? 1 : PREVIOUS.includes(event.key) ? -1 : 0
    if (step === 0) return
    event.preventDefault()
    goTo(event.currentTarget, step, choice)
  }
  const shapes = (
    <>
      <rect className="hit" {...box} />
      <rect className="lid" {...slot} />
      <rect className="ring" x={box.x} y={box.y} width={box.width} height={box.height} />
    </>
  )
  if (double) {
    return (
      <g className="flip" aria-hidden="true" onClick={onPress}>
        {shapes}
      </g>
    )
  }
  return (
    <g
      className="flip"
      role={choice ? 'radio' : 'switch'}
      aria-checked={on}
      aria-label={label}
      tabIndex={choice && !on ? -1 : 0}
      onClick={onPress}
      onKeyDown={onKeyDown}
    >
      {shapes}
    </g>
  )
}

/** Moves the focus along the row, round its ends; a choice follows the focus. */
function goTo(from: SVGGElement, step: number, choice: boolean) {
  const row = [...(from.closest('[data-row]')?.querySelectorAll<SVGGElement>('[tabindex]') ?? [])]
  const next = row[(row.indexOf(from) + step + row.length) % row.length]
  if (!next) return
  next.focus()
  if (choice) next.dispatchEvent(new MouseEvent('click', { bubbles: true }))
}
