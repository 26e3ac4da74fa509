import { SOIL_SETTINGS } from './settings'

/** Depths at which soil temperature is worked out, m: 2 and 4 in. */
export const DEPTH_2_IN_M = 0.0508
export const DEPTH_4_IN_M = 0.1016

/** Share of the way to the air's daily mean that 4 in goes in a day: bare, and under snow. Zheng, Hunt & Running (1993). */
export const RATE_BARE = 0.25
export const RATE_SNOW = 0.1

/** Thermal diffusivity of moist clay loam, m²/s. Default; no measurement of this ground. */
export const DIFFUSIVITY_M2_S = 5e-7

/**
 * Daily mean soil temperature after some hours of air at one temperature.
 *
 * Source: Zheng, Hunt & Running (1993), Climate Research 2:183–191, T(J) = T(J−1) + [A(J) − T(J−1)] M. Deviation:
 * the daily step is spread evenly over its hours, so that 24 hours at A give the published step exactly.
 *
 * @param before - °C
 * @param airC - mean air temperature of the hours, °C
 * @param rate - M, 0 to 1 per day
 * @param hours - h; 24 is the published daily step
 * @returns °C
 */
export function soilMeanC(before: number, airC: number, rate: number, hours = 24): number {
  return before + (airC - before) * (1 - (1 - rate) ** (hours / 24))
}

/**
 * Depth at which the daily swing of temperature has fallen to 1/e.
 *
 * Source: Hillel (1982), d = √(D · 86400 s / π).
 *
 * @param diffusivityM2S - D, m²/s, above 0
 * @returns m
 * @throws {RangeError} when the diffusivity is NaN or not above 0
 */
export function dampingDepthM(diffusivityM2S: number): number {
  if (!(diffusivityM2S > 0)) throw new RangeError(`diffusivity ${diffusivityM2S} m²/s is not above 0`)
  return Math.sqrt(diffusivityM2S * 86400 / Math.PI)
}

/**
 * Share of the surface's daily swing that reaches a depth.
 *
 * @param depthM - m, not negative
 * @param dampingM - m, above 0
 * @returns 0 to 1
 */
export function swingShare(depthM: number, dampingM: number): number {
  return Math.exp(-depthM / dampingM)
}

/**
 * Hours by which the daily swing at a depth trails the surface.
 *
 * @param depthM - m, not negative
 * @param dampingM - m, above 0
 * @returns h
 */
export function swingLagHours(depthM: number, dampingM: number): number {
  return depthM / dampingM * 24 / (2 * Math.PI)
}

/**
 * The daily swing at a depth, by local hour, as a share of the half range of the surface: the value in the middle
 * of each hour.
 *
 * @param depthM - m, not negative
 * @returns 24 shares, −1 to 1
 */
export function swingByHour(depthM: number): Float64Array {
  const damping = dampingDepthM(DIFFUSIVITY_M2_S)
  const share = swingShare(depthM, damping)
  const warmest = SOIL_SETTINGS.warmestHour.value + swingLagHours(depthM, damping)
  return Float64Array.from({ length: 24 }, (_, hour) => share * Math.cos((hour + 0.5 - warmest) * Math.PI / 12))
}
