const HOUR_MS = 3_600_000

/**
 * When a deadline of elapsed hours ends: hours of a label are counted as they pass, also over a change of clock.
 * @param hours - ≥ 0
 * @throws {RangeError} when the hours are negative or the end of work is no date
 */
export function hoursAfter(endedAt: Date, hours: number): Date {
  if (!(hours >= 0) || Number.isNaN(endedAt.getTime())) throw new RangeError(`The hours (${hours}) must be at least 0 and the end of work a date`)
  return new Date(endedAt.getTime() + hours * HOUR_MS)
}

/**
 * Restricted-entry interval of a tank: the longest of its products governs (40 CFR 156.208, 170).
 * @param hours - of each product, at least one, ≥ 0
 * @throws {RangeError} without products or with a negative interval
 */
export function restrictedEntryHours(hours: readonly number[]): number {
  if (hours.length === 0 || hours.some(each => !(each >= 0))) throw new RangeError('The tank needs at least one product, each interval at least 0 h')
  return Math.max(...hours)
}

/** Rules on keeping a record, with what they ask and as of when they were read. They change: shown, not enforced. */
export const RECORD_RULES = [
  { name: 'Dicamba label', completeWithinH: 72, keepYears: 2, asOf: '2020 labels' },
  { name: 'Worker Protection Standard, 40 CFR 170.311(b): posted at a central place', completeWithinH: 24, keepYears: 2, asOf: 'revision of 2 November 2015' },
] as const

/** The federal private-applicator record rule, 7 CFR 110.3, was rescinded with effect from 11 July 2025 (FR Doc 2025-08220). */
export const RESCINDED_RULE = { name: '7 CFR 110.3', since: '2025-07-11' } as const
