import 'server-only'
import { asc, count, eq, isNull, and, sql } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { oneTimeTokens, recoveryCodes, secondFactors, sessions } from '@/db/schema/accounts'
import { mailboxMessages, outbox } from '@/db/schema/mail'
import { ownedCartridges, unitPositions, units } from '@/db/schema/shelf'
import type { Person } from '@/lib/accounts/people'
import { fromStored } from '@/lib/setups/stored'

/** What is held about a person, as plain objects. Times are written as ISO 8601; secrets are not here, nor their hashes. */

const time = (milliseconds: number | null) => (milliseconds === null ? null : new Date(milliseconds).toISOString())

export function accountHeld(db: Database, person: Person) {
  const factors = db.select().from(secondFactors).where(eq(secondFactors.personId, person.id)).all()
  const codes = db
    .select({ left: count() })
    .from(recoveryCodes)
    .where(and(eq(recoveryCodes.personId, person.id), isNull(recoveryCodes.usedAt)))
    .get()
  const links = db.select().from(oneTimeTokens).where(eq(oneTimeTokens.emailKey, person.emailKey)).orderBy(asc(oneTimeTokens.createdAt)).all()
  return {
    id: person.id,
    email: person.email,
    name: person.name,
    role: person.role,
    hasPassword: person.passwordHash !== null,
    emailConfirmedAt: time(person.emailConfirmedAt),
    createdAt: time(person.createdAt),
    disabledAt: time(person.disabledAt),
    deletionAskedAt: time(person.deletionAskedAt),
    authenticators: factors.map(({ createdAt, confirmedAt }) => ({ createdAt: time(createdAt), confirmedAt: time(confirmedAt) })),
    recoveryCodesLeft: codes?.left ?? 0,
    linksSent: links.map(({ purpose, email, createdAt, expiresAt, usedAt }) => ({
      purpose,
      email,
      createdAt: time(createdAt),
      expiresAt: time(expiresAt),
      usedAt: time(usedAt),
    })),
  }
}

export function sessionsHeld(db: Database, person: Person) {
  const rows = db.select().from(sessions).where(eq(sessions.personId, person.id)).orderBy(asc(sessions.createdAt)).all()
  return rows.map(({ device, origin, way, createdAt, completedAt, lastSeenAt, expiresAt, endedAt }) => ({
    device,
    origin,
    way,
    createdAt: time(createdAt),
    completedAt: time(completedAt),
    lastSeenAt: time(lastSeenAt),
    expiresAt: time(expiresAt),
    endedAt: time(endedAt),
  }))
}

export function unitsHeld(db: Database, person: Person) {
  const rows = db.select().from(units).where(eq(units.ownerId, person.id)).orderBy(asc(units.createdAt), asc(units.id)).all()
  return rows.map(({ ownerId: _owner, archivedAt, createdAt, ...unit }) => ({
    ...unit,
    createdAt: time(createdAt),
    putAwayAt: time(archivedAt),
    positions: positionsHeld(db, unit.id),
  }))
}

function positionsHeld(db: Database, unitId: string) {
  const rows = db.select().from(unitPositions).where(eq(unitPositions.unitId, unitId)).orderBy(asc(unitPositions.step)).all()
  return rows.map(({ id: _id, unitId: _unit, createdAt, undoneAt, ...step }) => ({ ...step, createdAt: time(createdAt), undoneAt: time(undoneAt) }))
}

export function cartridgesHeld(db: Database, person: Person) {
  const rows = db.select().from(ownedCartridges).where(eq(ownedCartridges.ownerId, person.id)).orderBy(asc(ownedCartridges.createdAt), asc(ownedCartridges.id)).all()
  return rows.map(({ ownerId: _owner, answers, archivedAt, createdAt, ...cartridge }) => ({
    ...cartridge,
    answers: fromStored<Record<string, string>>(answers),
    createdAt: time(createdAt),
    putAwayAt: time(archivedAt),
  }))
}

/** Mail to the present address: what the outbox remembers, and what the local mailbox keeps. */
export function mailsHeld(db: Database, person: Person) {
  const toThem = (column: typeof outbox.recipient | typeof mailboxMessages.recipient) => sql`lower(${column}) = ${person.emailKey}`
  const sent = db.select().from(outbox).where(toThem(outbox.recipient)).orderBy(asc(outbox.createdAt), asc(outbox.id)).all()
  const kept = db.select().from(mailboxMessages).where(toThem(mailboxMessages.recipient)).orderBy(asc(mailboxMessages.receivedAt), asc(mailboxMessages.id)).all()
  return {
    outbox: sent.map(({ messageId, template, recipient, subject, status, createdAt, sentAt, givenUpAt }) => ({
      messageId,
      kind: template,
      recipient,
      subject,
      status,
      createdAt: time(createdAt),
      sentAt: time(sentAt),
      givenUpAt: time(givenUpAt),
    })),
    mailbox: kept.map(({ messageId, recipient, subject, plain, receivedAt }) => ({ messageId, recipient, subject, text: plain, receivedAt: time(receivedAt) })),
  }
}
