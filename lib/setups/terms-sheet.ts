/** What can be done to a sheet by whoever holds its code, as the last part of its address. */
export const SHEET_ACTS = ['moved', 'number', 'anew', 'new-code'] as const
export type SheetAct = (typeof SHEET_ACTS)[number]

/** Why a form of a sheet came back undone: the value, the sheet's last letter, or too many at once. */
export const SHEET_TROUBLES = ['number', 'full', 'wait', 'refused'] as const
export type SheetTrouble = (typeof SHEET_TROUBLES)[number]
