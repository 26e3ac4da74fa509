import type { HourlyWeather } from '../weather/hourly'
import { WET_HOUR_MM } from './rain-line'

/** Days of the past over which an ordinary dry day is averaged. A design choice: long enough to smooth, short enough for the season. */
export const LOOK_BACK_DAYS = 14

/** Weather of an ordinary dry day, one value for each hour of the day at the farm. */
export interface DryDay {
  temperatureC: Float64Array
  humidityPct: Float64Array
  windMs: Float64Array
  radiationWm2: Float64Array
}

/**
 * The ordinary dry day of the last fortnight: for each hour of the day, the mean of the hours without rain.
 *
 * Ground that is still wet where the runs end goes on drying by it, so that 'fit again' has a date. More rain would
 * make that date later: it is the earliest that the place's own weather makes likely, not a forecast.
 *
 * @param past - hours that are over, every value known, at least a day of them
 * @param localHour - hour of the day at the farm, 0 to 23, of each hour of the past
 * @throws {RangeError} when an hour of the day doesn't occur
 */
export function ordinaryDryDay(past: HourlyWeather, localHour: Uint8Array): DryDay {
  const from = Math.max(0, past.hours - LOOK_BACK_DAYS * 24)
  const means = (column: Float64Array) => Float64Array.from({ length: 24 }, (_, hour) => meanOfHour(past, column, localHour, hour, from))
  return { temperatureC: means(past.temperatureC), humidityPct: means(past.humidityPct), windMs: means(past.windMs), radiationWm2: means(past.radiationWm2) }
}

/** Mean over the dry hours, or over all of them where it rained each day at that hour. */
function meanOfHour(past: HourlyWeather, column: Float64Array, localHour: Uint8Array, hour: number, from: number): number {
  let sum = 0
  let count = 0
  let sumOfAll = 0
  let all = 0
  for (let i = from; i < past.hours; i++) {
    if (localHour[i] !== hour) continue
    sumOfAll += column[i]!
    all++
    if (past.rainMm[i]! >= WET_HOUR_MM) continue
    sum += column[i]!
    count++
  }
  if (all === 0) throw new RangeError(`No hour of the past is ${hour} o’clock at the farm`)
  return count > 0 ? sum / count : sumOfAll / all
}

/**
 * A spell of ordinary dry days.
 *
 * @param startsAt - Unix seconds, a whole hour
 * @param localHour - hour of the day at the farm, 0 to 23, of each hour of the spell; as long as the spell
 */
export function drySpell(day: DryDay, startsAt: number, localHour: Uint8Array): HourlyWeather {
  const column = (values: Float64Array) => Float64Array.from(localHour, hour => values[hour]!)
  return {
    startsAt,
    hours: localHour.length,
    rainMm: new Float64Array(localHour.length),
    temperatureC: column(day.temperatureC),
    humidityPct: column(day.humidityPct),
    windMs: column(day.windMs),
    radiationWm2: column(day.radiationWm2),
  }
}
