import { blob, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { ROLES, SIGN_IN_WAYS, TOKEN_PURPOSES } from '../../lib/accounts/terms'
import { milliseconds } from './columns'

const flag = (name: string) => integer(name, { mode: 'boolean' })

/** Everyone with an account. A row is made only once its address is known to be its owner's. */
export const people = sqliteTable(
  'people',
  {
    id: text('id').primaryKey(),
    /** As it was typed: mail goes there. */
    email: text('email').notNull(),
    /** The address without capitals: what makes it the same as another. */
    emailKey: text('email_key').notNull().unique(),
    name: text('name').notNull(),
    role: text('role', { enum: ROLES }).notNull(),
    /** argon2id; null for those who sign in by link only. */
    passwordHash: text('password_hash'),
    emailConfirmedAt: milliseconds('email_confirmed_at').notNull(),
    disabledAt: milliseconds('disabled_at'),
    deletionAskedAt: milliseconds('deletion_asked_at'),
    /** Came with the demo data. */
    demo: flag('demo').notNull().default(false),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [
    // Whose week to change their mind is over.
    index('people_deletion').on(table.deletionAskedAt),
  ],
)

/** One sign-in on one device. What counts is this row: the cookie only names it. */
export const sessions = sqliteTable(
  'sessions',
  {
    id: text('id').primaryKey(),
    personId: text('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** When all of the sign-in was done; null while the code from the authenticator is awaited, and it does not count. */
    completedAt: milliseconds('completed_at'),
    lastSeenAt: milliseconds('last_seen_at').notNull(),
    expiresAt: milliseconds('expires_at').notNull(),
    endedAt: milliseconds('ended_at'),
    way: text('way', { enum: SIGN_IN_WAYS }).notNull().default('password'),
    /** In words: "Firefox on Linux". */
    device: text('device').notNull(),
    /** Shortened, so that it says where about and not which connection. */
    origin: text('origin').notNull(),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [
    // The list of someone's sessions, and ending them all.
    index('sessions_person').on(table.personId),
    // Sweeping out what is long over.
    index('sessions_expires').on(table.expiresAt),
  ],
)

/** Links that were sent by mail. Only a hash is kept: who reads this table can follow none of them. */
export const oneTimeTokens = sqliteTable(
  'one_time_tokens',
  {
    /** SHA-256 of the token, in hex. The token has 105 bits of chance, so a plain hash cannot be gone through. */
    hash: text('hash').primaryKey(),
    purpose: text('purpose', { enum: TOKEN_PURPOSES }).notNull(),
    /** The address it speaks of: the one that signs in, joins or is invited, or the new one of a change. */
    email: text('email').notNull(),
    emailKey: text('email_key').notNull(),
    personId: text('person_id').references(() => people.id, { onDelete: 'cascade' }),
    /** What someone who joins chose, until the address is known to be theirs. */
    name: text('name'),
    passwordHash: text('password_hash'),
    /** What someone who is invited will be. */
    role: text('role', { enum: ROLES }),
    /** Both ends of one change of address have the same. */
    pair: text('pair'),
    expiresAt: milliseconds('expires_at').notNull(),
    usedAt: milliseconds('used_at'),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [
    // Voiding what an address still has open.
    index('one_time_tokens_email').on(table.emailKey),
    index('one_time_tokens_person').on(table.personId),
    index('one_time_tokens_pair').on(table.pair),
    index('one_time_tokens_expires').on(table.expiresAt),
  ],
)

/** Authenticator apps. One that counts and, while it is being replaced, one that is not confirmed yet. */
export const secondFactors = sqliteTable(
  'second_factors',
  {
    id: text('id').primaryKey(),
    personId: text('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** Encrypted with a key that comes from the app's secret. */
    sealedSecret: blob('sealed_secret', { mode: 'buffer' }).notNull(),
    confirmedAt: milliseconds('confirmed_at'),
    /** The step of the code that was taken last: neither it nor an earlier one is taken again. */
    lastCounter: integer('last_counter').notNull(),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [index('second_factors_person').on(table.personId)],
)

/** For the day the phone is gone. Each works once; only a keyed hash is kept. */
export const recoveryCodes = sqliteTable(
  'recovery_codes',
  {
    hash: text('hash').primaryKey(),
    personId: text('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    usedAt: milliseconds('used_at'),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [index('recovery_codes_person').on(table.personId)],
)

/** How often something was tried for an account or from an address of origin. A restart forgets nothing. */
export const attempts = sqliteTable(
  'attempts',
  {
    /** What is counted, and a keyed hash of whom for. */
    key: text('key').primaryKey(),
    count: integer('count').notNull(),
    /** When the count starts from nothing again. */
    endsAt: milliseconds('ends_at').notNull(),
  },
  (table) => [index('attempts_ends').on(table.endsAt)],
)
