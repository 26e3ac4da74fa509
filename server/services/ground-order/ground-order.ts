import type { FarmId } from '../../../shared/types/ids'
import type { GroundOrder } from '../../../shared/types/ground-order'
import type { Db } from '../../db/client'
import { listCrops } from '../../db/queries/crops'
import type { Farm } from '../../db/queries/farms'
import { listFields } from '../../db/queries/fields'
import { findForecastAge } from '../../db/queries/forecasts'
import { listMachines } from '../../db/queries/machines'
import { listPassTotals } from '../../db/queries/pass-records'
import { listPlacesOfFarm, type PlaceRow } from '../../db/queries/places'
import { listSoils } from '../../db/queries/soils'
import { forecastSummary } from '../weather/forecast-summary'
import { weatherFor } from '../weather/weather-for'
import { HORIZON_HOURS } from './farm-places'
import { PAST_HOURS } from './place-work'
import { workOutOrder } from './work-out-order'

const HOUR_MS = 3_600_000
/** Farms whose last order is kept in memory. */
const MOST_KEPT = 50
const kept = new Map<FarmId, { key: string, order: GroundOrder }>()

/**
 * A farm's Ground order as of now.
 *
 * Worked out again when the farm's data, a forecast or the hour has changed, and kept in between.
 */
export function groundOrder(db: Db, farm: Farm, now: Date): GroundOrder {
  const places = listPlacesOfFarm(db, farm.id)
  const forecast = forecastSummary(db, places.map(place => place.id), farm.invented, now)
  const key = JSON.stringify([farm.revision, Math.floor(now.getTime() / HOUR_MS), forecast.status, forecast.trouble, newestOf(db, places, now)])
  const known = kept.get(farm.id)
  if (known?.key === key) return { ...known.order, now: now.toISOString(), forecast }
  const order = workOutOrder({
    farm,
    now,
    fields: listFields(db, farm.id),
    soils: listSoils(db, farm.id),
    crops: listCrops(db, farm.id),
    machines: listMachines(db, farm.id),
    passTotals: listPassTotals(db, farm.id, seasonStart(now)),
    weather: new Map(places.map(place => [place.id, weatherFor(db, place, now, { pastHours: PAST_HOURS, aheadHours: HORIZON_HOURS })])),
    forecast,
  })
  if (kept.size >= MOST_KEPT) kept.delete(kept.keys().next().value!)
  kept.set(farm.id, { key, order })
  return order
}

function newestOf(db: Db, places: PlaceRow[], now: Date): (string | null)[] {
  return places.flatMap(place => (['forecast', 'runs'] as const).map(kind => findForecastAge(db, place.id, kind, now)?.id ?? null))
}

/** Work of the season counts from the start of its year. */
function seasonStart(now: Date): Date {
  return new Date(Date.UTC(now.getUTCFullYear(), 0, 1))
}
