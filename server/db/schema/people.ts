import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import type { PersonId } from '../../../shared/types/ids'

export const people = sqliteTable('people', {
  id: text().$type<PersonId>().primaryKey(),
  /** lower case, trimmed */
  email: text().notNull().unique(),
  name: text().notNull(),
  passwordHash: text().notNull(),
  /** seeded by the demo: production refuses to start with such a person in it */
  demo: integer({ mode: 'boolean' }).notNull().default(false),
  disabledAt: integer({ mode: 'timestamp_ms' }),
  createdAt: integer({ mode: 'timestamp_ms' }).notNull(),
})

/** The row behind the sealed cookie. Only the SHA-256 of the id is stored. */
export const sessions = sqliteTable('sessions', {
  idHash: text().primaryKey(),
  personId: text().$type<PersonId>().notNull().references(() => people.id),
  /** where the sign-in came from */
  address: text().notNull(),
  createdAt: integer({ mode: 'timestamp_ms' }).notNull(),
  lastSeenAt: integer({ mode: 'timestamp_ms' }).notNull(),
  expiresAt: integer({ mode: 'timestamp_ms' }).notNull(),
  endedAt: integer({ mode: 'timestamp_ms' }),
}, t => [index('sessions_by_person').on(t.personId)])

/** Failed sign-ins, kept so that the limits survive a restart. */
export const signInTries = sqliteTable('sign_in_tries', {
  id: integer().primaryKey({ autoIncrement: true }),
  /** SHA-256 of the e-mail, so that a mistyped password in the e-mail box isn't kept */
  accountHash: text().notNull(),
  address: text().notNull(),
  at: integer({ mode: 'timestamp_ms' }).notNull(),
}, t => [index('sign_in_tries_by_account').on(t.accountHash, t.at), index('sign_in_tries_by_address').on(t.address, t.at)])
