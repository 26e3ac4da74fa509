/** Drop classes of ANSI/ASABE S572, by comparison with reference nozzles; it has no absolute sizes. */
export const DROP_CLASSES = ['extremely fine', 'very fine', 'fine', 'medium', 'coarse', 'very coarse', 'extremely coarse', 'ultra coarse'] as const
export type DropClass = (typeof DROP_CLASSES)[number]

/**
 * Application exclusion zone of a ground boom, ft (40 CFR 170.405): 100 for drops smaller than medium, 25 for medium or
 * larger from more than 12 in up, else none. The rule in force and the label decide.
 * @param heightIn - of release above the planting medium, ≥ 0
 * @throws {RangeError} when the height is negative or NaN
 */
export function exclusionZoneFt(heightIn: number, drops: DropClass): number {
  if (!(heightIn >= 0)) throw new RangeError(`The height (${heightIn} in) must be at least 0`)
  if (DROP_CLASSES.indexOf(drops) < DROP_CLASSES.indexOf('medium')) return 100
  return heightIn > 12 ? 25 : 0
}
