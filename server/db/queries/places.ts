import { eq } from 'drizzle-orm'
import type { FarmId, PlaceId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { farms, fields, places } from '../schema'

export type PlaceRow = typeof places.$inferSelect

/** Every place that a field of some farm lies in, once. */
export function listPlacesInUse(db: DbOrTransaction): PlaceRow[] {
  const { id, latitude, longitude, elevationM, createdAt } = places
  return db.selectDistinct({ id, latitude, longitude, elevationM, createdAt }).from(places).innerJoin(fields, eq(fields.placeId, places.id)).orderBy(places.id).all()
}

/** The zones in which a place's days are counted, one for each farm that uses it. */
export function listZonesOfPlace(db: DbOrTransaction, placeId: PlaceId): string[] {
  return db.selectDistinct({ zone: farms.zone }).from(fields).innerJoin(farms, eq(farms.id, fields.farmId)).where(eq(fields.placeId, placeId)).all().map(row => row.zone)
}

export function updateElevation(db: DbOrTransaction, placeId: PlaceId, elevationM: number): void {
  db.update(places).set({ elevationM }).where(eq(places.id, placeId)).run()
}

/** The places that a farm's fields lie in. */
export function listPlacesOfFarm(db: DbOrTransaction, farmId: FarmId): PlaceRow[] {
  const { id, latitude, longitude, elevationM, createdAt } = places
  return db.selectDistinct({ id, latitude, longitude, elevationM, createdAt }).from(places)
    .innerJoin(fields, eq(fields.placeId, places.id)).where(eq(fields.farmId, farmId)).orderBy(places.id).all()
}
