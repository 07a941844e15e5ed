import type { CartridgeChoice } from '../setups/terms'
import type { AnswersInput } from '../setups/schema'
import type { Preamp } from '../match/preamp'
import type { VerdictKind } from '../match/result'
import type { PositionSource, SecondHand, SheetOrder, SheetsShown } from './terms'

/** What leaves the server of a shelf, to its owner. A serial number never does: only how it ends. */

/** How a unit stands, and since when. */
export interface StandingView {
  left: string
  right: string
  since: number
  source: PositionSource
  /** The sheet that asked for it, where one did and is still there. */
  sheet: { number: number; letter: string } | null
}

export interface UnitView {
  id: string
  /** What its owner calls it; null while the model's name does. */
  name: string | null
  model: { id: string; name: string }
  /** Null while nobody knows which one it has. */
  board: { id: string; name: string } | null
  /** Its boards to choose from; one where the model was made with one. */
  boards: { id: string; name: string }[]
  /** For drawing: as its board, or as the newest while that is open. Null where the catalogue has it no longer. */
  preamp: Preamp | null
  serialEnding: string | null
  boughtOn: string | null
  boughtFrom: string | null
  secondHand: SecondHand
  /** Null while nobody knows. */
  standing: StandingView | null
  /** The last word on it, which can be taken back; null where there is none. */
  lastStep: { id: string; since: number; source: PositionSource } | null
  archived: boolean
}

export interface OwnedCartridgeView {
  id: string
  name: string
  type: CartridgeChoice
  /** True where it was taken from the catalogue. */
  fromCatalogue: boolean
  stylusHours: number | null
  notes: string
  answers: AnswersInput
  archived: boolean
}

/** A sheet in a row or a place, as its newest revision has it. */
export interface SheetMark {
  number: number
  code: string
  name: string | null
  /** Every letter from A to the newest. */
  letters: string[]
  verdict: VerdictKind
  modelName: string
  cartridgeName: string
  changedAt: number
  archived: boolean
}

/** Where a cartridge meets a unit. */
export interface PlaceView {
  cartridgeId: string
  unitId: string
  sheet: SheetMark
  /** The one thing worth knowing; empty where there is none. */
  worthKnowing: string
  /** How many older sheets there are of the same two. */
  older: number
}

/** What goes with what. */
export interface ShelfView {
  units: UnitView[]
  cartridges: OwnedCartridgeView[]
  places: PlaceView[]
  /** Sheets that are kept, in the table above or not. */
  sheetCount: number
  /** Sheets that stand in no place: of no unit or no cartridge that is on the shelf. */
  elsewhere: number
}

export interface SheetsPage {
  sheets: SheetMark[]
  total: number
  page: number
  pages: number
  q: string
  show: SheetsShown
  order: SheetOrder
}

/** One state of a sheet in its history. */
export interface RevisionView {
  letter: string
  createdAt: number
  verdict: VerdictKind
  worthKnowing: string
}

export interface SheetHistory extends SheetMark {
  createdAt: number
  unitId: string | null
  cartridgeId: string | null
  modelId: string
  /** Newest first. */
  revisions: RevisionView[]
}

/** What a check is offered from a shelf: a unit with the answers that it gives. */
export interface UnitOffer {
  id: string
  name: string
  note: string
  answers: AnswersInput
}

/** The same of a cartridge. */
export interface CartridgeOffer {
  id: string
  name: string
  answers: AnswersInput
}
