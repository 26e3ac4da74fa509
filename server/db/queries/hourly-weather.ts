import { and, asc, eq, gte, lt, max, sql } from 'drizzle-orm'
import type { PlaceId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { hourlyWeather } from '../schema'

export type HourRow = typeof hourlyWeather.$inferSelect

/** Writes hours that are over; a later analysis of an hour replaces an earlier one. */
export function upsertHours(db: DbOrTransaction, hours: (typeof hourlyWeather.$inferInsert)[]): void {
  const excluded = (column: string) => sql.join([sql.identifier('excluded'), sql.identifier(column)], sql`.`)
  for (let from = 0; from < hours.length; from += 500) {
    db.insert(hourlyWeather).values(hours.slice(from, from + 500)).onConflictDoUpdate({
      target: [hourlyWeather.placeId, hourlyWeather.startsAt, hourlyWeather.source],
      set: {
        issuedAt: excluded('issued_at'), fetchedAt: excluded('fetched_at'), rainMm: excluded('rain_mm'), temperatureC: excluded('temperature_c'), humidityPct: excluded('humidity_pct'),
        windMs: excluded('wind_ms'), windDirectionDeg: excluded('wind_direction_deg'), gustMs: excluded('gust_ms'), radiationWm2: excluded('radiation_wm2'),
      },
    }).run()
  }
}

export function listHours(db: DbOrTransaction, placeId: PlaceId, from: Date, to: Date): HourRow[] {
  return db.select().from(hourlyWeather)
    .where(and(eq(hourlyWeather.placeId, placeId), gte(hourlyWeather.startsAt, from), lt(hourlyWeather.startsAt, to)))
    .orderBy(asc(hourlyWeather.startsAt)).all()
}

export function findNewestHour(db: DbOrTransaction, placeId: PlaceId): Date | null {
  return db.select({ at: max(hourlyWeather.startsAt) }).from(hourlyWeather).where(eq(hourlyWeather.placeId, placeId)).get()?.at ?? null
}
