import type { ReactNode } from 'react'
import { tied } from '@/lib/setups/format'

interface Props {
  /** "Figure 2. Level" */
  label: string
  /** What it is on paper, where the numbers run otherwise. */
  paperLabel?: string
  heading: string
  paragraphs?: readonly string[]
  /** What stands under them. */
  aside?: ReactNode
  /** Left out on paper. */
  screenOnly?: boolean
  /** Gives way on paper to a long list of moves. */
  yields?: boolean
  children: ReactNode
}

/** Words on the left that state the finding, the drawing on the right. */
export function FigureBlock({ label, paperLabel, heading, paragraphs = [], aside, screenOnly = false, yields = false, children }: Props) {
  return (
    <section className={screenOnly ? 'fig no-p' : yields ? 'fig yields' : 'fig'}>
      <div className="say">
        <span className="fn">
          {paperLabel ? (
            <>
              <span className="no-p">{label}</span>
              <span className="p-only">{paperLabel}</span>
            </>
          ) : (
            label
          )}
        </span>
        <h2>{tied(heading)}</h2>
        {paragraphs.map((paragraph) => (
          <p key={paragraph}>{tied(paragraph)}</p>
        ))}
        {aside}
      </div>
      {children}
    </section>
  )
}

/** The screen that stands for "anywhere in here", as a swatch in a caption. */
export function ScreenKey() {
  return <i className="key scr ln" aria-hidden="true" />
}

/** A line as a swatch in a caption: solid for middle values, dashed for what it is compared with. */
export function LineKey({ dashed = false }: { dashed?: boolean }) {
  return (
    <svg className="key" viewBox="0 0 22 12" aria-hidden="true">
      <path className={dashed ? 'c-ref' : 'c-mid'} d="M0 6H22" />
    </svg>
  )
}
