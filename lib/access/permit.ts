import { Fault } from '@/lib/kernel/errors'
import type { Actor } from './actor'
import { RULES, type Permission } from './rules'

declare const permitted: unique symbol

/** A row together with the proof that someone was allowed to do this to it. Only `permit` makes one. */
export type Permitted<Row, P extends Permission> = Row & { readonly [permitted]: P }

/** What a permission looks at besides the actor: a row, or nothing. */
type RowFor<P extends Permission> = Parameters<(typeof RULES)[P]>[1]
type RowPermission = { [P in Permission]: Parameters<(typeof RULES)[P]> extends [Actor] ? never : P }[Permission]
type PlainPermission = Exclude<Permission, RowPermission>

const isPermission = (name: string): name is Permission => Object.hasOwn(RULES, name)

function allows(actor: Actor, permission: Permission, row: unknown): boolean {
  const rule: (who: Actor, row: never) => boolean = RULES[permission]
  return rule(actor, row as never)
}

/** Whether someone may do this: for deciding what to show. What is done goes through `permit`. */
export function can(actor: Actor, permission: PlainPermission): boolean
export function can<P extends RowPermission>(actor: Actor, permission: P, row: RowFor<P>): boolean
export function can(actor: Actor, permission: Permission, row?: unknown): boolean {
  return allows(actor, permission, row)
}

/**
 * Holds a verb to the table of rules.
 * @returns the row, marked as permitted; nothing for a permission that looks at no row
 * @throws Fault not_found for someone who may not even read the row; otherwise sign_in for a visitor, not_allowed for
 *   someone who is signed in
 */
export function permit(actor: Actor, permission: PlainPermission): void
export function permit<P extends RowPermission, Row extends RowFor<P>>(actor: Actor, permission: P, row: Row): Permitted<Row, P>
export function permit(actor: Actor, permission: Permission, row?: unknown): unknown {
  if (allows(actor, permission, row)) return row
  const detail = { permission, role: actor.kind === 'person' ? actor.role : 'visitor' }
  const reading = permission.replace(/:.*/, ':read')
  const mayRead = isPermission(reading) && allows(actor, reading, row)
  if (actor.kind === 'visitor' && (mayRead || row === undefined)) throw new Fault('sign_in', 'Sign in first.', { detail })
  if (!mayRead) throw new Fault('not_found', 'There is nothing here under that name.', { detail })
  throw new Fault('not_allowed', 'Your account may not do this.', { detail })
}
