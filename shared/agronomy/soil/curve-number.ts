import type { HydrologicGroup } from './hydrologic-group'

/**
 * Curve numbers of fallow ground, antecedent condition II, groups A to D.
 *
 * Source: TR-55 (1986) Table 2-2b and NEH-630 Table 9-1, as in the SWAT+ reference table.
 */
const FALLOW = {
  bare: { A: 77, B: 86, C: 91, D: 94 },
  poor: { A: 76, B: 85, C: 90, D: 93 },
  good: { A: 74, B: 83, C: 88, D: 90 },
} as const satisfies Record<string, Record<HydrologicGroup, number>>

/** Residue on at least this share of the surface counts as cover, and as good cover, percent. General knowledge of NEH-630's notes. */
const COVER_FROM_PCT = 5
const GOOD_COVER_FROM_PCT = 20

/**
 * Curve number of ground before planting.
 *
 * @param group - hydrologic group
 * @param residuePct - share of the surface under residue, 0 to 100
 * @returns antecedent condition II, 0 to 100
 * @throws {RangeError} when the share is NaN or outside 0 to 100
 */
export function fallowCurveNumber(group: HydrologicGroup, residuePct: number): number {
  if (!(residuePct >= 0 && residuePct <= 100)) throw new RangeError(`residue ${residuePct} % is outside 0 to 100 %`)
  if (residuePct < COVER_FROM_PCT) return FALLOW.bare[group]
  return residuePct < GOOD_COVER_FROM_PCT ? FALLOW.poor[group] : FALLOW.good[group]
}

/**
 * Most water that ground can hold back from a storm.
 *
 * Source: TR-55 (1986) eq. 2-4 in millimetres.
 *
 * @param curveNumber - above 0 to 100
 * @returns S, mm
 * @throws {RangeError} when the curve number is NaN or outside its range
 */
export function retentionMm(curveNumber: number): number {
  if (!(curveNumber > 0 && curveNumber <= 100)) throw new RangeError(`curve number ${curveNumber} is outside 0 to 100`)
  return 25400 / curveNumber - 254
}

/**
 * Runoff of a whole storm so far. The method is made for storms, not hours: feed it the storm's sum and take
 * differences.
 *
 * Source: TR-55 (1986) eqs. 2-1 to 2-3, initial abstraction 0.2 S.
 *
 * @param stormMm - rain and melt since the storm began, mm, not negative
 * @param retention - S, mm, not negative
 * @returns mm since the storm began
 */
export function stormRunoffMm(stormMm: number, retention: number): number {
  const beyond = stormMm - 0.2 * retention
  return beyond > 0 ? beyond * beyond / (stormMm + 0.8 * retention) : 0
}

/**
 * Curve number of dry ground (antecedent condition I) from that of middling ground.
 *
 * Source: Chow, Maidment & Mays (1988).
 */
export function dryCurveNumber(curveNumber: number): number {
  return 4.2 * curveNumber / (10 - 0.058 * curveNumber)
}

/**
 * Curve number of wet ground (antecedent condition III) from that of middling ground.
 *
 * Source: Chow, Maidment & Mays (1988).
 */
export function wetCurveNumber(curveNumber: number): number {
  return 23 * curveNumber / (10 + 0.13 * curveNumber)
}
