/** Plants an acre from counts in the field (crop.md 6). */

const FT2_PER_ACRE = 43_560

/**
 * Length of row that holds a thousandth of an acre: 43.56/(row in/12).
 * @param rowIn - spacing, above 0
 * @returns ft
 * @throws {RangeError} when the spacing is not above 0
 */
export function rowLengthFt(rowIn: number): number {
  if (!(rowIn > 0)) throw new RangeError(`The row spacing (${rowIn} in) must be above 0`)
  return FT2_PER_ACRE / 1000 / (rowIn / 12)
}

/**
 * Plants an acre from a count along a row.
 * @param count - ≥ 0, doubtful plants as a half
 * @param lengthFt - of row counted, above 0
 * @throws {RangeError} when a figure is out of range
 */
export function standFromRow(count: number, lengthFt: number, rowIn: number): number {
  if (!(count >= 0) || !(lengthFt > 0)) throw new RangeError(`A count of ${count} over ${lengthFt} ft is none: count at least 0, length above 0`)
  return count / lengthFt * 1000 * rowLengthFt(rowIn)
}

/**
 * Plants an acre from a count inside a hoop: count × 43,560/(π(d/24)²).
 * @param diameterIn - inner, above 0
 * @throws {RangeError} when a figure is out of range
 */
export function standFromHoop(count: number, diameterIn: number): number {
  if (!(count >= 0) || !(diameterIn > 0)) throw new RangeError(`A count of ${count} in a hoop of ${diameterIn} in is none: count at least 0, diameter above 0`)
  return count * FT2_PER_ACRE / (Math.PI * (diameterIn / 24) ** 2)
}

/** Mean of several counts and how sure it is. */
export interface Stand { mean: number, standardError: number | null, counts: number }

/** @param stands - plants an acre, at least one @throws {RangeError} without counts or with a negative one */
export function meanStand(stands: readonly number[]): Stand {
  if (stands.length === 0 || stands.some(stand => !(stand >= 0))) throw new RangeError('A mean stand needs at least one count, none negative')
  const mean = stands.reduce((sum, stand) => sum + stand, 0) / stands.length
  const variance = stands.reduce((sum, stand) => sum + (stand - mean) ** 2, 0) / (stands.length - 1)
  return { mean, standardError: stands.length > 1 ? Math.sqrt(variance / stands.length) : null, counts: stands.length }
}
