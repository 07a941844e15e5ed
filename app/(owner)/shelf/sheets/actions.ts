'use server'

import { action } from '@/lib/server/action'
import { archiveSheet } from '@/lib/shelf/archive-sheet'
import { claimSheet } from '@/lib/shelf/claim-sheet'
import { copySheetWithCartridge } from '@/lib/shelf/copy-sheet-with-cartridge'
import { nameSheet } from '@/lib/shelf/name-sheet'
import { placeSheet } from '@/lib/shelf/place-sheet'
import { restoreSheet } from '@/lib/shelf/restore-sheet'
import { ClaimSheetInput, CopySheetInput, NameSheetInput, PlaceSheetInput, SheetInput } from '@/lib/shelf/schema'

const toSheet = ({ number }: { number: number }) => ({ go: `/shelf/sheets/${number}` })

export const claimSheetAction = action(ClaimSheetInput, claimSheet, toSheet)
export const nameSheetAction = action(NameSheetInput, nameSheet, toSheet)
export const placeSheetAction = action(PlaceSheetInput, placeSheet, toSheet)
export const archiveSheetAction = action(SheetInput, archiveSheet, toSheet)
export const restoreSheetAction = action(SheetInput, restoreSheet, toSheet)
export const copySheetAction = action(CopySheetInput, copySheetWithCartridge, ({ path }) => ({ go: path }))
