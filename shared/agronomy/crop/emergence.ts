/** Heat from planting to emergence, always a range: no source gives one date (crop.md 2). */

export type EmergenceCrop = 'corn' | 'soybean' | 'spring wheat' | 'oats' | 'barley'
export interface HeatRange { low: number, usual: number, high: number }

/**
 * Air degree days from planting to emergence, by the crop's own rule, °F.
 *
 * Corn: Purdue 100–120 and 'use 115', Iowa State 90–120. Soybean: 90–130 (Conley & Gaska 2010; Casteel 2010), the
 * middle taken as usual. Small grains depend on the depth: see `smallGrainEmergence`.
 */
export const EMERGENCE_HEAT = {
  corn: { low: 90, usual: 115, high: 120 },
  soybean: { low: 90, usual: 110, high: 130 },
} as const satisfies Record<string, HeatRange>

export interface CornBed {
  texture: 'fine' | 'medium' | 'coarse'
  depthIn: number
  /** seed zone drier than it should be */
  dry: boolean
  residuePct: number
}

/** Most that the adjustments may add up to, °F·d: no source says that they may all be stacked. A setting. */
const MOST_ADJUSTMENT = 60

/**
 * Corn emergence adjusted for the seedbed: 125, fine soil +30 to +60, coarse −30 to −60, +15 for each inch deeper than
 * 2 in, dry seed zone +30, more than 75 % residue +30 to +60 (Lauer 2003, Wisconsin Crop Manager 10(8):63). The total is
 * held to ±60.
 *
 * @param bed - depth above 0 to 6 in, residue 0 to 100 %
 * @returns degree days 86/50 °F
 * @throws {RangeError} when depth or residue is out of range
 */
export function cornEmergence({ texture, depthIn, dry, residuePct }: CornBed): HeatRange {
  if (!(depthIn > 0 && depthIn <= 6)) throw new RangeError(`The depth (${depthIn} in) must be above 0 and at most 6 in`)
  if (!(residuePct >= 0 && residuePct <= 100)) throw new RangeError(`The residue (${residuePct} %) must be 0 to 100 %`)
  const soil = texture === 'fine' ? [30, 60] : texture === 'coarse' ? [-60, -30] : [0, 0]
  const residue = residuePct > 75 ? [30, 60] : [0, 0]
  const fixed = 15 * Math.max(0, depthIn - 2) + (dry ? 30 : 0)
  const held = (sum: number) => 125 + Math.min(MOST_ADJUSTMENT, Math.max(-MOST_ADJUSTMENT, sum))
  const [low, high] = [soil[0]! + residue[0]! + fixed, soil[1]! + residue[1]! + fixed]
  return { low: held(low), usual: held((low + high) / 2), high: held(high) }
}

/**
 * Small grains: 80 + 50 per inch of depth, base 32 °F (Bauer et al. 1984, as extension repeats it; general knowledge,
 * shown as such). The range is that of an inch more or less.
 * @param depthIn - above 0, at most 5 in
 * @throws {RangeError} when the depth is out of range
 */
export function smallGrainEmergence(depthIn: number): HeatRange {
  if (!(depthIn > 0 && depthIn <= 5)) throw new RangeError(`The depth (${depthIn} in) must be above 0 and at most 5 in`)
  const usual = 80 + 50 * depthIn
  return { low: usual - 50, usual, high: usual + 50 }
}

/** Days from planting by the mean soil temperature at seed depth, sugarbeet (Khan, NDSU 2020). */
const SUGARBEET_DAYS: readonly { fromF: number, toF: number, days: [number, number | null] }[] = [
  { fromF: 38, toF: 45, days: [21, null] }, { fromF: 45, toF: 52, days: [10, 21] }, { fromF: 52, toF: 60, days: [7, 12] }, { fromF: 60, toF: 70, days: [5, 7] },
]

/**
 * @param soilF - mean at seed depth, °F
 * @returns fewest and most days; most null: no end is named; null: the table has no such temperature
 * @throws {RangeError} when it is NaN
 */
export function sugarbeetDays(soilF: number): { fewest: number, most: number | null } | null {
  if (Number.isNaN(soilF)) throw new RangeError('The soil temperature must be a number of °F')
  const row = SUGARBEET_DAYS.find(({ fromF, toF }) => soilF >= fromF && soilF < toF) ?? (soilF === 70 ? SUGARBEET_DAYS.at(-1) : undefined)
  return row ? { fewest: row.days[0], most: row.days[1] } : null
}
