import { blob, index, integer, primaryKey, real, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import type { ForecastId, LocalDay, PlaceId } from '../../../shared/types/ids'
import { places } from './farms'

/**
 * Every forecast that ever came, kept for scoring. `data` is the deflated block of `variables` × `runs` ×
 * `hours` values that server/db/forecast-block.ts packs and unpacks.
 */
export const forecasts = sqliteTable('forecasts', {
  id: text().$type<ForecastId>().primaryKey(),
  placeId: text().$type<PlaceId>().notNull().references(() => places.id),
  kind: text({ enum: ['forecast', 'runs'] }).notNull(),
  source: text().notNull(),
  model: text().notNull(),
  /** null when the service doesn't say */
  issuedAt: integer({ mode: 'timestamp_ms' }),
  fetchedAt: integer({ mode: 'timestamp_ms' }).notNull(),
  startsAt: integer({ mode: 'timestamp_ms' }).notNull(),
  hours: integer().notNull(),
  runs: integer().notNull(),
  variables: text({ mode: 'json' }).$type<string[]>().notNull(),
  data: blob({ mode: 'buffer' }).notNull(),
}, t => [index('forecasts_newest').on(t.placeId, t.kind, t.fetchedAt)])

/** Hours that are over, as the service analysed them. One row an hour; a later analysis replaces an earlier one. */
export const hourlyWeather = sqliteTable('hourly_weather', {
  placeId: text().$type<PlaceId>().notNull().references(() => places.id),
  startsAt: integer({ mode: 'timestamp_ms' }).notNull(),
  source: text({ enum: ['analysis'] }).notNull(),
  issuedAt: integer({ mode: 'timestamp_ms' }),
  fetchedAt: integer({ mode: 'timestamp_ms' }).notNull(),
  rainMm: real().notNull(),
  temperatureC: real().notNull(),
  humidityPct: real().notNull(),
  windMs: real().notNull(),
  windDirectionDeg: real(),
  gustMs: real(),
  radiationWm2: real().notNull(),
}, t => [primaryKey({ columns: [t.placeId, t.startsAt, t.source] })])

/** The daily record, for the local day of one zone. A gauge beats an analysis, an analysis beats a forecast. */
export const dailyWeather = sqliteTable('daily_weather', {
  placeId: text().$type<PlaceId>().notNull().references(() => places.id),
  zone: text().notNull(),
  localDay: text().$type<LocalDay>().notNull(),
  source: text({ enum: ['gauge', 'analysis', 'forecast'] }).notNull(),
  rainMm: real().notNull(),
  minC: real().notNull(),
  maxC: real().notNull(),
  /** hours summed, 23 to 25 for a whole day; fewer while the day is still running */
  hours: integer().notNull(),
  issuedAt: integer({ mode: 'timestamp_ms' }),
  fetchedAt: integer({ mode: 'timestamp_ms' }).notNull(),
}, t => [primaryKey({ columns: [t.placeId, t.zone, t.localDay, t.source] })])

/** Every try to pull, whatever came of it. */
export const weatherPulls = sqliteTable('weather_pulls', {
  id: integer().primaryKey({ autoIncrement: true }),
  startedAt: integer({ mode: 'timestamp_ms' }).notNull(),
  endedAt: integer({ mode: 'timestamp_ms' }),
  places: integer().notNull(),
  stored: integer().notNull().default(0),
  outcome: text({ enum: ['running', 'done', 'failed', 'abandoned'] }).notNull(),
  detail: text(),
}, t => [index('weather_pulls_newest').on(t.startedAt)])
