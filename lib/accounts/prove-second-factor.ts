import 'server-only'
import type { Transaction } from '@/db/client'
import type { Milliseconds } from '@/lib/kernel/clock'
import { takeRecoveryCode } from './recovery-codes'
import { takeCode, type SecondFactorRow } from './second-factor'

/**
 * Takes a code of the authenticator, or a recovery code from someone whose authenticator is gone.
 * @returns whether it was right and unused
 */
export function proveSecondFactor(tx: Transaction, factor: SecondFactorRow, typed: string, now: Milliseconds): boolean {
  const figures = /^\s*\d{3}\s*\d{3}\s*$/.test(typed)
  return figures ? takeCode(tx, factor, typed, now) : takeRecoveryCode(tx, factor.personId, typed, now)
}
