'use client'

import { Choice, type Option } from '@/components/forms/choice'
import { FieldRow } from '@/components/forms/field-row'
import { TroubleLine } from '@/components/forms/trouble-line'
import { clashInWords } from '@/components/panel/move-words'
import { PanelPicker } from '@/components/panel/panel-picker'
import type { Preamp } from '@/lib/match'
import { resolveSetting } from '@/lib/match/settings'
import { encodeState, parseState } from '@/lib/match/states'
import { useCheckForm } from './form-context'

const PRESENTS: readonly Option[] = [
  { value: 'known', label: 'I can see them' },
  { value: 'delivered', label: 'As it came' },
  { value: 'unknown', label: "Don't know" },
]

/** How the switches stand now, so that the sheet can say what to move and not only how it ends. */
export function PresentField({ preamp }: { preamp: Preamp }) {
  const { initial, raw, field, showsTrouble, apply } = useCheckForm()
  const delivered = encodeState(preamp, preamp.asDelivered)
  const value = { left: raw.left ?? delivered, right: raw.right ?? delivered }
  const clash = raw.present === 'known' && showsTrouble(['present']) ? clashIn(preamp, [value.left, value.right]) : null
  const tied = field('present')
  return (
    <FieldRow
      id="present"
      question="How it is set now"
      help="The sheet then says which ones to move. Look, and leave them as they are."
      className="prs"
    >
      <div className="how">
        <Choice
          label="How it is set now"
          options={PRESENTS}
          value={initial.present ?? 'unknown'}
          field={{
            ...tied,
            onChange: (event) => {
              // The drawing begins as delivered; from here on that is an answer.
              if (!raw.left || !raw.right) apply(value)
              return tied.onChange(event)
            },
          }}
        />
      </div>
      <p className="note if-delivered">We take it as it left the workshop.</p>
      <p className="note if-unknown">Then the sheet states the whole end state, and names no moves.</p>
      <div className="if-known">
        <PanelPicker preamp={preamp} legend="The switches as they stand" value={value} onChange={(next) => apply({ ...next })} />
        <TroubleLine id="present-e" sentence={clash} fix={null} />
      </div>
    </FieldRow>
  )
}

/** A pair that stands as it cannot, in words; only a form without script can send one. */
function clashIn(preamp: Preamp, texts: string[]): string | null {
  for (const text of texts) {
    const state = parseState(preamp, text)
    const setting = state && resolveSetting(preamp, state)
    if (setting && 'clash' in setting) return clashInWords(preamp, setting.clash)
  }
  return null
}
