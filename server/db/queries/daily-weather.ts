import { and, asc, eq, gte } from 'drizzle-orm'
import type { LocalDay, PlaceId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { dailyWeather } from '../schema'

export type DayRow = typeof dailyWeather.$inferSelect

export function upsertDay(db: DbOrTransaction, day: typeof dailyWeather.$inferInsert): void {
  const { rainMm, minC, maxC, hours, issuedAt, fetchedAt } = day
  db.insert(dailyWeather).values(day).onConflictDoUpdate({
    target: [dailyWeather.placeId, dailyWeather.zone, dailyWeather.localDay, dailyWeather.source],
    set: { rainMm, minC, maxC, hours, issuedAt, fetchedAt },
  }).run()
}

export function listDays(db: DbOrTransaction, placeId: PlaceId, zone: string, from: LocalDay): DayRow[] {
  return db.select().from(dailyWeather)
    .where(and(eq(dailyWeather.placeId, placeId), eq(dailyWeather.zone, zone), gte(dailyWeather.localDay, from)))
    .orderBy(asc(dailyWeather.localDay)).all()
}
