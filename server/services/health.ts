import type { Db } from '../db/client'
import { findForecastAge } from '../db/queries/forecasts'
import { listPlacesInUse } from '../db/queries/places'

/** Every place in use has had a forecast. */
export function isReady(db: Db, now: Date): boolean {
  return listPlacesInUse(db).every(place => findForecastAge(db, place.id, 'forecast', now) && findForecastAge(db, place.id, 'runs', now))
}
