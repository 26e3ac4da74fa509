/** ft² in an acre over feet in a mile: mph × ft to ac/h. Prints as 8.25 in the sources. */
const MPH_FT_PER_ACRE_HOUR = 8.25

export interface Working { speedMph: number, widthFt: number, fieldEfficiency: number }

/**
 * Effective field capacity, acres an hour: C = S·W·E/8.25.
 *
 * Source: ASABE EP496; Iowa State Extension A3-24.
 *
 * @param working - speed in mph, width in ft, field efficiency above 0 and at most 1
 * @throws {RangeError} when a figure is NaN, zero or negative, or the efficiency above 1
 */
export function capacityAcPerHour({ speedMph, widthFt, fieldEfficiency }: Working): number {
  if (!(speedMph > 0) || !(widthFt > 0) || !(fieldEfficiency > 0 && fieldEfficiency <= 1)) {
    throw new RangeError(`No capacity at ${speedMph} mph, ${widthFt} ft, efficiency ${fieldEfficiency}`)
  }
  return speedMph * widthFt * fieldEfficiency / MPH_FT_PER_ACRE_HOUR
}

/**
 * Hours of work for an area.
 *
 * @param areaAc - ≥ 0
 * @param rateAcPerHour - above 0
 * @throws {RangeError} when either is outside its range or NaN
 */
export function hoursForArea(areaAc: number, rateAcPerHour: number): number {
  if (!(areaAc >= 0) || !(rateAcPerHour > 0)) throw new RangeError(`No hours for ${areaAc} ac at ${rateAcPerHour} ac/h`)
  return areaAc / rateAcPerHour
}
