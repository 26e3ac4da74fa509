import type { HourlyWeather } from '../../../shared/agronomy/weather/hourly'
import type { ForecastId, PlaceId } from '../../../shared/types/ids'
import type { Db } from '../../db/client'
import { unpackBlock } from '../../db/forecast-block'
import { findNewestForecast, type ForecastRow } from '../../db/queries/forecasts'
import { listHours } from '../../db/queries/hourly-weather'
import { FORECAST_VARIABLES, RUN_VARIABLES, type WeatherVariable } from '../../gateways/weather/weather-gateway'
import { freshness } from './freshness'

const HOUR_MS = 3_600_000

export interface PlaceWeather {
  /** analysed hours up to the current one; the last of them may still be the forecast's own */
  past: HourlyWeather
  /** the single best forecast, from the current hour on */
  forecast: HourlyWeather & { gustMs: Float64Array, windDirectionDeg: Float64Array }
  /** one element a run, from the current hour on */
  runs: HourlyWeather[]
  issuedAt: Date | null
  fetchedAt: Date
  source: string
  model: string
  elevationM: number | null
}

/**
 * A place's weather around an instant, cut to whole hours.
 *
 * @returns a plain sentence instead when there is none that may be used
 */
export function weatherFor(db: Db, place: { id: PlaceId, elevationM: number | null }, at: Date, options: { pastHours: number, aheadHours: number }): PlaceWeather | { missing: string } {
  const hour = Math.floor(at.getTime() / HOUR_MS) * HOUR_MS
  const forecastRow = findNewestForecast(db, place.id, 'forecast', at)
  const runsRow = findNewestForecast(db, place.id, 'runs', at)
  if (!forecastRow || !runsRow) return { missing: 'No forecast has come for it yet' }
  if (freshness(forecastRow, runsRow, at) === 'expired') return { missing: 'Its forecast is too old to work anything out from' }
  const whole = columnsOf(forecastRow, FORECAST_VARIABLES)[0]!
  const past = pastOf(db, place.id, hour, options.pastHours, forecastRow, whole)
  if (!past) return { missing: 'Its past weather has a gap' }
  return {
    past,
    forecast: ahead(forecastRow, whole, hour, options.aheadHours),
    runs: columnsOf(runsRow, RUN_VARIABLES).map(run => ahead(runsRow, run, hour, options.aheadHours)),
    issuedAt: runsRow.issuedAt,
    fetchedAt: forecastRow.fetchedAt,
    source: forecastRow.source,
    model: runsRow.model,
    elevationM: place.elevationM,
  }
}

/** Forecasts kept unpacked, the newest used last: the runs of one are some 300 kB. */
const MOST_UNPACKED = 64
const unpacked = new Map<ForecastId, Record<WeatherVariable, Float64Array>[]>()

/** A stored forecast's values, an element a run; a forecast never changes. Nobody writes to them. */
function columnsOf<Variable extends WeatherVariable>(row: ForecastRow, variables: readonly Variable[]): Record<Variable, Float64Array>[] {
  const known = unpacked.get(row.id)
  const columns = known ?? unpackBlock(row.data, variables, row.runs, row.hours) as Record<WeatherVariable, Float64Array>[]
  unpacked.delete(row.id)
  unpacked.set(row.id, columns)
  if (unpacked.size > MOST_UNPACKED) unpacked.delete(unpacked.keys().next().value!)
  return columns
}

/** Hours of a stored forecast from the current one on. */
function ahead<Column extends WeatherVariable>(row: ForecastRow, columns: Record<Column, Float64Array>, hour: number, most: number): HourlyWeather & Record<Column, Float64Array> {
  const skipped = Math.max(0, (hour - row.startsAt.getTime()) / HOUR_MS)
  const hours = Math.max(0, Math.min(most, row.hours - skipped))
  const cut = Object.fromEntries(Object.entries<Float64Array>(columns).map(([name, column]) => [name, column.subarray(skipped, skipped + hours)]))
  return { startsAt: row.startsAt.getTime() / 1000 + skipped * 3600, hours, ...cut } as HourlyWeather & Record<Column, Float64Array>
}

/** Analysed hours in a row; those since the last pull, which are not analysed yet, are taken from the forecast. */
function pastOf(db: Db, placeId: PlaceId, hour: number, hours: number, row: ForecastRow, columns: Record<WeatherVariable, Float64Array>): HourlyWeather | null {
  const stored = listHours(db, placeId, new Date(hour - hours * HOUR_MS), new Date(hour))
  if (stored.length === 0) return null
  const startsAt = stored[0]!.startsAt.getTime()
  const count = (hour - startsAt) / HOUR_MS
  const past: HourlyWeather = { startsAt: startsAt / 1000, hours: count, rainMm: new Float64Array(count), temperatureC: new Float64Array(count), humidityPct: new Float64Array(count), windMs: new Float64Array(count), radiationWm2: new Float64Array(count) }
  for (let i = 0; i < count; i++) {
    const at = startsAt + i * HOUR_MS
    const known = stored[i]
    const ahead = (at - row.startsAt.getTime()) / HOUR_MS
    if (known && known.startsAt.getTime() !== at) return null
    if (!known && !(ahead >= 0 && ahead < row.hours)) return null
    for (const name of RUN_VARIABLES) past[name][i] = known ? known[name] : columns[name][ahead]!
  }
  return past
}
