export interface WorkingDay {
  /** hours of the day at the farm, 0 to 24, from before to */
  fromHour: number
  toHour: number
}

/**
 * Stretches in which a machine may work, as hours from the start of the plan.
 *
 * @param day - its working hours; none when `toHour` is not after `fromHour`
 * @param localHour - hour of the day, 0 to 23, in which each hour of the plan lies; one element an hour
 * @param availableFrom - hour of the plan before which it is down; 0 when it isn't
 * @returns pairs [from, to, from, to, …], rising and apart
 * @throws {RangeError} when the hours are NaN or outside 0 to 24
 */
export function workingStretches(day: WorkingDay, localHour: ArrayLike<number>, availableFrom: number): Float64Array {
  const { fromHour, toHour } = day
  if (!(fromHour >= 0 && fromHour <= 24) || !(toHour >= 0 && toHour <= 24) || Number.isNaN(availableFrom)) {
    throw new RangeError(`No working day from ${fromHour} to ${toHour}`)
  }
  const bounds: number[] = []
  for (let hour = 0; hour < localHour.length; hour++) {
    const from = Math.max(hour, hour + fromHour - localHour[hour]!, availableFrom)
    const to = Math.min(hour + 1, hour + toHour - localHour[hour]!)
    if (!(from < to)) continue
    if (bounds.at(-1) === from) bounds[bounds.length - 1] = to
    else bounds.push(from, to)
  }
  return Float64Array.from(bounds)
}
