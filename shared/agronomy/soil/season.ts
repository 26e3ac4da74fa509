import type { SpreadWeather } from './daily-weather'
import type { FieldSoil } from './field-soil'
import { createFitMarks, markFitHours } from './fit'
import { SOIL_SETTINGS } from './settings'
import { balanceErrorMm, createTrace, runFieldModel, startingState } from './water-balance'

const HOURS = 24
const FROM_HOUR = SOIL_SETTINGS.fitFromHour.value
const TO_HOUR = SOIL_SETTINGS.fitToHour.value

/** What a field's ground did over a record. */
export interface Season {
  /** for each day, the share of its hours from 8 to 20 in which the ground was fit for tillage, 0 to 1 */
  fitShare: Float64Array
  /** mm of water in and out over the whole record */
  total: { inMm: number, runoffMm: number, drainedMm: number, evaporatedMm: number }
  /** what the balance over the whole record fails to close by, mm */
  balanceErrorMm: number
}

/**
 * Runs a field through a record of whole days and counts when it could be worked.
 *
 * @param soil - of the field
 * @param record - hours of whole local days, from midnight
 * @throws {RangeError} when the record is not of whole days, or has a gap
 */
export function runSeason(soil: FieldSoil, { weather, etoMm, localHour }: SpreadWeather): Season {
  if (weather.hours % HOURS !== 0 || (weather.hours > 0 && localHour[0] !== 0)) throw new RangeError(`${weather.hours} hours from ${localHour[0]} h are not whole days`)
  const state = startingState(soil)
  const before = startingState(soil)
  const trace = createTrace(weather.hours)
  runFieldModel(soil, weather, etoMm, localHour, state, trace)
  const marks = createFitMarks(weather.hours)
  markFitHours(soil, trace, localHour, 0, marks)
  return { fitShare: shareOfDays(marks.dig), total: state.total, balanceErrorMm: balanceErrorMm(before, state) }
}

/** For each day, the share of its working hours that are flagged. */
function shareOfDays(flags: Uint8Array): Float64Array {
  return Float64Array.from({ length: flags.length / HOURS }, (_, day) => {
    let fit = 0
    for (let hour = FROM_HOUR; hour < TO_HOUR; hour++) fit += flags[day * HOURS + hour]!
    return fit / (TO_HOUR - FROM_HOUR)
  })
}

/**
 * Days fit for work between two days of a record: the sum of their shares, as days suitable for fieldwork are counted.
 *
 * @param season - of runSeason
 * @param from - index of the first day
 * @param to - index behind the last day
 * @returns d
 * @throws {RangeError} when the range is reversed or outside the record
 */
export function daysFit(season: Season, from: number, to: number): number {
  if (!(from >= 0 && to >= from && to <= season.fitShare.length)) throw new RangeError(`no days ${from} to ${to} in a record of ${season.fitShare.length}`)
  return season.fitShare.subarray(from, to).reduce((sum, share) => sum + share, 0)
}
