import { LAYER_MM, type FieldSoil } from './field-soil'
import { SOIL_SETTINGS } from './settings'
import { noStorm, type Storm } from './storm'

/** Everything that a field remembers from hour to hour. Water is in mm over the field. */
export interface FieldState {
  /** water in the snow */
  snowMm: number
  /** water standing on the ground */
  pondMm: number
  /** water in 0–100, 100–300 and 300–600 mm */
  water1Mm: number
  water2Mm: number
  water3Mm: number
  /** frozen-ground index, °C·d */
  frostIndex: number
  /** daily mean soil temperature at 2 and 4 in, °C; NaN until the first hour has been seen */
  mean5C: number
  mean10C: number
  /** evaporated since the surface was last wetted, mm */
  surfaceDryMm: number
  storm: Storm
  day: DayState
  seed: SeedZoneMemory
  /** For each ground condition: 0 not met, 1 met in the last hour, 2 held long enough to work. */
  held: Uint8Array
  /** sums since the start, mm */
  total: { inMm: number, runoffMm: number, drainedMm: number, evaporatedMm: number }
}

/** The local day under way: its range so far, its sum of temperatures, and half the daily range in use. */
export interface DayState { lastHour: number, minC: number, maxC: number, sumC: number, hours: number, halfRangeC: number }

/** The last hours' temperatures at 2 in, in a ring. */
export interface SeedZoneMemory { ring: Float64Array, next: number, count: number, sumC: number }

/** Number of ground conditions that are held: see fit-rule. */
export const HELD_CONDITIONS = 4

/**
 * A field to start from: drained, bare, unfrozen. The model forgets its start within a month or so; start that long
 * before the hours that matter.
 *
 * @param soil - of the field
 * @param soilC - soil temperature, °C; left out: the mean air temperature of the first day seen
 */
export function startingState(soil: FieldSoil, soilC = Number.NaN): FieldState {
  return {
    snowMm: 0,
    pondMm: 0,
    water1Mm: LAYER_MM[0] * soil.properties.fieldCapacity,
    water2Mm: LAYER_MM[1] * soil.properties.fieldCapacity,
    water3Mm: LAYER_MM[2] * soil.subsoil.fieldCapacity,
    frostIndex: 0,
    mean5C: soilC,
    mean10C: soilC,
    surfaceDryMm: 0,
    storm: noStorm(),
    day: { lastHour: -1, minC: Infinity, maxC: -Infinity, sumC: 0, hours: 0, halfRangeC: 0 },
    seed: { ring: new Float64Array(SOIL_SETTINGS.seedMeanHours.value), next: 0, count: 0, sumC: 0 },
    held: new Uint8Array(HELD_CONDITIONS),
    total: { inMm: 0, runoffMm: 0, drainedMm: 0, evaporatedMm: 0 },
  }
}

/**
 * Copies a state over another, allocating nothing.
 *
 * @param from - left as it is
 * @param to - overwritten
 */
export function copyState(from: FieldState, to: FieldState): void {
  to.snowMm = from.snowMm
  to.pondMm = from.pondMm
  to.water1Mm = from.water1Mm
  to.water2Mm = from.water2Mm
  to.water3Mm = from.water3Mm
  to.frostIndex = from.frostIndex
  to.mean5C = from.mean5C
  to.mean10C = from.mean10C
  to.surfaceDryMm = from.surfaceDryMm
  Object.assign(to.storm, from.storm)
  Object.assign(to.day, from.day)
  Object.assign(to.total, from.total)
  to.held.set(from.held)
  to.seed.ring.set(from.seed.ring)
  to.seed.next = from.seed.next
  to.seed.count = from.seed.count
  to.seed.sumC = from.seed.sumC
}

/**
 * Water in the field: snow, pond and the three layers.
 *
 * @returns mm
 */
export function storedMm(state: FieldState): number {
  return state.snowMm + state.pondMm + state.water1Mm + state.water2Mm + state.water3Mm
}

/**
 * What the balance between two states of the same field fails to close by: change of storage less what came in,
 * plus what left.
 *
 * @returns mm; 0 but for rounding
 */
export function balanceErrorMm(before: FieldState, after: FieldState): number {
  const stored = storedMm(after) - storedMm(before)
  const cameIn = after.total.inMm - before.total.inMm
  const left = after.total.runoffMm - before.total.runoffMm + after.total.drainedMm - before.total.drainedMm + after.total.evaporatedMm - before.total.evaporatedMm
  return stored - cameIn + left
}
