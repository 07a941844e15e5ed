/** The words and limits of the shelf: what someone owns, and how their unit stands. */

/** How we know where the switches stand: its owner said so, or did what a sheet asked for. */
export const POSITION_SOURCES = ['told', 'moved'] as const
export type PositionSource = (typeof POSITION_SOURCES)[number]

/** Bought second-hand or new; not said where the unit has none of them. */
export const SECOND_HANDS = ['yes', 'no', 'not-said'] as const
export type SecondHand = (typeof SECOND_HANDS)[number]

export const MAX_SHELF_NAME_LENGTH = 60
export const MAX_SHOP_LENGTH = 120
export const MAX_NOTES_LENGTH = 2000
export const MAX_SERIAL_LENGTH = 20
/** So much of a serial number is shown to its owner, and to nobody else. */
export const SERIAL_ENDING_LENGTH = 3

/** More than a stylus lasts several times over: beyond it is a slip of the pen. Common practice, no source. */
export const MAX_STYLUS_HOURS = 20_000

/** So many of each fit on one shelf: far more than anyone owns, few enough to draw. */
export const MAX_UNITS = 100
export const MAX_CARTRIDGES = 300

/** Which of someone's sheets a list shows, and in which order. */
export const SHEETS_SHOWN = ['kept', 'put-away'] as const
export type SheetsShown = (typeof SHEETS_SHOWN)[number]
export const SHEET_ORDERS = ['newest', 'number', 'cartridge', 'preamp', 'verdict'] as const
export type SheetOrder = (typeof SHEET_ORDERS)[number]
export const SHEETS_A_PAGE = 25
export const MAX_SHEET_SEARCH_LENGTH = 80
/** Words of a search beyond these are left out. */
export const MAX_SEARCH_WORDS = 8
