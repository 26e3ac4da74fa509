/** Whether the soil is warm enough to plant, and stays so while the seed drinks (crop.md 3). */

export interface ChillRule {
  /** mean at seed depth over two to three days under which planting waits, °F */
  minimumF: number
  /** hours after planting in which the seed swells */
  windowHours: number
}

/** Windows: corn 48 h, soybean 24 h (Nebraska Extension 2020; Penn State 2022). Minimum 50 °F for both (NDSU). */
export const CHILL_RULES = { corn: { minimumF: 50, windowHours: 48 }, soybean: { minimumF: 50, windowHours: 24 }, wheat: { minimumF: 40, windowHours: 0 } } as const satisfies Record<string, ChillRule>

/** Soil under which water harms swelling seed, °F: Iowa State's figure for soybean; corn sources range 39 to 50. A setting. */
const HARM_F = 45
/** Caution up to here, °F. */
const CAUTION_F = 50
/** Rain that makes cold soil cold water, in; a setting, no published amount. */
const LEAST_RAIN_IN = 0.1

export interface SoilAhead {
  /** mean at seed depth of the last two to three days, °F */
  meanF: number
  /** coldest at seed depth ahead, and when */
  coldest: { f: number, inHours: number }
  /** rain until then, in, ≥ 0 */
  rainIn: number
  /** past the date from which the calendar outweighs the thermometer */
  pastOverride: boolean
}

export type PlantingAdvice = 'hold-cold' | 'hold-chill' | 'caution' | 'go'

/**
 * Hold, caution or go by temperature; the soil must be fit besides. Thresholds are settings; the agronomist decides.
 * @throws {RangeError} when a temperature is NaN, or hours or rain negative
 */
export function plantingAdvice({ meanF, coldest, rainIn, pastOverride }: SoilAhead, { minimumF, windowHours }: ChillRule): PlantingAdvice {
  if (Number.isNaN(meanF + coldest.f) || !(coldest.inHours >= 0) || !(rainIn >= 0)) throw new RangeError('Temperatures must be known, hours and rain at least 0')
  if (meanF < minimumF && !pastOverride) return 'hold-cold'
  if (windowHours === 0) return 'go'
  const chills = coldest.f < HARM_F && rainIn >= LEAST_RAIN_IN
  if (chills && coldest.inHours <= windowHours) return 'hold-chill'
  return coldest.f < CAUTION_F ? 'caution' : 'go'
}
