import type { HourlyWeather } from './hourly'
import { airPressureKpa, dailySaturationVapourPressure, psychrometricConstant, saturationVapourPressure, vapourPressureSlope } from './humidity'
import { clearSkyRadiation, extraterrestrialHour, hourAngle, netLongwaveDay, netLongwaveHour, netShortwave, sunsetHourAngle } from './radiation'
import { LEAST_WIND_MS, windAt2m } from './wind'

/**
 * Reference evapotranspiration: water that short, well-watered grass would use.
 *
 * Source: FAO-56 chapters 3 and 4.
 */

/** mm of water that one MJ m⁻² evaporates (FAO-56 eq 20). */
export const MM_PER_MJ = 0.408
/**
 * Cloudiness (Rs/Rso) of night hours before any daylight was seen: the middle of FAO-56's 0.4 to 0.6 for humid
 * climates (p. 75).
 */
const NIGHT_CLEARNESS = 0.5
/** The least that Rs/Rso of an hour counts for, so that net longwave stays a loss (ASCE-EWRI 2005, as public code has it). */
const LEAST_CLEARNESS = 0.3
/** Hours before sunset, from and to, in which the cloudiness of the night is read (FAO-56 p. 75). */
const DUSK_FROM_H = 3
const DUSK_TO_H = 2
const SECONDS_PER_HOUR = 3600

export interface DailyWeather {
  minC: number
  maxC: number
  /** actual vapour pressure, kPa */
  vapourKpa: number
  /** m/s at 2 m */
  wind2mMs: number
  /** solar radiation, MJ m⁻² d⁻¹ */
  radiation: number
  /** clear-sky radiation, MJ m⁻² d⁻¹ */
  clearSky: number
  elevationM: number
}

/**
 * Penman–Monteith for a day. FAO-56 eq 6, with G = 0 (eq 42).
 * @returns mm/d
 * @throws {RangeError} when the minimum is above the maximum or anything is NaN
 */
export function penmanMonteithDay(day: DailyWeather): number {
  if (!(day.minC <= day.maxC)) throw new RangeError(`The day's minimum (${day.minC} °C) is above its maximum (${day.maxC} °C)`)
  const mean = (day.minC + day.maxC) / 2
  const slope = vapourPressureSlope(mean)
  const gamma = psychrometricConstant(airPressureKpa(day.elevationM))
  const wind = Math.max(LEAST_WIND_MS, day.wind2mMs)
  const net = netShortwave(day.radiation) - netLongwaveDay(day.minC, day.maxC, day.vapourKpa, day.radiation / day.clearSky)
  const deficit = dailySaturationVapourPressure(day.minC, day.maxC) - day.vapourKpa
  const result = (MM_PER_MJ * slope * net + gamma * 900 / (mean + 273) * wind * deficit) / (slope + gamma * (1 + 0.34 * wind))
  if (Number.isNaN(result)) throw new RangeError('A value of the day is missing')
  return result
}

/**
 * Hargreaves–Samani, for days of which only the extremes are known; FAO-56 p. 64 prefers eq 6 with estimates.
 * FAO-56 eq 52.
 * @param extraterrestrial - MJ m⁻² d⁻¹
 * @returns mm/d, labelled a fallback wherever it is shown
 * @throws {RangeError} when the minimum is above the maximum or anything is NaN
 */
export function hargreavesSamani(minC: number, maxC: number, extraterrestrial: number): number {
  if (!(minC <= maxC) || Number.isNaN(extraterrestrial)) throw new RangeError(`The day's minimum (${minC} °C) is above its maximum (${maxC} °C)`)
  return Math.max(0, 0.0023 * ((minC + maxC) / 2 + 17.8) * Math.sqrt(maxC - minC) * MM_PER_MJ * extraterrestrial)
}

export interface HourOfWeather {
  temperatureC: number
  vapourKpa: number
  wind2mMs: number
  /** solar radiation, MJ m⁻² h⁻¹ */
  radiation: number
  /** Rs/Rso of the hour, or the last of the day for a night hour */
  clearness: number
  daytime: boolean
}

/** Net radiation of an hour of the reference grass, MJ m⁻² h⁻¹. FAO-56 eq 40. */
export function netRadiationHour(hour: HourOfWeather): number {
  return netShortwave(hour.radiation) - netLongwaveHour(hour.temperatureC, hour.vapourKpa, hour.clearness)
}

/**
 * Penman–Monteith for an hour. FAO-56 eqs 53, 45 and 46.
 * @param gamma - psychrometric constant, kPa/°C
 * @returns mm/h; slightly negative on a clear night, as published
 */
export function penmanMonteithHour(hour: HourOfWeather, gamma: number): number {
  const net = netRadiationHour(hour)
  const ground = (hour.daytime ? 0.1 : 0.5) * net
  const slope = vapourPressureSlope(hour.temperatureC)
  const deficit = saturationVapourPressure(hour.temperatureC) - hour.vapourKpa
  const wind = Math.max(LEAST_WIND_MS, hour.wind2mMs)
  return (MM_PER_MJ * slope * (net - ground) + gamma * 37 / (hour.temperatureC + 273) * wind * deficit) / (slope + gamma * (1 + 0.34 * wind))
}

/** Where weather was measured or is forecast for. */
export interface Place {
  /** degrees, north positive */
  latitudeDeg: number
  /** degrees, east positive */
  longitudeDeg: number
  elevationM: number
}

/**
 * Reference evapotranspiration of each hour of a stretch of weather.
 *
 * The cloudiness of a night hour is that of 2 to 3 hours before the last sunset (FAO-56 p. 75); until one has been
 * seen, 0.5. Deviation: an hour that is not wholly between sunrise and sunset counts as night for this, since a low
 * sun makes the quotient noise.
 *
 * @param weather - every value known
 * @param place - degrees, east positive; metres
 * @param sun - of these hours there; given once for many runs of a forecast
 * @returns mm in each hour, `weather.hours` long; dew is left out, so never negative
 * @throws {RangeError} naming the first hour with a missing value
 */
export function hourlyReferenceEt(weather: HourlyWeather, place: Place, sun = sunOfHours(weather.startsAt, weather.hours, place)): Float64Array {
  const result = new Float64Array(weather.hours)
  const gamma = psychrometricConstant(airPressureKpa(place.elevationM))
  let nightClearness = NIGHT_CLEARNESS
  for (let i = 0; i < weather.hours; i++) {
    const { extraterrestrial, clearSky, isDusk, isWholeHour } = sun[i]!
    const radiation = weather.radiationWm2[i]! * SECONDS_PER_HOUR / 1e6
    const own = Math.min(1, Math.max(LEAST_CLEARNESS, radiation / clearSky))
    if (isDusk) nightClearness = own
    const temperatureC = weather.temperatureC[i]!
    const mm = penmanMonteithHour({
      temperatureC,
      vapourKpa: saturationVapourPressure(temperatureC) * weather.humidityPct[i]! / 100,
      wind2mMs: windAt10mTo2m(weather.windMs[i]!),
      radiation,
      clearness: isWholeHour ? own : nightClearness,
      daytime: extraterrestrial > 0,
    }, gamma)
    if (!Number.isFinite(mm)) throw new RangeError(`The weather of the hour from ${new Date((weather.startsAt + i * SECONDS_PER_HOUR) * 1000).toISOString()} has a gap`)
    result[i] = Math.max(0, mm)
  }
  return result
}

/** Wind at 2 m from wind at 10 m, a gap left a gap for the caller to name. FAO-56 eq 47. */
function windAt10mTo2m(windMs: number): number {
  return Number.isNaN(windMs) ? Number.NaN : windAt2m(windMs, 10)
}

/** The sun in an hour. */
export interface SunHour {
  /** MJ m⁻² h⁻¹ */
  extraterrestrial: number
  /** MJ m⁻² h⁻¹ */
  clearSky: number
  /** 2 to 3 hours before sunset */
  isDusk: boolean
  /** wholly between sunrise and sunset */
  isWholeHour: boolean
}

/**
 * The sun in each of a row of hours; its angle is taken in the middle of the hour. FAO-56 eqs 25, 28, 31 and 37.
 *
 * @param startsAt - Unix seconds of the first hour
 */
export function sunOfHours(startsAt: number, hours: number, place: Place): SunHour[] {
  return Array.from({ length: hours }, (_, i) => {
    const middle = new Date((startsAt + (i + 0.5) * SECONDS_PER_HOUR) * 1000)
    const dayOfYear = dayOfYearUtc(middle)
    const angle = wrapped(hourAngle(middle.getUTCHours() + middle.getUTCMinutes() / 60, 0, -place.longitudeDeg, dayOfYear))
    const sunset = sunsetHourAngle(place.latitudeDeg, dayOfYear)
    const hoursToSunset = (sunset - angle) * 12 / Math.PI
    const extraterrestrial = extraterrestrialHour(place.latitudeDeg, dayOfYear, angle)
    return {
      extraterrestrial,
      clearSky: clearSkyRadiation(extraterrestrial, place.elevationM),
      isDusk: hoursToSunset > DUSK_TO_H && hoursToSunset <= DUSK_FROM_H,
      isWholeHour: Math.abs(angle) + Math.PI / 24 <= sunset,
    }
  })
}

function dayOfYearUtc(date: Date): number {
  return Math.floor((date.getTime() - Date.UTC(date.getUTCFullYear(), 0, 1)) / 86_400_000) + 1
}

/** An hour angle brought into −π to π, since a clock in UTC runs past the place's midnight. */
function wrapped(angle: number): number {
  return angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI))
}
