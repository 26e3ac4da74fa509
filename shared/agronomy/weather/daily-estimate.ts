import { saturationVapourPressure } from './humidity'
import { clearSkyRadiation, extraterrestrialDay, radiationFromTemperatures } from './radiation'
import { penmanMonteithDay } from './reference-evapotranspiration'
import { windAt2m } from './wind'

/** Wind at 2 m where none is measured, m/s (FAO-56 p. 63: the mean over 2,000 stations). */
const UNMEASURED_WIND_MS = 2
/** kRs of FAO-56 eq 50, °C^−0.5. */
const INLAND = 0.16
const COASTAL = 0.19

/** Where a day's extremes were measured. */
export interface EstimatePlace {
  /** degrees, north positive */
  latitudeDeg: number
  elevationM: number
  /** next to a large body of water */
  coastal: boolean
}

/**
 * Solar radiation of a day from its extremes of temperature, at most that of a clear sky. FAO-56 eqs 37 and 50.
 *
 * @param minC - °C
 * @param maxC - °C, not below the minimum
 * @returns MJ m⁻² d⁻¹
 * @throws {RangeError} when the extremes are reversed, or anything is NaN
 */
export function estimatedRadiation(minC: number, maxC: number, place: EstimatePlace, dayOfYear: number): number {
  if (!(minC <= maxC)) throw new RangeError(`The day's minimum (${minC} °C) is above its maximum (${maxC} °C)`)
  const extraterrestrial = extraterrestrialDay(place.latitudeDeg, dayOfYear)
  return radiationFromTemperatures(minC, maxC, extraterrestrial, place.coastal ? COASTAL : INLAND, clearSkyRadiation(extraterrestrial, place.elevationM))
}

/**
 * Reference evapotranspiration of a day of which only the extremes of temperature, and perhaps the wind, are known:
 * eq 6 with humidity and radiation estimated, which FAO-56 (p. 64) prefers to Hargreaves–Samani. Humidity is that of
 * air saturated at the minimum (eq 48).
 *
 * @param minC - °C
 * @param maxC - °C, not below the minimum
 * @param wind10mMs - m/s at 10 m; null: not measured, 2 m/s at 2 m is taken
 * @returns mm/d, not negative
 * @throws {RangeError} when the extremes are reversed, or anything is NaN
 */
export function estimatedReferenceEt(minC: number, maxC: number, wind10mMs: number | null, place: EstimatePlace, dayOfYear: number): number {
  return Math.max(0, penmanMonteithDay({
    minC,
    maxC,
    vapourKpa: saturationVapourPressure(minC),
    wind2mMs: wind10mMs === null ? UNMEASURED_WIND_MS : windAt2m(wind10mMs, 10),
    radiation: estimatedRadiation(minC, maxC, place, dayOfYear),
    clearSky: clearSkyRadiation(extraterrestrialDay(place.latitudeDeg, dayOfYear), place.elevationM),
    elevationM: place.elevationM,
  }))
}
