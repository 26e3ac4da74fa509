/** FAO-56 p. 63 keeps the wind of its equations at or above this, m/s. */
export const LEAST_WIND_MS = 0.5

/**
 * Wind at 2 m from wind at another height over short grass. FAO-56 eq 47.
 * @param heightM - above 0.1 m, where the logarithm is positive
 * @throws {RangeError} when the height is too low or a value is NaN
 */
export function windAt2m(windMs: number, heightM: number): number {
  if (!(heightM > 0.1) || Number.isNaN(windMs)) throw new RangeError(`No wind at 2 m from ${windMs} m/s at ${heightM} m`)
  return windMs * 4.87 / Math.log(67.8 * heightM - 5.42)
}
