/** Directions in degrees clockwise from north. A wind is named by where it comes from (spray.md 1.4). */

const POINTS = ['N', 'NNE', 'NE', 'ENE', 'E', 'ESE', 'SE', 'SSE', 'S', 'SSW', 'SW', 'WSW', 'W', 'WNW', 'NW', 'NNW'] as const
export type CompassPoint = (typeof POINTS)[number]

function degrees(value: number, name: string): number {
  if (!Number.isFinite(value)) throw new RangeError(`${name} must be a number of degrees, not ${value}`)
  return ((value % 360) + 360) % 360
}

/** Where a wind blows to, 0 to under 360. @throws {RangeError} when it is no number */
export function blowsTo(fromDeg: number): number {
  return degrees(fromDeg + 180, 'The direction')
}

/**
 * Angle between where the wind blows and the bearing from the field to a place, 0 (straight at it) to 180.
 * @throws {RangeError} when either is no number
 */
export function offAxisDeg(fromDeg: number, bearingDeg: number): number {
  return Math.abs(degrees(degrees(bearingDeg, 'The bearing') - blowsTo(fromDeg) + 180, 'The angle') - 180)
}

/**
 * Mean wind as a vector: a mean of directions alone is wrong across north.
 *
 * @param winds - at least one; speed ≥ 0 in any unit
 * @returns the mean's speed in that unit and where it comes from; `fromDeg` null when the winds cancel out
 * @throws {RangeError} without winds or with a negative speed
 */
export function meanWind(winds: readonly { speed: number, fromDeg: number }[]): { speed: number, fromDeg: number | null } {
  if (winds.length === 0 || winds.some(({ speed }) => !(speed >= 0))) throw new RangeError('A mean wind needs at least one wind, none with a negative speed')
  let [x, y] = [0, 0]
  for (const { speed, fromDeg } of winds) {
    const angle = degrees(fromDeg, 'The direction') * Math.PI / 180
    x += speed * Math.sin(angle) / winds.length
    y += speed * Math.cos(angle) / winds.length
  }
  const speed = Math.hypot(x, y)
  return { speed, fromDeg: speed < 1e-9 ? null : degrees(Math.round(Math.atan2(x, y) * 180 / Math.PI * 1e9) / 1e9, 'The mean') }
}

/** One of sixteen points of the compass. @throws {RangeError} when it is no number */
export function compassPoint(fromDeg: number): CompassPoint {
  return POINTS[Math.floor((degrees(fromDeg, 'The direction') + 11.25) / 22.5) % 16]!
}
