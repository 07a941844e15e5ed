'use client'

import { FieldRow } from '@/components/forms/field-row'
import { toQuery, type AnswersInput } from '@/lib/setups/schema'
import { useCheckForm } from './form-context'

interface Offer {
  id: string
  name: string
  note?: string
  answers: AnswersInput
}

interface Props {
  id: string
  help: string
  offers: readonly Offer[]
  /** The step that shows them. */
  path: string
  /** Which of them the answers are about. */
  chosen: string | undefined
  fill: (raw: AnswersInput, of: AnswersInput) => AnswersInput
}

/**
 * What is on the shelf of whoever is signed in. Taking one is a link to this step with its answers in: it works without
 * script, and the page begins anew with them.
 */
export function Yours({ id, help, offers, path, chosen, fill }: Props) {
  const { raw } = useCheckForm()
  if (offers.length === 0) return null
  return (
    <FieldRow id={id} question="Yours" help={help}>
      <ul className="yrs">
        {offers.map((offer) => (
          <li key={offer.id}>
            <a href={`${path}?${toQuery(fill(raw, offer.answers))}`} aria-current={offer.id === chosen ? 'true' : undefined}>
              {offer.name}
            </a>
            {offer.note && <span className="lab"> {offer.note}</span>}
          </li>
        ))}
      </ul>
    </FieldRow>
  )
}
