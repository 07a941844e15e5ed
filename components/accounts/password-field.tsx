import { TextField } from '@/components/forms/text-field'
import type { FieldWiring } from '@/components/forms/use-action-form'
import { PASSWORD_LENGTH } from '@/lib/accounts/terms'

/** A box for a new password, with all that is asked of it. */
export function PasswordField({ wiring, label = 'Password' }: { wiring: FieldWiring; label?: string }) {
  const hint = `At least ${PASSWORD_LENGTH.min} characters, of any kind. Four words that do not belong together are easy to keep in mind.`
  return <TextField wiring={wiring} label={label} hint={hint} type="password" autoComplete="new-password" />
}
