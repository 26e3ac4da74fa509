/**
 * Wind at one height from wind at another.
 *
 * What comes out only plans: a label's limit is measured at the site. So the highest allowed wind is held against the
 * less reduced value, the lowest against the more reduced one (spray.md 1.3).
 */

/** Roughness lengths, m (Davenport classes as WMO prints them; general knowledge, never an oracle). */
export const ROUGHNESS_M = { smoothSoil: 0.01, shortGrowth: 0.03, stubble: 0.1 } as const

export interface Surface {
  /** roughness length, m, above 0 */
  roughnessM: number
  /** displacement height, m, 0 over bare ground */
  displacementM?: number
}

/**
 * Wind at a height from wind at another by the neutral log law: u(z) = u(r)·ln((z − d)/z₀)/ln((r − d)/z₀).
 *
 * Neutral air and open fetch; both heights above d + z₀.
 *
 * @param windMs - ≥ 0, at `fromM`
 * @returns m/s
 * @throws {RangeError} when a height lies within the rough layer or a value is out of its range
 */
export function windByLogLaw(windMs: number, fromM: number, toM: number, { roughnessM, displacementM = 0 }: Surface): number {
  if (!(windMs >= 0) || !(roughnessM > 0) || !(displacementM >= 0)) throw new RangeError(`No wind of ${windMs} m/s over a roughness of ${roughnessM} m and a displacement of ${displacementM} m: all at least 0, the roughness above it`)
  const lowest = displacementM + roughnessM
  if (!(fromM > lowest && toM > lowest && Number.isFinite(fromM) && Number.isFinite(toM))) throw new RangeError(`The heights (${fromM} and ${toM} m) must be above ${lowest} m, where the log law starts`)
  return windMs * Math.log((toM - displacementM) / roughnessM) / Math.log((fromM - displacementM) / roughnessM)
}

/**
 * The same by the power law: u(z) = u(r)·(z/r)^p.
 *
 * @param exponent - about 0.1 on a sunny afternoon to 0.6 on a cloudless night (EPA-454/R-99-005, 6.2.5)
 * @throws {RangeError} when a height is not above 0 or the exponent outside 0 to 1
 */
export function windByPowerLaw(windMs: number, fromM: number, toM: number, exponent: number): number {
  if (!(windMs >= 0) || !(fromM > 0) || !(toM > 0) || !(exponent >= 0 && exponent <= 1)) throw new RangeError(`No wind of ${windMs} m/s from ${fromM} to ${toM} m with exponent ${exponent}: wind at least 0, heights above 0, exponent 0 to 1`)
  return windMs * (toM / fromM) ** exponent
}

/** The cautious reading of a wind at 10 m for a boom: what to hold against the least and against the most allowed. */
export interface BoomWind {
  /** m/s, the more reduced: against the least wind allowed */
  forLeastMs: number
  /** m/s, the less reduced: against the most wind allowed */
  forMostMs: number
}

/**
 * @param wind10mMs - ≥ 0
 * @param boomM - height of the boom, m
 * @throws {RangeError} when the boom lies within the rough layer
 */
export function boomWind(wind10mMs: number, boomM: number, surface: Surface = { roughnessM: ROUGHNESS_M.shortGrowth }): BoomWind {
  return { forLeastMs: windByLogLaw(wind10mMs, 10, boomM, surface), forMostMs: wind10mMs }
}
