import type { Ground, Pass } from '../ground'
import { holdForColdRain } from './cold-rain'
import type { FieldSoil } from './field-soil'
import type { FieldTrace } from './field-trace'
import { SOIL_SETTINGS } from './settings'

/** For each pass, 1 in each hour in which the ground may be worked; and why planting may not. */
export interface FitMarks extends Record<Pass, Uint8Array> {
  hours: number
  /** frost keeps the ground shut */
  frozen: Uint8Array
  /** dry enough to plant, too cold */
  cold: Uint8Array
}

/**
 * Room for marks, to be used again and again.
 *
 * @param hours - a whole number, not negative
 * @throws {RangeError} when it is not
 */
export function createFitMarks(hours: number): FitMarks {
  if (!(Number.isInteger(hours) && hours >= 0)) throw new RangeError(`${hours} is not a number of hours`)
  return {
    hours,
    dig: new Uint8Array(hours),
    rocks: new Uint8Array(hours),
    plant: new Uint8Array(hours),
    roll: new Uint8Array(hours),
    spray: new Uint8Array(hours),
    frozen: new Uint8Array(hours),
    cold: new Uint8Array(hours),
  }
}

/**
 * Marks the hours in which each pass may work the ground.
 *
 * Dig: fit at tillage depth. Rocks: seed zone fit. Plant: seed zone fit, the mean at 2 in over the last 2 to 3 days at
 * or above the crop's minimum (NDSU and Manitoba tables; the way of measuring is Manitoba's), and no cold rain ahead
 * within the hours that the crop needs. Roll: surface dry. Spray: the ground carries the sprayer, which is a design
 * choice (see the setting carryShare). Wind, rain, crop stage and labels are judged elsewhere.
 *
 * @param soil - of the field, as the trace was made with
 * @param trace - of runFieldModel
 * @param localHour - hour of day at the farm of each hour, as the trace was made with
 * @param minimumSoilC - under which the crop is not planted, °C
 * @param marks - filled; as long as the trace, or longer
 * @param chillHours - hours after planting in which cold rain harms the seed; 0 for crops without the rule
 * @throws {RangeError} when an array is too short or a number is NaN
 */
export function markFitHours(soil: FieldSoil, trace: FieldTrace, localHour: Uint8Array, minimumSoilC: number, marks: FitMarks, chillHours = 0): void {
  if (localHour.length < trace.hours || marks.hours < trace.hours) throw new RangeError(`${trace.hours} hours need as many local hours and marks`)
  if (!Number.isFinite(minimumSoilC) || !(chillHours >= 0)) throw new RangeError(`minimum ${minimumSoilC} °C and ${chillHours} h make no rule`)
  for (let hour = 0; hour < trace.hours; hour++) {
    const seedZoneFit = trace.seedZoneFit[hour]!
    const warm = trace.seedMeanC[hour]! >= minimumSoilC
    marks.dig[hour] = trace.tillageFit[hour]!
    marks.rocks[hour] = seedZoneFit
    marks.plant[hour] = warm ? seedZoneFit : 0
    marks.cold[hour] = warm ? 0 : seedZoneFit
    marks.roll[hour] = trace.surfaceDry[hour]!
    marks.spray[hour] = trace.carries[hour]!
    marks.frozen[hour] = trace.frozen[hour]!
  }
  holdForColdRain(trace.temperature5C, trace.rainMm, trace.hours, chillHours, marks.plant, marks.cold)
}

/**
 * The ground at an hour, for a pass.
 *
 * @param marks - of markFitHours
 * @param hour - index into the marks
 * @param pass - the next one of the field; Cold is said only of planting
 * @throws {RangeError} when the hour is outside the marks
 */
export function groundAt(marks: FitMarks, hour: number, pass: Pass = 'plant'): Ground {
  if (!(Number.isInteger(hour) && hour >= 0 && hour < marks.hours)) throw new RangeError(`hour ${hour} is outside the ${marks.hours} marked`)
  if (marks[pass][hour] === 1) return 'fit'
  if (marks.frozen[hour] === 1) return 'frozen'
  if (pass === 'plant' && marks.cold[hour] === 1) return 'cold'
  const until = Math.min(marks.hours, hour + SOIL_SETTINGS.closeHours.value + 1)
  for (let ahead = hour + 1; ahead < until; ahead++) {
    if (marks[pass][ahead] === 1) return 'close'
  }
  return 'wet'
}
