import { LAYER_MM, type FieldSoil } from './field-soil'
import type { FieldState } from './field-state'
import { SOIL_SETTINGS } from './settings'

/** Ground conditions, by their place in FieldState.held. */
export const SEED_ZONE_FIT = 0
export const TILLAGE_FIT = 1
export const CARRIES = 2
export const SURFACE_DRY = 3

const UNFROZEN_INDEX = SOIL_SETTINGS.unfrozenIndex.value
const SNOW_FREE_MM = SOIL_SETTINGS.snowFreeMm.value
const SURFACE_DRY_MM = SOIL_SETTINGS.surfaceDryMm.value
const FROM_HOUR = SOIL_SETTINGS.fitFromHour.value
const TO_HOUR = SOIL_SETTINGS.fitToHour.value

/** Hourly states in a row, inside the working day, after which a condition counts as held: two hours' readings. */
export const HELD = 2

/**
 * Whether frost keeps the ground shut: the index at or above 56 °C·d, or 4 in at or under 0 °C.
 *
 * @param frostIndex - °C·d
 * @param mean10C - daily mean at 4 in, °C
 */
export function isFrozen(frostIndex: number, mean10C: number): boolean {
  return frostIndex >= UNFROZEN_INDEX || mean10C <= 0
}

/**
 * Updates what the ground allows after an hour. A condition is gained when it is met at the start and the end of an
 * hour between 8 and 20 local time; it stays, through the night too, until it is not met.
 *
 * - seed zone fit: bare, unfrozen, no standing water, top 100 mm at or under the soil's fit level
 * - tillage fit: the same, and the layer an inch under the tool at or under the wettest tillable water
 * - carries: bare, unfrozen, no standing water, top 100 mm at or under the carrying level
 * - surface dry: carries, and enough has evaporated since the surface was last wetted
 *
 * @param soil - of the field
 * @param localHour - 0 to 23, of the hour just past
 * @param state - after that hour; `held` is updated
 */
export function holdConditions(soil: FieldSoil, localHour: number, state: FieldState): void {
  const open = state.snowMm < SNOW_FREE_MM && state.pondMm === 0 && !isFrozen(state.frostIndex, state.mean10C)
  const water1 = state.water1Mm / LAYER_MM[0]
  const water2 = state.water2Mm / LAYER_MM[1]
  const seedZone = open && water1 <= soil.fitWater
  const carries = open && water1 <= soil.carryWater
  const inside = localHour >= FROM_HOUR && localHour < TO_HOUR
  hold(state.held, SEED_ZONE_FIT, seedZone, inside)
  hold(state.held, TILLAGE_FIT, seedZone && water2 <= soil.belowFitWater, inside)
  hold(state.held, CARRIES, carries, inside)
  hold(state.held, SURFACE_DRY, carries && state.surfaceDryMm >= SURFACE_DRY_MM, inside)
}

function hold(held: Uint8Array, condition: number, met: boolean, inside: boolean): void {
  if (!met) held[condition] = 0
  else if (held[condition] !== HELD) held[condition] = held[condition] === 1 && inside ? HELD : 1
}
