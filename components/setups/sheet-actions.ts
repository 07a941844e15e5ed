/** What a form of a sheet comes back with: why it was refused, and what stood in it. */
export interface SheetFormState {
  /** Null when nothing is wrong, or when the answer is another page. */
  sentence: string | null
  values: Record<string, string>
}

export const UNTOUCHED: SheetFormState = { sentence: null, values: {} }

export type SheetAction = (before: SheetFormState, form: FormData) => Promise<SheetFormState>

/** What can be done to a sheet by whoever holds its code. */
export interface SheetActions {
  /** The number that was found, into the next revision. */
  answerNumber: SheetAction
  /** The moves are made: the next revision starts from there. */
  markMoved: SheetAction
  computeAnew: SheetAction
  makeNewCode: SheetAction
}
