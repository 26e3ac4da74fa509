import { and, asc, eq, getTableColumns, gte, lt, max, sql } from 'drizzle-orm'
import type { PlaceId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { hourlyWeather } from '../schema'

/** Writes hours that are over; a later analysis of an hour replaces an earlier one. One prepared statement: a first pull brings thousands. */
export function upsertHours(db: DbOrTransaction, hours: (typeof hourlyWeather.$inferInsert)[]): void {
  const { placeId, startsAt, source, ...rest } = getTableColumns(hourlyWeather)
  const excluded = (name: string) => sql`excluded.${sql.identifier(name.replaceAll(/[A-Z]/g, letter => `_${letter.toLowerCase()}`))}`
  const given = Object.fromEntries(Object.keys({ placeId, startsAt, source, ...rest }).map(name => [name, sql.placeholder(name)]))
  const upsert = db.insert(hourlyWeather)
    .values(given as unknown as typeof hourlyWeather.$inferInsert)
    .onConflictDoUpdate({ target: [placeId, startsAt, source], set: Object.fromEntries(Object.keys(rest).map(name => [name, excluded(name)])) })
    .prepare()
  for (const hour of hours) upsert.run(hour)
}

/** What the soil model needs of the hours that are over. */
export function listHours(db: DbOrTransaction, placeId: PlaceId, from: Date, to: Date) {
  const { startsAt, rainMm, temperatureC, humidityPct, windMs, radiationWm2 } = hourlyWeather
  return db.select({ startsAt, rainMm, temperatureC, humidityPct, windMs, radiationWm2 }).from(hourlyWeather)
    .where(and(eq(hourlyWeather.placeId, placeId), gte(startsAt, from), lt(startsAt, to)))
    .orderBy(asc(startsAt)).all()
}

export function findNewestHour(db: DbOrTransaction, placeId: PlaceId): Date | null {
  return db.select({ at: max(hourlyWeather.startsAt) }).from(hourlyWeather).where(eq(hourlyWeather.placeId, placeId)).get()?.at ?? null
}
