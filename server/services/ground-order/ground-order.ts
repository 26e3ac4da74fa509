import { greatCircleKm } from '../../../shared/agronomy/machine/road'
import type { FarmId } from '../../../shared/types/ids'
import type { GroundOrder } from '../../../shared/types/ground-order'
import type { Db } from '../../db/client'
import { listCrops } from '../../db/queries/crops'
import type { Farm } from '../../db/queries/farms'
import { listFields } from '../../db/queries/fields'
import { listMachines } from '../../db/queries/machines'
import { listPassTotals } from '../../db/queries/pass-records'
import { listPlacesOfFarm, type PlaceRow } from '../../db/queries/places'
import { listSoils } from '../../db/queries/soils'
import { findNewestPull } from '../../db/queries/weather-pulls'
import { seasonOf } from '../season'
import { farmForecast } from '../weather/forecast-summary'
import { weatherFor } from '../weather/weather-for'
import type { FarmInputs } from './farm-inputs'
import { fieldSeason, isPlanted, type FieldSeason } from './field-season'
import { PAST_HOURS } from './place-work'
import { workOutOrder } from './work-out-order'

const HOUR_MS = 3_600_000
/** Hours of forecast that are asked for: the order looks 120 h ahead, and whether ground is fit again is looked for behind that. */
const AHEAD_HOURS = 7 * 24
/** Farms of a database whose last order is kept in memory. */
const MOST_KEPT = 50

/** An order, and until when its forecast is as fresh as it says. */
interface Kept { key: string, until: Date | null, order: GroundOrder }
const keptOf = new WeakMap<Db, Map<FarmId, Kept>>()

/**
 * A farm's Ground order as of now.
 *
 * Worked out again when the farm's data, the newest pull, the forecast's freshness or the hour has changed, and kept in
 * between. Forecasts come with pulls only, so one look at the newest pull tells whether there are newer ones.
 */
export function groundOrder(db: Db, farm: Farm, now: Date): GroundOrder {
  const kept = keptFarms(db)
  const known = kept.get(farm.id)
  const pull = findNewestPull(db)
  const key = JSON.stringify([farm.revision, Math.floor(now.getTime() / HOUR_MS), pull?.id, pull?.outcome])
  if (known && known.key === key && (known.until === null || now <= known.until)) return { ...known.order, now: now.toISOString() }
  const places = listPlacesOfFarm(db, farm.id)
  const { summary, until } = farmForecast(db, places.map(place => place.id), farm.invented, now)
  const order = workOutOrder({ ...loadInputs(db, farm, places, now), forecast: summary })
  kept.delete(farm.id)
  if (kept.size >= MOST_KEPT) kept.delete(kept.keys().next().value!)
  kept.set(farm.id, { key, until, order })
  return order
}

function keptFarms(db: Db): Map<FarmId, Kept> {
  const kept = keptOf.get(db) ?? new Map<FarmId, Kept>()
  keptOf.set(db, kept)
  return kept
}

function loadInputs(db: Db, farm: Farm, places: PlaceRow[], now: Date): Omit<FarmInputs, 'forecast'> {
  const fields = listFields(db, farm.id)
  const passTotals = listPassTotals(db, farm.id, seasonOf(now, farm.zone))
  const wanted = placesWanted(places, farm, fields.map(field => fieldSeason(field, passTotals)))
  return {
    farm,
    now,
    fields,
    soils: listSoils(db, farm.id),
    crops: listCrops(db, farm.id),
    machines: listMachines(db, farm.id),
    passTotals,
    places,
    weather: new Map(wanted.map(place => [place.id, weatherFor(db, place, now, { pastHours: PAST_HOURS, aheadHours: AHEAD_HOURS })])),
  }
}

/** The places of fields that are still to be planted, and the one nearest to the farm, which the ribbon is drawn from. */
function placesWanted(places: readonly PlaceRow[], farm: Farm, seasons: readonly FieldSeason[]): PlaceRow[] {
  const open = new Set(seasons.filter(season => !isPlanted(season)).map(({ field }) => field.placeId))
  const nearest = places.toSorted((a, b) => greatCircleKm(farm, a) - greatCircleKm(farm, b))[0]
  return places.filter(place => open.has(place.id) || place.id === nearest?.id)
}
