import type { Control, Preamp, SwitchBank } from '@/lib/match'
import { bankPiece, BESIDE_BANK, type BankForm } from './bank-piece'
import { buttonPiece, type ButtonForm } from './button-piece'
import type { PanelView } from './panel-view'
import { showsAlike } from './panel-view'
import type { Hand, Piece } from './piece'
import { PLUGS_WIDE, plugBoxPiece, plugSocketsPiece, plugsNarrow } from './plug-pieces'
import { slidePiece } from './slide-piece'
import { inSentence } from './words'

/** Every control of one face as pieces, sized for the width there is. */
export interface PieceSource {
  preamp: Preamp
  controls: Control[]
  view: PanelView
  hand: Hand
  focusGroup?: string
}

const isFocused = ({ preamp, focusGroup }: PieceSource, control: Control) =>
  preamp.groups.some((group) => group.id === focusGroup && group.control === control.id)

const LEAST_SWITCH = 24
/** The longest bank on the narrowest phone. */
const LEAST_ALONE = 20
const GAP = 24

/** As wide as lets all banks stand side by side, else both channels of one, else one alone. */
function switchWidth(banks: SwitchBank[], width: number, others: number, widest: number): number {
  const counts = banks.map(({ switchCount }) => switchCount)
  const longest = Math.max(...counts)
  const fitting = (switches: number, blocks: number, beside: number) =>
    Math.floor((width - blocks * BESIDE_BANK - (blocks - 1) * GAP - beside) / switches)
  const all = fitting(2 * counts.reduce((sum, count) => sum + count, 0), 2 * banks.length, others)
  const pair = fitting(2 * longest, 2, 0)
  const found = [all, pair].find((each) => each >= LEAST_SWITCH) ?? fitting(longest, 1, 0)
  return Math.max(LEAST_ALONE, Math.min(widest, found))
}

/** Pieces that stand on a case, both channels drawn. */
export function casePieces(source: PieceSource, { width, widestSwitch, leastButton }: { width: number; widestSwitch: number; leastButton: number }): Piece[] {
  const { preamp, controls, view, hand } = source
  const banks = controls.filter((control) => control.kind === 'bank')
  const others = controls.flatMap((control) => (control.kind === 'bank' ? [] : otherPieces(source, control, leastButton)))
  const beside = others.reduce((sum, piece) => sum + piece.width + GAP, 0)
  const form: BankForm = {
    switchWidth: banks.length > 0 ? switchWidth(banks, width, beside, widestSwitch) : widestSwitch,
    bodyHeight: 66,
    chipHeight: 30,
  }
  const pieces = controls.flatMap((control) => {
    if (control.kind !== 'bank') return otherPieces(source, control, leastButton)
    const name = banks.length > 1 ? `, ${inSentence(control.label)}` : ''
    return (['left', 'right'] as const).map((side) =>
      bankPiece({
        preamp,
        bank: control,
        view: view[side],
        form,
        chips: [{ side, x: 0, text: `${side === 'left' ? 'Left' : 'Right'}${name}` }],
        focusGroup: source.focusGroup,
        hand,
        double: side === 'right',
      }),
    )
  })
  return [...pieces, ...boxes(source, pieces, width)]
}

/** What came in the box stands after everything that is on the case. */
function boxes({ controls, view, hand }: PieceSource, pieces: Piece[], width: number): Piece[] {
  const sockets = pieces.filter(({ lineAfter }) => lineAfter).reduce((sum, piece) => sum + piece.width + GAP, 0)
  return controls
    .filter((control) => control.kind === 'plugs')
    .map((plugs) => plugBoxPiece({ plugs, view, maxWidth: Math.max(120, width - sockets), hand }))
}

function otherPieces(source: PieceSource, control: Exclude<Control, SwitchBank>, leastButton: number): Piece[] {
  const { view, hand } = source
  const focused = isFocused(source, control)
  if (control.kind === 'slide') return [slidePiece({ slide: control, view: view.left, placeWidth: 46, hand, focused })]
  if (control.kind === 'buttons') {
    const form: ButtonForm = { least: leastButton, apart: 8, name: 'bracket' }
    return [buttonPiece({ row: control, view: view.left, form, hand, focused })]
  }
  return [plugSocketsPiece({ plugs: control, view, form: PLUGS_WIDE, focused })]
}

/** Parts only, for a narrow place: one bank where both channels are alike, one under the other where they are not. */
export function narrowPieces(source: PieceSource, width: number): Piece[] {
  const { controls, view, hand } = source
  return controls.flatMap((control): Piece[] => {
    const focused = isFocused(source, control)
    if (control.kind === 'bank') return narrowBanks(source, control, width)
    if (control.kind === 'slide') {
      return [slidePiece({ slide: control, view: view.left, placeWidth: Math.min(60, Math.floor(width / control.positions.length)), hintWidth: width, hand, focused })]
    }
    if (control.kind === 'buttons') {
      const form: ButtonForm = { least: Math.min(84, Math.floor((width - 20) / 4)), apart: 12, name: 'heading' }
      return [buttonPiece({ row: control, view: view.left, form, hand, focused })]
    }
    const sockets = plugSocketsPiece({ plugs: control, view, form: plugsNarrow(width), focused })
    return hand ? [sockets, plugBoxPiece({ plugs: control, view, maxWidth: width, hand })] : [sockets]
  })
}

function narrowBanks({ preamp, view, hand, focusGroup }: PieceSource, bank: SwitchBank, width: number): Piece[] {
  const widest = Math.floor((width - BESIDE_BANK - 6) / bank.switchCount)
  const form: BankForm = { switchWidth: Math.max(LEAST_ALONE, Math.min(42, widest)), bodyHeight: 72, chipHeight: 24 }
  const severalBanks = preamp.controls.filter(({ kind }) => kind === 'bank').length > 1
  const name = severalBanks ? `, ${inSentence(bank.label)}` : ''
  const piece = (side: 'left' | 'right', chips: { side: 'left' | 'right'; text?: string; x: number }[]) =>
    bankPiece({ preamp, bank, view: view[side], form, chips, focusGroup, hand, double: side === 'right' })
  if (view.alike && showsAlike(view)) {
    return [piece('left', [{ side: 'left', x: 2 }, { side: 'right', x: 82, text: `Right, set the same${name.replace(",", ":")}` }])]
  }
  return [piece('left', [{ side: 'left', x: 2, text: `Left${name}` }]), piece('right', [{ side: 'right', x: 2, text: `Right${name}` }])]
}
