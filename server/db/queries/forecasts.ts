import { and, count, desc, eq, lte } from 'drizzle-orm'
import type { PlaceId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { forecasts } from '../schema'

export type ForecastRow = typeof forecasts.$inferSelect

export function insertForecast(db: DbOrTransaction, forecast: typeof forecasts.$inferInsert): void {
  db.insert(forecasts).values(forecast).run()
}

/** The newest that had come by then. */
export function findNewestForecast(db: DbOrTransaction, placeId: PlaceId, kind: 'forecast' | 'runs', at: Date): ForecastRow | undefined {
  return db.select().from(forecasts)
    .where(and(eq(forecasts.placeId, placeId), eq(forecasts.kind, kind), lte(forecasts.fetchedAt, at)))
    .orderBy(desc(forecasts.fetchedAt)).limit(1).get()
}

/** The same without its data: what it is and how old. */
export function findForecastAge(db: DbOrTransaction, placeId: PlaceId, kind: 'forecast' | 'runs', at: Date) {
  const { id, issuedAt, fetchedAt, source, runs } = forecasts
  return db.select({ id, issuedAt, fetchedAt, source, runs }).from(forecasts)
    .where(and(eq(forecasts.placeId, placeId), eq(forecasts.kind, kind), lte(fetchedAt, at)))
    .orderBy(desc(fetchedAt)).limit(1).get()
}

export function countForecasts(db: DbOrTransaction): number {
  return db.select({ n: count() }).from(forecasts).get()!.n
}
