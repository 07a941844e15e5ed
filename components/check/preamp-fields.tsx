'use client'

import { useState } from 'react'
import { Choice, type Option } from '@/components/forms/choice'
import { FieldRow } from '@/components/forms/field-row'
import { TroubleLine } from '@/components/forms/trouble-line'
import type { PreampView } from '@/lib/catalogue/views'
import { countWord, sentenceCase } from '@/lib/setups/format'
import { boardOfSerial, pickPreamp, serialSentence, type SerialTrouble } from '@/lib/setups/views-preamp'
import { STEP_PATHS } from '@/lib/setups/views-steps'
import type { UnitOffer } from '@/lib/shelf/views'
import { useCheckForm } from './form-context'
import { PresentField } from './present-field'
import { NO_PREAMP } from './use-check-answers'
import { Yours } from './yours'

/** Which preamp, which board of it, and how its switches stand. `models` are the maker's, in the maker's order. */
export function PreampFields({ models, units, serialTrouble }: { models: readonly PreampView[]; units: readonly UnitOffer[]; serialTrouble: SerialTrouble | null }) {
  const { initial, raw, field, showsTrouble, apply } = useCheckForm()
  const { model, board, boardOpen } = pickPreamp(models, raw)
  const tied = field('preamp')
  return (
    <>
      <Yours
        id="yours"
        help="From your shelf, with its board and how it stands."
        offers={units}
        path={STEP_PATHS.preamp}
        chosen={raw.unit}
        fill={(all, unit) => ({ ...all, ...unit })}
      />
      <FieldRow id="preamp" question="Model" help="The name is at the back, by the output sockets.">
        <Choice
          label="Model"
          options={models.map(({ id, name }) => ({ value: id, label: name }))}
          value={initial.preamp}
          field={{
            ...tied,
            onChange: (event) => {
              // Boards and positions are another model's.
              apply({ board: '', left: '', right: '', present: 'unknown', unit: '' })
              return tied.onChange(event)
            },
          }}
          wrap
        />
        <TroubleLine
          id="preamp-e"
          sentence={!model && showsTrouble(['preamp']) ? NO_PREAMP : null}
          fix={null}
        />
        <noscript>
          <p className="note">
            <button className="lnk" type="submit" name="go" value="stay">
              Show what this model asks
            </button>
          </p>
        </noscript>
      </FieldRow>
      {model && model.boards.length > 1 && <BoardField key={model.id} model={model} open={boardOpen} trouble={serialTrouble} />}
      {board && board.preamp.controls.length > 0 && <PresentField key={`${board.preamp.modelId} ${board.id}`} preamp={board.preamp} />}
    </>
  )
}

/** The serial number settles the board and is then forgotten: it is no part of the answers. */
function BoardField({ model, open, trouble }: { model: PreampView; open: boolean; trouble: SerialTrouble | null }) {
  const { initial, raw, field, apply } = useCheckForm()
  const [reason, setReason] = useState(trouble)
  const boards: Option[] = [
    ...model.boards.map(({ id, name }) => ({ value: id, label: sentenceCase(name) })),
    { value: '', label: "Don't know" },
  ]
  const named = model.boards.find(({ id }) => id === raw.board)
  const newest = model.boards[model.boards.length - 1]
  return (
    <FieldRow id="board" question="Board" help={`The ${model.name} was made with ${countWord(model.boards.length)} boards, and their switches differ.`}>
      <label className="lab" htmlFor="serial">
        Serial number
      </label>
      <div className="row">
        <span className="in">
          <input
            id="serial"
            type="text"
            name="serial"
            aria-describedby="serial-n serial-e"
            aria-invalid={reason !== null || undefined}
            autoComplete="off"
            onChange={(event) => {
              const settled = boardOfSerial(model, event.target.value)
              setReason(settled && 'reason' in settled && event.target.value.length > 2 ? settled.reason : null)
              if (settled && 'board' in settled) apply({ board: settled.board.id, left: '', right: '', present: 'unknown' })
            }}
          />
        </span>
      </div>
      <p className="note" id="serial-n">
        It is on the plate at the back. It only settles the board: we do not keep it.
      </p>
      <TroubleLine id="serial-e" sentence={reason && serialSentence(reason, model)} fix={null} />
      <div className="brd">
        <Choice label="Board" options={boards} value={initial.board ?? ''} field={field('board')} wrap />
      </div>
      <div aria-live="polite">
        {named && <p className="und">Understood: {named.name}.</p>}
        {open && <p className="note">Until you say, we take the {newest.name}.</p>}
      </div>
    </FieldRow>
  )
}
