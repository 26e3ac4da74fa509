/** Mean radius of the earth, km (IUGG). */
const EARTH_RADIUS_KM = 6371.0088
/** Road over straight line on section roads. A design choice: √2 at worst along a diagonal, 1 along a road. */
export const ROAD_FACTOR = 1.3
export const KM_PER_MILE = 1.609344

export interface Point { latitude: number, longitude: number }

/**
 * Great-circle distance, km, by the haversine formula.
 *
 * @throws {RangeError} when a coordinate is NaN or off the globe
 */
export function greatCircleKm(from: Point, to: Point): number {
  for (const { latitude, longitude } of [from, to]) {
    if (!(Math.abs(latitude) <= 90) || !(Math.abs(longitude) <= 180)) throw new RangeError(`There is no place at ${latitude}, ${longitude}`)
  }
  const radians = Math.PI / 180
  const north = Math.sin((to.latitude - from.latitude) * radians / 2)
  const east = Math.sin((to.longitude - from.longitude) * radians / 2)
  const chord = north * north + Math.cos(from.latitude * radians) * Math.cos(to.latitude * radians) * east * east
  return 2 * EARTH_RADIUS_KM * Math.asin(Math.min(1, Math.sqrt(chord)))
}

/** Distance by road, km: 1.3 times the straight line, for want of a map of the roads. */
export function roadKm(from: Point, to: Point): number {
  return ROAD_FACTOR * greatCircleKm(from, to)
}

/**
 * Hours on the road.
 *
 * @param km - ≥ 0
 * @param roadMph - above 0
 * @throws {RangeError} when either is outside its range or NaN
 */
export function roadHours(km: number, roadMph: number): number {
  if (!(km >= 0) || !(roadMph > 0)) throw new RangeError(`No road hours for ${km} km at ${roadMph} mph`)
  return km / KM_PER_MILE / roadMph
}
