import type { PlaceId } from '../../../shared/types/ids'

/** Side of a place's cell, degrees: about 5 km from north to south. */
const CELL_DEG = 0.05

/**
 * The place that a point belongs to: the middle of its cell of the grid.
 * @throws {RangeError} for a point that is nowhere
 */
export function placeFor(latitude: number, longitude: number): { id: PlaceId, latitude: number, longitude: number } {
  if (!(Math.abs(latitude) <= 90 && Math.abs(longitude) <= 180)) throw new RangeError(`There is no place at ${latitude}, ${longitude}`)
  const cell = (degrees: number) => (Math.round(degrees / CELL_DEG) * CELL_DEG + 0).toFixed(2)
  return { id: `${cell(latitude)},${cell(longitude)}` as PlaceId, latitude: Number(cell(latitude)), longitude: Number(cell(longitude)) }
}
