import { greatCircleKm } from '../../../shared/agronomy/machine/road'
import type { PlaceId } from '../../../shared/types/ids'
import type { FarmInputs, UsableWeather } from './farm-inputs'
import { placeWork, type PlaceWork } from './place-work'

/** Hours that an order looks ahead. */
export const HORIZON_HOURS = 120
/** Days of past weather without which the soil model has forgotten too little of its start. A design choice. */
const LEAST_PAST_DAYS = 21
/** Hours of runs without which there is nothing to plan by. */
const LEAST_AHEAD_HOURS = 24

/** The weather of all of a farm's places, cut to what they have in common. */
export interface FarmPlaces {
  hours: number
  runs: number
  works: ReadonlyMap<PlaceId, PlaceWork | { missing: string }>
  /** the place whose runs the rain line and the ribbon are drawn from: nearest to the farm's own point */
  reference: PlaceWork | null
}

/** Makes ready each place whose weather can be used; the others keep their sentence. */
export function farmPlaces(inputs: FarmInputs, startsAt: number): FarmPlaces {
  const checked = new Map([...inputs.weather].map(([id, weather]) => [id, 'missing' in weather ? weather : checkedWeather(weather, startsAt)] as const))
  const usable = [...checked.values()].flatMap(weather => 'missing' in weather ? [] : [weather])
  const hours = Math.min(HORIZON_HOURS, ...usable.flatMap(weather => weather.runs.map(run => run.hours)), ...usable.map(weather => weather.forecast.hours))
  const runs = Math.min(...usable.map(weather => weather.runs.length))
  const works = new Map<PlaceId, PlaceWork | { missing: string }>()
  for (const [id, weather] of checked) works.set(id, 'missing' in weather ? weather : workOf(id, weather, inputs, runs, hours))
  return { hours, runs: Number.isFinite(runs) ? runs : 0, works, reference: nearest(inputs, works) }
}

function checkedWeather(weather: UsableWeather, startsAt: number): UsableWeather | { missing: string } {
  if (weather.past.hours < LEAST_PAST_DAYS * 24) return { missing: `Only ${Math.floor(weather.past.hours / 24)} days of past weather are known, too few to work out its ground` }
  if (weather.runs.length === 0) return { missing: 'The forecast has come without its runs' }
  if ([weather.forecast, ...weather.runs].some(hourly => hourly.startsAt !== startsAt || hourly.hours < LEAST_AHEAD_HOURS)) return { missing: 'The forecast doesn’t reach a day ahead' }
  return weather
}

/** A gap in the weather is a sentence, not a failure: other places may be whole. */
function workOf(id: PlaceId, weather: UsableWeather, inputs: FarmInputs, runs: number, hours: number): PlaceWork | { missing: string } {
  const point = inputs.places.find(place => place.id === id) ?? inputs.farm
  try {
    return placeWork(weather, point, inputs.farm.zone, runs, hours)
  }
  catch (error) {
    if (error instanceof RangeError) return { missing: 'Its weather has a gap, so its ground can’t be worked out' }
    throw error
  }
}

function nearest({ farm, places }: FarmInputs, works: FarmPlaces['works']): PlaceWork | null {
  let best: PlaceWork | null = null
  let least = Infinity
  for (const [id, work] of works) {
    const place = places.find(row => row.id === id)
    if ('missing' in work || !place) continue
    const km = greatCircleKm(farm, place)
    if (km < least) [best, least] = [work, km]
  }
  return best
}
