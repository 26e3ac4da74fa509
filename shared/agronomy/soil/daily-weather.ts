import { estimatedRadiation, estimatedReferenceEt, type EstimatePlace } from '../weather/daily-estimate'
import { temperatureAtHour } from '../weather/diurnal-temperature'
import type { HourlyWeather } from '../weather/hourly'
import { saturationVapourPressure } from '../weather/humidity'
import { daylightHours, extraterrestrialHour } from '../weather/radiation'

const HOURS = 24
/** Hours over which a day's rain is spread; how it really fell is not known. */
export const RAIN_HOURS = 6
/** Hours of the day in which a day's evapotranspiration is spread by a half sine, from and to. */
const SUN_FROM = 6
const SUN_TO = 19

/** A record of whole local days without gaps; all arrays have one element a day. */
export interface DailyWeather {
  /** first day, days since 1970-01-01 */
  firstDay: number
  /** mm in the day */
  rainMm: Float64Array
  /** °C */
  minC: Float64Array
  /** °C */
  maxC: Float64Array
  /** mean at 10 m, m/s */
  windMs: Float64Array
}

/** A place of daily weather, and its clock. */
export interface DailyPlace extends EstimatePlace {
  /** hours that its standard time is ahead of UTC; Seattle −8 */
  utcOffsetHours: number
}

/** Hours as the soil model takes them. */
export interface SpreadWeather {
  weather: HourlyWeather
  etoMm: Float64Array
  localHour: Uint8Array
}

/**
 * Spreads a daily record over hours, where no hourly weather is to be had: temperature by Parton & Logan, with the sun
 * symmetric about noon of standard time; evapotranspiration by eq 6 with FAO-56's missing-data rules over 6 to 19 h by
 * a half sine; radiation with the sun; rain evenly over 6 hours at an hour that is given, since it is not known; wind
 * even; humidity as if the day's water vapour were that of air saturated at the minimum.
 *
 * @param daily - without gaps
 * @param rainFromHour - local hour at which each day's rain begins, 0 to 18
 * @returns days × 24 hours of standard time, the first at local midnight of the first day
 * @throws {RangeError} naming the day of a gap, of negative rain or wind, or of reversed extremes; when the hour is not
 *   one of 0 to 18
 */
export function spreadDays(daily: DailyWeather, place: DailyPlace, rainFromHour: number): SpreadWeather {
  if (!(Number.isInteger(rainFromHour) && rainFromHour >= 0 && rainFromHour <= HOURS - RAIN_HOURS)) throw new RangeError(`rain can't begin at hour ${rainFromHour}`)
  refuseUnusable(daily)
  const spread = emptyHours(daily, place)
  for (let day = 0; day < daily.rainMm.length; day++) spreadDay(daily, day, place, rainFromHour, spread)
  return spread
}

function refuseUnusable({ rainMm, minC, maxC, windMs }: DailyWeather): void {
  if (minC.length !== rainMm.length || maxC.length !== rainMm.length || windMs.length !== rainMm.length) throw new RangeError('the days of rain, temperature and wind differ')
  for (let day = 0; day < rainMm.length; day++) {
    if (!(rainMm[day]! >= 0 && rainMm[day]! < Infinity)) throw new RangeError(`rain of day ${day} is ${rainMm[day]}`)
    if (!(minC[day]! <= maxC[day]!)) throw new RangeError(`day ${day} runs from ${minC[day]} to ${maxC[day]} °C`)
    if (!(windMs[day]! >= 0 && windMs[day]! < Infinity)) throw new RangeError(`wind of day ${day} is ${windMs[day]}`)
  }
}

function emptyHours({ firstDay, rainMm }: DailyWeather, place: DailyPlace): SpreadWeather {
  const hours = rainMm.length * HOURS
  const each = () => new Float64Array(hours)
  return {
    weather: {
      startsAt: (firstDay * HOURS - place.utcOffsetHours) * 3600,
      hours, rainMm: each(), temperatureC: each(), humidityPct: each(), windMs: each(), radiationWm2: each(),
    },
    etoMm: each(),
    localHour: Uint8Array.from({ length: hours }, (_, hour) => hour % HOURS),
  }
}

function spreadDay(daily: DailyWeather, day: number, place: DailyPlace, rainFromHour: number, { weather, etoMm }: SpreadWeather): void {
  const minC = daily.minC[day]!
  const maxC = daily.maxC[day]!
  const dayOfYear = dayOfYearOf(daily.firstDay + day)
  const daylight = daylightHours(place.latitudeDeg, dayOfYear)
  const sun = { minC, maxC, nextMinC: daily.minC[day + 1] ?? minC, sunrise: 12 - daylight / 2, sunset: 12 + daylight / 2 }
  const eto = estimatedReferenceEt(minC, maxC, daily.windMs[day]!, place, dayOfYear)
  const radiation = radiationShares(place.latitudeDeg, dayOfYear)
  const radiationMj = estimatedRadiation(minC, maxC, place, dayOfYear)
  for (let hour = 0; hour < HOURS; hour++) {
    const index = day * HOURS + hour
    const temperatureC = temperatureAtHour(hour + 0.5, sun)
    weather.temperatureC[index] = temperatureC
    weather.humidityPct[index] = Math.min(100, 100 * saturationVapourPressure(minC) / saturationVapourPressure(temperatureC))
    weather.windMs[index] = daily.windMs[day]!
    weather.radiationWm2[index] = radiationMj * radiation[hour]! * 1e6 / 3600
    weather.rainMm[index] = hour >= rainFromHour && hour < rainFromHour + RAIN_HOURS ? daily.rainMm[day]! / RAIN_HOURS : 0
    etoMm[index] = eto * halfSineShare(hour)
  }
}

/** Share of a day's radiation in each of its hours, as the sun stands. */
function radiationShares(latitudeDeg: number, dayOfYear: number): Float64Array {
  const shares = Float64Array.from({ length: HOURS }, (_, hour) => extraterrestrialHour(latitudeDeg, dayOfYear, (hour + 0.5 - 12) * Math.PI / 12))
  const sum = shares.reduce((total, share) => total + share, 0)
  return sum > 0 ? shares.map(share => share / sum) : shares
}

/**
 * Share of a day's evapotranspiration in an hour: a half sine from 6 to 19 h.
 *
 * @param hour - local hour, 0 to 23
 * @returns 0 to 1; the 24 add up to 1
 */
export function halfSineShare(hour: number): number {
  if (hour < SUN_FROM || hour >= SUN_TO) return 0
  const angle = (clock: number) => Math.PI * (clock - SUN_FROM) / (SUN_TO - SUN_FROM)
  return (Math.cos(angle(hour)) - Math.cos(angle(hour + 1))) / 2
}

function dayOfYearOf(daysSince1970: number): number {
  const date = new Date(daysSince1970 * 86_400_000)
  return Math.round((date.getTime() - Date.UTC(date.getUTCFullYear(), 0, 1)) / 86_400_000) + 1
}
