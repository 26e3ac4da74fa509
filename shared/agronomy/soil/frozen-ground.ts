import { SOIL_SETTINGS } from './settings'

/** What is left of the index after a day. */
const DAILY_DECAY = 0.97
/** How much a centimetre of snow shields the ground, 1/cm: in thaw and in frost. */
const SHIELD_THAW = 0.5
const SHIELD_FROST = 0.08

/**
 * The frozen-ground index after some hours of one day.
 *
 * Source: Molnau & Bissell (1983), 51st Western Snow Conf. 109–119, as eq. 1-9 of the SWB2 report:
 * max(0, 0.97 × before − T exp(−0.4 K D)). Deviation: a part of a day counts by its hours.
 *
 * @param before - °C·d, not negative
 * @param meanC - mean air temperature of the hours, °C
 * @param snowCm - depth of snow, cm
 * @param hours - h; 24 is the published daily step
 * @returns °C·d, not negative
 * @throws {RangeError} when a number is NaN, or the index or the depth is negative
 */
export function frozenGroundIndex(before: number, meanC: number, snowCm: number, hours = 24): number {
  if (!(before >= 0 && snowCm >= 0 && Number.isFinite(meanC))) throw new RangeError(`index ${before}, mean ${meanC} °C and snow ${snowCm} cm make no index`)
  const days = hours / 24
  const shield = meanC > 0 ? SHIELD_THAW : SHIELD_FROST
  return Math.max(0, before * DAILY_DECAY ** days - meanC * days * Math.exp(-0.4 * shield * snowCm))
}

/**
 * Depth of snow from its water: new snow at a tenth of the density of water, as SWB2 takes it.
 *
 * @param snowMm - water in the snow, mm
 * @returns cm
 */
export function snowDepthCm(snowMm: number): number {
  return snowMm * 10 / 10
}

/**
 * How far the ground is frozen: 0 under 56 °C·d, 1 above 83 °C·d, in between linear.
 *
 * Source: SWB2 report, after Molnau & Bissell (1983).
 *
 * @param index - °C·d
 * @returns 0 to 1
 */
export function frozenShare(index: number): number {
  const from = SOIL_SETTINGS.unfrozenIndex.value
  const to = SOIL_SETTINGS.frozenIndex.value
  return Math.min(1, Math.max(0, (index - from) / (to - from)))
}
