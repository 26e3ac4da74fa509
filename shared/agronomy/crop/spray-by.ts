import { dayAfter, daysBetween } from './late-planting'

/**
 * Last day for a pre-emerge: the label's days behind planting, or the day before the earliest emergence, whichever is
 * first (crop.md 7.2). The label decides.
 *
 * @param labelDays - whole, ≥ 0; null: the label names none
 * @param earliestEmergence - `YYYY-MM-DD` at the low end of the range; null: not known
 * @returns the day and what sets it; null when neither is known
 * @throws {RangeError} when a date is none or the days are not whole
 */
export function sprayBy(plantedOn: string, labelDays: number | null, earliestEmergence: string | null): { day: string, by: 'label' | 'emergence' } | null {
  if (labelDays !== null && !(Number.isInteger(labelDays) && labelDays >= 0)) throw new RangeError(`The label's days (${labelDays}) must be whole and at least 0`)
  const label = labelDays === null ? null : dayAfter(plantedOn, labelDays)
  const emergence = earliestEmergence === null ? null : dayAfter(earliestEmergence, -1)
  if (label !== null && (emergence === null || daysBetween(label, emergence) >= 0)) return { day: label, by: 'label' }
  return emergence === null ? null : { day: emergence, by: 'emergence' }
}

/**
 * Days that the sprayer needs for what is planted and not sprayed.
 * @param sprayShare - of days fit for spraying, above 0, at most 1
 * @throws {RangeError} when a figure is out of range
 */
export function backlogDays(acres: number, acresPerHour: number, hoursPerDay: number, sprayShare: number): number {
  if (!(acres >= 0) || !(acresPerHour > 0) || !(hoursPerDay > 0 && hoursPerDay <= 24) || !(sprayShare > 0 && sprayShare <= 1)) throw new RangeError(`No backlog of ${acres} ac at ${acresPerHour} ac/h, ${hoursPerDay} h a day, ${sprayShare} of days`)
  return acres / (acresPerHour * hoursPerDay * sprayShare)
}
