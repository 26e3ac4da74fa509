/** How fast a soil takes up water when wet: A fastest, D slowest. */
export type HydrologicGroup = 'A' | 'B' | 'C' | 'D'

/**
 * Hydrologic group of deep soil, its impermeable layer below 100 cm.
 *
 * Source: NEH-630 ch. 7 (2007), Table 7-1, metric form, lower half. A water table within 60 cm makes the group
 * D until it is drained; drained by tile, the letter of the conductivity counts (dual classes).
 *
 * @param conductivityMmH - saturated conductivity of the least transmissive layer, mm/h, above 0
 * @param shallowWaterTable - true when water stands within 60 cm and nothing drains it
 * @throws {RangeError} when the conductivity is NaN or not above 0
 */
export function hydrologicGroup(conductivityMmH: number, shallowWaterTable: boolean): HydrologicGroup {
  if (!(conductivityMmH > 0)) throw new RangeError(`conductivity ${conductivityMmH} mm/h is not above 0`)
  const micrometresPerSecond = conductivityMmH / 3.6
  if (shallowWaterTable || micrometresPerSecond < 0.4) return 'D'
  if (micrometresPerSecond < 4) return 'C'
  return micrometresPerSecond <= 10 ? 'B' : 'A'
}
