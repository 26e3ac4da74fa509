import { statfsSync } from 'node:fs'
import { findForecastAge } from '../db/queries/forecasts'
import { listPlacesInUse } from '../db/queries/places'
import type { App } from './app'

/** Room under which the next forecasts may not fit. */
const LEAST_FREE_BYTES = 32 * 1024 ** 2

/**
 * What keeps the server from its work, for the log; null: nothing does.
 *
 * It is ready when every place in use has had a forecast, the database takes a write, and the disk has room.
 */
export function whyNotReady({ db, clock, settings }: App): string | null {
  const now = clock.now()
  if (!listPlacesInUse(db).every(place => findForecastAge(db, place.id, 'forecast', now) && findForecastAge(db, place.id, 'runs', now))) return 'a place has had no forecast'
  const { bavail, bsize } = statfsSync(settings.dataDir)
  if (bavail * bsize < LEAST_FREE_BYTES) return 'the disk is nearly full'
  try {
    // The lock for writing is all that is taken; nothing is written.
    db.transaction(() => undefined, { behavior: 'immediate' })
  }
  catch (error) {
    return `the database can't be written: ${String(error)}`
  }
  return null
}
