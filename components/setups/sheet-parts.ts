import type { SheetView } from '@/lib/setups/views'
import type { SheetActions } from './sheet-actions'
import type { SheetPaths } from './sheet-facts'

/** What every form of a sheet is made from. */
export interface SheetParts {
  sheet: SheetView
  paths: SheetPaths
  /** The whole link. */
  address: string
  actions: SheetActions
}
