import { sql } from 'drizzle-orm'
import { check, index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import type { FarmId, PersonId } from '../../../shared/types/ids'

/** Who changed what, when, from what to what. Triggers in the migrations refuse UPDATE and DELETE. */
export const auditLog = sqliteTable('audit_log', {
  id: integer().primaryKey({ autoIncrement: true }),
  farmId: text().$type<FarmId>(),
  personId: text().$type<PersonId>(),
  at: integer({ mode: 'timestamp_ms' }).notNull(),
  action: text().notNull(),
  subject: text().notNull(),
  subjectId: text().notNull(),
  before: text({ mode: 'json' }).$type<unknown>(),
  after: text({ mode: 'json' }).$type<unknown>(),
}, t => [index('audit_log_by_farm').on(t.farmId, t.at)])

/** The answer that a create gave, so that a repeat of it gives the same answer and no second effect. */
export const idempotencyKeys = sqliteTable('idempotency_keys', {
  farmId: text().$type<FarmId>().notNull(),
  personId: text().$type<PersonId>().notNull(),
  key: text().notNull(),
  method: text().notNull(),
  path: text().notNull(),
  bodyHash: text().notNull(),
  status: integer().notNull(),
  body: text().notNull(),
  createdAt: integer({ mode: 'timestamp_ms' }).notNull(),
}, t => [primaryKey({ columns: [t.farmId, t.personId, t.key] }), index('idempotency_keys_by_age').on(t.createdAt)])

/** One row a job: who runs it until when, and when it last went well. */
export const jobs = sqliteTable('jobs', {
  name: text().primaryKey(),
  lockedBy: text(),
  lockedUntil: integer({ mode: 'timestamp_ms' }),
  lastSuccessAt: integer({ mode: 'timestamp_ms' }),
  lastFailure: text(),
  retryAt: integer({ mode: 'timestamp_ms' }),
})

/** The demo's clock: one row, the latest demo time that was reached. Absent outside the demo. */
export const demoClock = sqliteTable('demo_clock', {
  id: integer().primaryKey(),
  reachedAt: integer({ mode: 'timestamp_ms' }).notNull(),
}, t => [check('demo_clock_one', sql`${t.id} = 1`)])
