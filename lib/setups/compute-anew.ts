import 'server-only'
import type { Context } from '../kernel/context'
import { addRevision } from './add-revision'

/**
 * Checks the same answers again by the rules and the catalogue of today, as the sheet's next revision.
 * @throws Fault not_found; bad_input when the preamp is no longer in the catalogue; conflict after Z
 */
export function computeAnew(context: Context, { code }: { code: string }): { code: string; letter: string } {
  return addRevision(context, code, (answers) => answers)
}
