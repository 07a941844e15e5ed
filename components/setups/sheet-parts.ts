import type { SheetView } from '@/lib/setups/views'
import type { SheetTrouble } from '@/lib/setups/terms-sheet'
import type { SheetPaths } from './sheet-facts'

/** What every form of a sheet is made from. */
export interface SheetParts {
  sheet: SheetView
  paths: SheetPaths
  /** The whole link. */
  address: string
  /** Why a form of this sheet came back undone, with what stood in it; null when none did. */
  returned: ReturnedForm | null
}

export interface ReturnedForm {
  trouble: SheetTrouble
  value?: string
  velocity?: string
  meaning?: string
}
