import { capillaryRiseMm } from './capillary'
import { dryingFactor } from './evaporation'
import { LAYER_MM, type FieldSoil } from './field-soil'
import type { FieldState } from './field-state'
import { SOIL_SETTINGS } from './settings'
import { fallsAsSnow, meltableMm } from './snow'
import { antecedentCurveNumber, beginStorm, isStormOver, stormHourRunoffMm } from './storm'
import { drainedMm } from './unit-gradient-drainage'

const [TOP_MM, MIDDLE_MM, BOTTOM_MM] = LAYER_MM
const FROZEN_INDEX = SOIL_SETTINGS.frozenIndex.value

/**
 * Moves a field's water through one hour: snow and melt, runoff, infiltration, outflow at the bottom, drainage from
 * layer to layer upwards from the lowest, capillary rise, evaporation. No water is made or lost.
 *
 * @param soil - of the field
 * @param rainMm - mm in the hour, rain or snow as water, not negative
 * @param temperatureC - air, °C
 * @param etoMm - reference evapotranspiration, mm in the hour, not negative
 * @param state - advanced by the hour, sums included
 */
export function advanceWater(soil: FieldSoil, rainMm: number, temperatureC: number, etoMm: number, state: FieldState): void {
  state.total.inMm += rainMm
  const waterMm = takeInSnow(soil, rainMm, temperatureC, state)
  const deepFrost = state.frostIndex > FROZEN_INDEX
  const topFrozen = deepFrost || state.mean10C <= 0
  infiltrate(soil, waterMm - runOff(soil, waterMm, state), topFrozen, state)
  if (!deepFrost) leaveAtBottom(soil, state)
  if (!deepFrost) drain(soil, topFrozen, state)
  if (!deepFrost) rise(soil, topFrozen, state)
  evaporate(soil, etoMm, state)
}

/** Adds snow to the pack and takes melt from it; what is left for the ground, mm. */
function takeInSnow(soil: FieldSoil, rainMm: number, temperatureC: number, state: FieldState): number {
  if (fallsAsSnow(temperatureC)) state.snowMm += rainMm
  else if (state.snowMm === 0) return rainMm
  const melt = Math.min(state.snowMm, meltableMm(temperatureC, soil.meltMmPerDegreeDay, 1))
  state.snowMm -= melt
  return fallsAsSnow(temperatureC) ? melt : rainMm + melt
}

/** What leaves over the surface before it can soak in, mm. */
function runOff(soil: FieldSoil, waterMm: number, state: FieldState): number {
  const { storm } = state
  if (waterMm <= 0) {
    storm.dryHours++
    return 0
  }
  if (isStormOver(storm)) {
    const { fieldCapacity, saturation } = soil.properties
    beginStorm(storm, antecedentCurveNumber(soil.curveNumber, state.water1Mm / (TOP_MM * fieldCapacity), saturation / fieldCapacity, state.frostIndex))
  }
  const runoff = soil.runoffShare * stormHourRunoffMm(storm, waterMm)
  state.total.runoffMm += runoff
  return runoff
}

/** Fills the top layer as far as it has room and frost lets it; the rest stands, and runs off above the storage. */
function infiltrate(soil: FieldSoil, waterMm: number, frozen: boolean, state: FieldState): void {
  state.pondMm += waterMm
  if (state.pondMm === 0) return
  const room = frozen ? 0 : Math.max(0, TOP_MM * soil.properties.saturation - state.water1Mm)
  const soaked = Math.min(room, state.pondMm)
  state.water1Mm += soaked
  state.pondMm = soaked === state.pondMm ? 0 : state.pondMm - soaked
  state.surfaceDryMm = Math.max(0, state.surfaceDryMm - soaked)
  const excess = state.pondMm - soil.surfaceStorageMm
  if (excess <= 0) return
  state.pondMm -= excess
  state.total.runoffMm += excess
}

/** What leaves below: what the subsoil conducts, at most what the drainage takes. */
function leaveAtBottom(soil: FieldSoil, state: FieldState): void {
  const out = Math.min(drainedMm(soil.subsoil, BOTTOM_MM, state.water3Mm, 1), soil.bottomMmPerDay / 24)
  state.water3Mm -= out
  state.total.drainedMm += out
}

/** Lower layer first, so that room made there is used in the same hour. */
function drain(soil: FieldSoil, topFrozen: boolean, state: FieldState): void {
  const roomBelow = Math.max(0, BOTTOM_MM * soil.subsoil.saturation - state.water3Mm)
  const toBottom = Math.min(drainedMm(soil.properties, MIDDLE_MM, state.water2Mm, 1), roomBelow)
  state.water2Mm -= toBottom
  state.water3Mm += toBottom
  if (topFrozen) return
  const room = Math.max(0, MIDDLE_MM * soil.properties.saturation - state.water2Mm)
  const toMiddle = Math.min(drainedMm(soil.properties, TOP_MM, state.water1Mm, 1), room)
  state.water1Mm -= toMiddle
  state.water2Mm += toMiddle
}

/** Water drawn up into a drier layer, as far as it has room. */
function rise(soil: FieldSoil, topFrozen: boolean, state: FieldState): void {
  const { fieldCapacity, saturation } = soil.properties
  if (!topFrozen) {
    const up = capillaryRiseMm(state.water1Mm / TOP_MM, fieldCapacity, state.water2Mm / MIDDLE_MM, fieldCapacity, TOP_MM, soil.capillaryPerHour)
    const taken = Math.min(up, TOP_MM * saturation - state.water1Mm)
    state.water1Mm += taken
    state.water2Mm -= taken
  }
  const up = capillaryRiseMm(state.water2Mm / MIDDLE_MM, fieldCapacity, state.water3Mm / BOTTOM_MM, soil.subsoil.fieldCapacity, MIDDLE_MM, soil.capillaryPerHour)
  const taken = Math.min(up, MIDDLE_MM * saturation - state.water2Mm)
  state.water2Mm += taken
  state.water3Mm -= taken
}

/** From standing water first, then from the top layer in FAO-56's two stages; nothing under snow. */
function evaporate(soil: FieldSoil, etoMm: number, state: FieldState): void {
  if (state.snowMm > 0) return
  const wanted = soil.cropCoefficient * etoMm * soil.residueFactor
  const fromPond = Math.min(state.pondMm, wanted)
  state.pondMm -= fromPond
  const depletion = Math.max(0, TOP_MM * soil.properties.fieldCapacity - state.water1Mm)
  const left = Math.max(0, soil.totalEvaporableMm - depletion)
  const fromSoil = Math.min(left, (wanted - fromPond) * dryingFactor(depletion, soil.readilyEvaporableMm, soil.totalEvaporableMm))
  state.water1Mm -= fromSoil
  state.surfaceDryMm = Math.min(soil.readilyEvaporableMm, state.surfaceDryMm + fromSoil)
  state.total.evaporatedMm += fromPond + fromSoil
}
