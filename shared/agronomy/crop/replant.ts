/**
 * Corn yield by stand and planting date, percent of the most. Iowa State PM 1885 (2001).
 *
 * One web copy prints 96 for a full stand planted 13 to 19 May; Iowa State's own pages print 99 (crop.md T2).
 */
export const CORN_REPLANT = {
  source: 'Iowa State PM 1885 (2001), extension.iastate.edu cu080519 and cu040524',
  /** thousand plants an acre; 28 stands for 28 to 32 */
  stands: [28, 24, 20, 16, 12],
  /** first and last day of each column, month-day */
  dates: [['04-20', '05-05'], ['05-13', '05-19'], ['05-26', '06-01'], ['06-10', '06-16'], ['06-24', '06-28']],
  pct: [[100, 99, 90, 68, 52], [94, 93, 85, 64, 49], [81, 80, 73, 55, 42], [74, 73, 67, 50, 38], [68, 67, 61, 46, 35]],
} as const

const dayOfYear = (monthDay: string) => Math.round((Date.parse(`2001-${monthDay}T00:00:00Z`) - Date.parse('2001-01-01T00:00:00Z')) / 86_400_000)

function between(value: number, points: readonly [number, number][]): number | null {
  if (value < points[0]![0] || value > points.at(-1)![0]) return null
  const next = Math.max(1, points.findIndex(([x]) => x >= value))
  const [[x0, y0], [x1, y1]] = [points[next - 1]!, points[next]!]
  return y0 + (y1 - y0) * (x1 === x0 ? 0 : (value - x0) / (x1 - x0))
}

/**
 * Yield of a stand planted on a day, percent of the most. Between printed columns and rows in a straight line.
 * @param plantsPerAc - 12,000 to 32,000
 * @param monthDay - `MM-DD`, 20 April to 28 June
 * @returns null outside the table, which is never carried further
 * @throws {RangeError} when the stand is negative or the day none
 */
export function cornYieldPct(plantsPerAc: number, monthDay: string): number | null {
  const day = dayOfYear(monthDay)
  if (!(plantsPerAc >= 0) || !/^\d{2}-\d{2}$/.test(monthDay) || Number.isNaN(day)) throw new RangeError(`A stand of ${plantsPerAc} planted on ${monthDay} is none: stand at least 0, day as MM-DD`)
  const thousands = plantsPerAc / 1000
  if (thousands > 32) return null
  const column = (row: readonly number[]) => between(day, CORN_REPLANT.dates.flatMap(([from, to], i) => [[dayOfYear(from), row[i]!], [dayOfYear(to), row[i]!]] as [number, number][]))
  const rows = CORN_REPLANT.stands.map((stand, i) => [stand, column(CORN_REPLANT.pct[i]!)] as const).toReversed()
  if (rows.some(([, pct]) => pct === null)) return null
  return between(Math.min(thousands, 28), rows as unknown as [number, number][])
}

export interface ReplantChoice { keepPct: number, replantPct: number, gainPct: number }

/**
 * What is there against what would be planted anew. The insurer must agree before anything is torn up.
 * @returns null when the table does not hold both
 * @throws {RangeError} as `cornYieldPct`
 */
export function compareReplant(kept: { plantsPerAc: number, plantedOn: string }, anew: { plantsPerAc: number, plantedOn: string }): ReplantChoice | null {
  const [keepPct, replantPct] = [cornYieldPct(kept.plantsPerAc, kept.plantedOn), cornYieldPct(anew.plantsPerAc, anew.plantedOn)]
  return keepPct === null || replantPct === null ? null : { keepPct, replantPct, gainPct: replantPct - keepPct }
}
