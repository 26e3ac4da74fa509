import { retentionMm, stormRunoffMm, wetCurveNumber, dryCurveNumber } from './curve-number'
import { frozenShare } from './frozen-ground'
import { SOIL_SETTINGS } from './settings'

const GAP_HOURS = SOIL_SETTINGS.stormGapHours.value
const WET_FROM = SOIL_SETTINGS.wetStartShare.value
const DRY_FROM = SOIL_SETTINGS.dryStartShare.value
const DRIEST = SOIL_SETTINGS.dryEndShare.value

/** The storm under way: what it brought, what ran off, what the ground can hold back, hours since its last water. */
export interface Storm { waterMm: number, runoffMm: number, retentionMm: number, dryHours: number }

/** No storm under way. */
export function noStorm(): Storm {
  return { waterMm: 0, runoffMm: 0, retentionMm: 0, dryHours: GAP_HOURS }
}

/**
 * Curve number for the ground as a storm finds it: condition II at middling water, towards I when it is drier and
 * towards III from field capacity to saturation, and towards III as it is frozen.
 *
 * Source: the frozen blend is that of the SWB2 report, CN II (1 − Pf) + CN III Pf, applied to the number for the
 * water there is. Deviation: the water of the top 100 mm stands for the rain of the last five days, which NRCS has
 * given up as a predictor; the steps are settings.
 *
 * @param curveNumber - condition II
 * @param wetness - water of the top 100 mm over field capacity
 * @param fullWetness - saturation over field capacity, above 1
 * @param frostIndex - °C·d
 */
export function antecedentCurveNumber(curveNumber: number, wetness: number, fullWetness: number, frostIndex: number): number {
  const wet = wetCurveNumber(curveNumber)
  let found = curveNumber
  if (wetness > WET_FROM) found += (wet - curveNumber) * Math.min(1, (wetness - WET_FROM) / (fullWetness - WET_FROM))
  else if (wetness < DRY_FROM) found += (dryCurveNumber(curveNumber) - curveNumber) * Math.min(1, (DRY_FROM - wetness) / (DRY_FROM - DRIEST))
  return found + Math.max(0, wet - found) * frozenShare(frostIndex)
}

/**
 * Begins a storm when the gap since the last one is long enough.
 *
 * @param storm - cleared when a new one begins
 * @param curveNumber - for the ground as it is now; used only then
 */
export function beginStorm(storm: Storm, curveNumber: number): void {
  storm.waterMm = 0
  storm.runoffMm = 0
  storm.retentionMm = retentionMm(curveNumber)
}

/** Whether the next water begins a new storm. */
export function isStormOver(storm: Storm): boolean {
  return storm.dryHours >= GAP_HOURS
}

/**
 * Adds an hour's water to the storm and gives what runs off in that hour: the growth of the storm's runoff.
 *
 * @param storm - updated
 * @param waterMm - rain and melt of the hour, mm, above 0
 * @returns mm, at most the hour's water
 */
export function stormHourRunoffMm(storm: Storm, waterMm: number): number {
  storm.dryHours = 0
  storm.waterMm += waterMm
  const before = storm.runoffMm
  storm.runoffMm = stormRunoffMm(storm.waterMm, storm.retentionMm)
  return storm.runoffMm - before
}
