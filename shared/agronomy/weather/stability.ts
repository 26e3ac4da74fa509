/** How stable the air is, A (stirred) to G (lying in layers). Stable air keeps fine drops together (spray.md 2). */
export type Stability = 'A' | 'B' | 'C' | 'D' | 'E' | 'F' | 'G'

const MS_PER_KNOT = 1852 / 3600

function atLeast0(value: number, name: string): void {
  if (!(value >= 0) || !Number.isFinite(value)) throw new RangeError(`${name} must be a number of at least 0, not ${value}`)
}

/** Index of the last bound that a value reaches; bounds rise, the lower one belongs to its class. */
function classOf(value: number, bounds: readonly number[]): number {
  return bounds.findLastIndex(bound => value >= bound)
}

const PASQUILL_WIND = [0, 2, 3, 5, 6]
/** Split classes read as the more stable one, since this screens for inversions. */
const PASQUILL: Record<'strong' | 'moderate' | 'slight' | 'nightCloudy' | 'nightClear', string> = {
  strong: 'ABBCC', moderate: 'BBCDD', slight: 'BCCDD', nightCloudy: 'EEDDD', nightClear: 'FFEDD',
}
export type PasquillSky = keyof typeof PASQUILL

/**
 * Stability from wind and sun. Pasquill 1961, Turner 1970, as printed at NOAA's READY page.
 *
 * @param wind10mMs - ≥ 0
 * @param sky - strong sun: above 60° and clear; moderate 35 to 60°; slight 15 to 35°; night: 1 h before sunset to 1 h
 *   after sunrise, cloudy above 4/8
 * @throws {RangeError} when the wind is negative or NaN
 */
export function pasquillStability(wind10mMs: number, sky: PasquillSky): Stability {
  atLeast0(wind10mMs, 'The wind')
  return PASQUILL[sky][classOf(wind10mMs, PASQUILL_WIND)] as Stability
}

export interface TurnerSky {
  night: boolean
  /** sun above the horizon, degrees; not read at night */
  sunDeg: number
  /** total cloud, tenths, 0 to 10 */
  cloudTenths: number
  /** height of the lowest ceiling, ft; null: none */
  ceilingFt: number | null
}

/**
 * Turner's net radiation index, −2 (clear night) to 4. Turner 1964; EPA-454/R-99-005, 6.4.1.
 * @throws {RangeError} when the cloud is outside 0 to 10 tenths or the sun outside −90 to 90°
 */
export function netRadiationIndex({ night, sunDeg, cloudTenths, ceilingFt }: TurnerSky): number {
  if (!(cloudTenths >= 0 && cloudTenths <= 10)) throw new RangeError(`The cloud (${cloudTenths}) must be 0 to 10 tenths`)
  if (!(Math.abs(sunDeg) <= 90)) throw new RangeError(`The sun (${sunDeg}°) must be −90 to 90°`)
  const ceiling = ceilingFt ?? Infinity
  if (cloudTenths === 10 && ceiling < 7000) return 0
  if (night) return cloudTenths <= 4 ? -2 : -1
  const insolation = sunDeg > 60 ? 4 : sunDeg > 35 ? 3 : sunDeg > 15 ? 2 : 1
  if (cloudTenths <= 5) return insolation
  const less = ceiling < 7000 ? 2 : ceiling <= 16_000 || cloudTenths === 10 ? 1 : 0
  return Math.max(1, insolation - less)
}

const TURNER_KNOTS = [0, 2, 4, 6, 7, 8, 10, 11, 12]
/** Rows by wind, columns for an index of 4 down to −2. */
const TURNER = ['AABCDFG', 'ABBCDFG', 'ABCDDEF', 'BBCDDEF', 'BBCDDDE', 'BCCDDDE', 'CCDDDDE', 'CCDDDDD', 'CDDDDDD']

/**
 * Stability by Turner's method. EPA-454/R-99-005, tables 6-4 to 6-6.
 * @param wind10mMs - ≥ 0
 * @throws {RangeError} when a value is out of its range
 */
export function turnerStability(wind10mMs: number, sky: TurnerSky): Stability {
  atLeast0(wind10mMs, 'The wind')
  // Whole knots, as the table has it: 1.4 kt is 1, 1.6 kt is 2.
  return TURNER[classOf(Math.round(wind10mMs / MS_PER_KNOT), TURNER_KNOTS)]![4 - netRadiationIndex(sky)] as Stability
}

const SRDT_WIND = [0, 2, 3, 5, 6]
const SRDT_SUN = [0, 175, 675, 925]
/** Rows by wind, columns from the weakest sun to the strongest. */
const SRDT = ['DBAA', 'DCBA', 'DCBB', 'DDCC', 'DDDC']

/**
 * Stability from solar radiation by day. EPA-454/R-99-005, 6.4.2, table 6-7.
 * @param wind10mMs - ≥ 0
 * @param radiationWm2 - ≥ 0
 * @throws {RangeError} when a value is negative or NaN
 */
export function srdtDayStability(wind10mMs: number, radiationWm2: number): Stability {
  atLeast0(wind10mMs, 'The wind')
  atLeast0(radiationWm2, 'The radiation')
  return SRDT[classOf(wind10mMs, SRDT_WIND)]![classOf(radiationWm2, SRDT_SUN)] as Stability
}

/**
 * The same at night, from the change of temperature with height.
 * @param gradientC - temperature above less temperature below, °C
 * @throws {RangeError} when the wind is negative or a value is NaN
 */
export function srdtNightStability(wind10mMs: number, gradientC: number): Stability {
  atLeast0(wind10mMs, 'The wind')
  if (Number.isNaN(gradientC)) throw new RangeError('The gradient must be a number of °C, not NaN')
  if (wind10mMs >= 2.5) return 'D'
  if (wind10mMs >= 2) return gradientC < 0 ? 'D' : 'E'
  return gradientC < 0 ? 'E' : 'F'
}

const GRADIENT = [-Infinity, -1.9, -1.7, -1.5, -0.5, 1.5, 4]

/**
 * Stability from temperatures at two heights, by °C per 100 m (NOAA READY).
 * Near the ground gradients are steep: read only whether it is above 0, not the class.
 * @returns the class and the gradient, °C per 100 m; above 0: an inversion
 * @throws {RangeError} when the heights are not apart or a temperature is NaN
 */
export function gradientStability(low: { heightM: number, temperatureC: number }, high: { heightM: number, temperatureC: number }): { stability: Stability, per100mC: number } {
  const per100mC = 100 * (high.temperatureC - low.temperatureC) / (high.heightM - low.heightM)
  if (!(high.heightM > low.heightM) || Number.isNaN(per100mC)) throw new RangeError(`No gradient between ${low.heightM} and ${high.heightM} m: the second must be higher, both temperatures known`)
  return { stability: 'ABCDEFG'[classOf(per100mC, GRADIENT)] as Stability, per100mC }
}
