import { sql } from 'drizzle-orm'
import { check, index, integer, primaryKey, real, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { people } from './people'
import type { FarmId, PersonId, PlaceId } from '../../../shared/types/ids'

/** `revision` grows with every change to the farm's own data, so that caches and open pages know. */
export const farms = sqliteTable('farms', {
  id: text().$type<FarmId>().primaryKey(),
  slug: text().notNull().unique(),
  name: text().notNull(),
  zone: text().notNull(),
  units: text({ enum: ['us', 'metric'] }).notNull(),
  latitude: real().notNull(),
  longitude: real().notNull(),
  invented: integer({ mode: 'boolean' }).notNull().default(false),
  revision: integer().notNull().default(0),
  createdAt: integer({ mode: 'timestamp_ms' }).notNull(),
})

/** Places are shared: a grid cell of about 5 km, pulled once whoever uses it. */
export const places = sqliteTable('places', {
  id: text().$type<PlaceId>().primaryKey(),
  latitude: real().notNull(),
  longitude: real().notNull(),
  elevationM: real(),
  createdAt: integer({ mode: 'timestamp_ms' }).notNull(),
})

export const memberships = sqliteTable('memberships', {
  farmId: text().$type<FarmId>().notNull().references(() => farms.id),
  personId: text().$type<PersonId>().notNull().references(() => people.id),
  role: text({ enum: ['owner', 'agronomist', 'operator', 'crew'] }).notNull(),
  createdAt: integer({ mode: 'timestamp_ms' }).notNull(),
}, t => [
  primaryKey({ columns: [t.farmId, t.personId] }),
  index('memberships_by_person').on(t.personId),
  check('memberships_role', sql`${t.role} in ('owner', 'agronomist', 'operator', 'crew')`),
])
