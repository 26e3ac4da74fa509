import { LAYER_MM, type FieldSoil } from './field-soil'
import type { FieldState, SeedZoneMemory } from './field-state'
import { frozenGroundIndex, snowDepthCm } from './frozen-ground'
import { SOIL_SETTINGS } from './settings'
import { DEPTH_2_IN_M, DEPTH_4_IN_M, RATE_BARE, RATE_SNOW, soilMeanC, swingByHour } from './soil-temperature'

const HOURLY_RATE_5 = hourly(SOIL_SETTINGS.rate5.value)
const HOURLY_RATE_10 = hourly(RATE_BARE)
const HOURLY_RATE_SNOW = hourly(RATE_SNOW)
const SWING_5 = swingByHour(DEPTH_2_IN_M)
const SWING_10 = swingByHour(DEPTH_4_IN_M)
const FROZEN_INDEX = SOIL_SETTINGS.frozenIndex.value
const SNOW_INSULATES_MM = SOIL_SETTINGS.snowInsulatesMm.value
const DRY_SURFACE_SWING = SOIL_SETTINGS.drySurfaceSwing.value
const RESIDUE_SWING_LOSS = SOIL_SETTINGS.residueSwingLoss.value
/** Hours of a local day that must be known before its range counts as that of the whole day. */
const WHOLE_DAY_HOURS = 20

/** The share of the way that an hour goes, so that 24 hours go the daily share. */
function hourly(rate: number): number {
  return soilMeanC(0, 1, rate, 1)
}

/**
 * Begins the stretch of a local day that starts at an hour: closes the day before when it is over, and looks ahead to
 * the day's end for its range. A day of which less than 20 hours are known keeps the range of the day before where
 * that is wider.
 *
 * @param temperatureC - air, °C, by the hour
 * @param localHour - hour of day, 0 to 23, by the hour
 * @param hour - first hour of the stretch
 * @param state - its day, frost index and, when not yet known, soil temperatures are set
 * @returns the hour at which the next day begins, or the end of the arrays
 */
export function beginDay(temperatureC: Float64Array, localHour: Uint8Array, hour: number, state: FieldState): number {
  const { day } = state
  if (localHour[hour]! < day.lastHour) closeDay(state)
  let { minC, maxC } = day
  let sumC = 0
  let end = hour
  do {
    const airC = temperatureC[end]!
    minC = Math.min(minC, airC)
    maxC = Math.max(maxC, airC)
    sumC += airC
    end++
  } while (end < temperatureC.length && localHour[end]! >= localHour[end - 1]!)
  const halfRange = (maxC - minC) / 2
  day.halfRangeC = day.hours + end - hour < WHOLE_DAY_HOURS ? Math.max(halfRange, day.halfRangeC) : halfRange
  if (Number.isNaN(state.mean10C)) state.mean5C = state.mean10C = sumC / (end - hour)
  return end
}

function closeDay(state: FieldState): void {
  const { day } = state
  if (day.hours > 0) state.frostIndex = frozenGroundIndex(state.frostIndex, day.sumC / day.hours, snowDepthCm(state.snowMm), day.hours)
  day.minC = Infinity
  day.maxC = -Infinity
  day.sumC = 0
  day.hours = 0
  day.lastHour = -1
}

/**
 * Moves a field's warmth through one hour. While the ground is frozen its thaw takes up the heat, so that its mean
 * does not rise above 0 °C.
 *
 * @param airC - °C
 * @param localHour - 0 to 23
 * @param state - means and the day so far are advanced
 */
export function advanceWarmth(airC: number, localHour: number, state: FieldState): void {
  const snow = state.snowMm > SNOW_INSULATES_MM
  const ceiling = state.frostIndex > FROZEN_INDEX ? 0 : Infinity
  state.mean5C = Math.min(ceiling, state.mean5C + (airC - state.mean5C) * (snow ? HOURLY_RATE_SNOW : HOURLY_RATE_5))
  state.mean10C = Math.min(ceiling, state.mean10C + (airC - state.mean10C) * (snow ? HOURLY_RATE_SNOW : HOURLY_RATE_10))
  const { day } = state
  day.minC = Math.min(day.minC, airC)
  day.maxC = Math.max(day.maxC, airC)
  day.sumC += airC
  day.hours++
  day.lastHour = localHour
}

/**
 * Half the daily range at the soil's surface: that of the air, more where the surface is dry and dark, less under
 * residue, none under snow or in frozen ground.
 *
 * @param soil - of the field
 * @param state - of the hour
 * @returns °C
 */
export function surfaceHalfRangeC(soil: FieldSoil, state: FieldState): number {
  if (state.snowMm > SNOW_INSULATES_MM || state.frostIndex > FROZEN_INDEX) return 0
  const depletion = LAYER_MM[0] * soil.properties.fieldCapacity - state.water1Mm
  const surface = depletion > soil.readilyEvaporableMm ? DRY_SURFACE_SWING : 1
  return state.day.halfRangeC * surface * (1 - RESIDUE_SWING_LOSS * soil.residuePct / 100)
}

/** Temperature at 2 in in the middle of a local hour, °C. @param halfRangeC - at the surface */
export function temperature2InC(state: FieldState, halfRangeC: number, localHour: number): number {
  return state.mean5C + halfRangeC * SWING_5[localHour]!
}

/** Temperature at 4 in in the middle of a local hour, °C. @param halfRangeC - at the surface */
export function temperature4InC(state: FieldState, halfRangeC: number, localHour: number): number {
  return state.mean10C + halfRangeC * SWING_10[localHour]!
}

/**
 * Adds an hour to the seed zone's memory.
 *
 * @param seed - updated
 * @param temperatureC - at 2 in, °C
 * @returns mean of the hours remembered, °C
 */
export function rememberSeedZone(seed: SeedZoneMemory, temperatureC: number): number {
  const { ring } = seed
  if (seed.count < ring.length) seed.count++
  else seed.sumC -= ring[seed.next]!
  ring[seed.next] = temperatureC
  seed.sumC += temperatureC
  seed.next++
  if (seed.next === ring.length) {
    seed.next = 0
    seed.sumC = ring.reduce(add, 0) // sheds what rounding has added up
  }
  return seed.sumC / seed.count
}

function add(sum: number, value: number): number {
  return sum + value
}
