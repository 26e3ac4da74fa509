/** Degree days per leaf collar, 86/50 °F, up to V10 and behind it (Nielsen, Purdue; Wuethrich 1997). */
const PER_COLLAR = 82
const PER_LATER_COLLAR = 50
const CHANGES_AT = 10

/**
 * Corn's leaf stage: collars since emergence, as a decimal; its whole part is the n of Vn.
 * @param sincePlanting - degree days 86/50 °F, ≥ 0
 * @param atEmergence - of the same count, ≥ 0
 * @returns null before emergence
 * @throws {RangeError} when a sum is negative or NaN
 */
export function cornLeafStage(sincePlanting: number, atEmergence: number): number | null {
  if (!(sincePlanting >= 0) || !(atEmergence >= 0)) throw new RangeError(`The sums (${sincePlanting} and ${atEmergence}) must be at least 0`)
  if (sincePlanting < atEmergence) return null
  const collars = (sincePlanting - atEmergence) / PER_COLLAR
  return collars <= CHANGES_AT ? collars : CHANGES_AT + (sincePlanting - atEmergence - CHANGES_AT * PER_COLLAR) / PER_LATER_COLLAR
}
