/** Cumulative rain that counts as 'started' and stops fieldwork, mm (0.1 in). A setting. */
export const RAIN_THRESHOLD_MM = 2.54

/**
 * First hour in which the rain since the start adds up to the threshold.
 *
 * @param rainMm - mm in each hour of one run
 * @param hours - horizon; hours beyond the run's end are not there
 * @returns index of the hour (it begins that many hours after the start), Infinity when never within the horizon
 * @throws {RangeError} when an hour within the horizon is NaN or negative
 */
export function rainOnset(rainMm: Float64Array, hours: number, thresholdMm = RAIN_THRESHOLD_MM): number {
  const end = Math.min(hours, rainMm.length)
  let sum = 0
  for (let hour = 0; hour < end; hour++) {
    const mm = rainMm[hour]!
    if (!(mm >= 0)) throw new RangeError(`The rain of hour ${hour} is ${mm}`)
    sum += mm
    // The sum of 0.2 + 0.8 + 1.2 + … must reach a threshold that it equals on paper.
    if (sum >= thresholdMm - 1e-9) return hour
  }
  return Infinity
}

/** Share of runs that have started by the end of each hour: never falls. */
export function shareStarted(onsets: ArrayLike<number>, hours: number): Float64Array {
  const share = new Float64Array(hours)
  for (let run = 0; run < onsets.length; run++) if (onsets[run]! < hours) share[onsets[run]!]!++
  for (let hour = 1; hour < hours; hour++) share[hour]! += share[hour - 1]!
  return share.map(count => count / onsets.length)
}
