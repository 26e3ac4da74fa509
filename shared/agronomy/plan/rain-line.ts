import { quantileByRank } from './chance'

/** Rain in an hour above which that hour counts as wet, mm; the service's own probability uses the same. */
export const WET_HOUR_MM = 0.1
/** Hours after its onset over which a run's rain is summed for 'likely'. */
const LIKELY_HOURS = 48

/** When rain is likely to start. Hours count from the start of the runs; null: not within the horizon. */
export interface RainOnset {
  /** half of the runs have started by then */
  medianHour: number | null
  /** 1 in 10, and 9 in 10 */
  earlyHour: number | null
  lateHour: number | null
  /** share of the runs that start within the horizon, 0 to 1 */
  share: number
  /** median over the runs that start of the rain in the 48 h from their own onset, mm; null when none starts */
  likelyMm: number | null
}

/**
 * The rain line from the runs: median, early (1 in 10) and late (9 in 10) hour by rank, runs without rain last.
 *
 * @param runs - mm in each hour, one array a run
 * @param onsets - of the same runs, from rainOnset
 * @throws {RangeError} when there are no runs
 */
export function rainLine(runs: readonly Float64Array[], onsets: ArrayLike<number>): RainOnset {
  const hourAt = (q: number) => {
    const hour = quantileByRank(onsets, q)
    return Number.isFinite(hour) ? hour : null
  }
  const amounts = runs.flatMap((rainMm, run) => Number.isFinite(onsets[run]!) ? [rainAfter(rainMm, onsets[run]!)] : [])
  return {
    medianHour: hourAt(0.5),
    earlyHour: hourAt(0.1),
    lateHour: hourAt(0.9),
    share: amounts.length / runs.length,
    likelyMm: amounts.length > 0 ? quantileByRank(amounts, 0.5) : null,
  }
}

/** mm in the 48 h from an hour on, as far as the run goes. */
function rainAfter(rainMm: Float64Array, hour: number): number {
  let sum = 0
  for (let i = hour; i < Math.min(rainMm.length, hour + LIKELY_HOURS); i++) sum += rainMm[i]!
  return sum
}

/**
 * The middle run: of those that start nearest the median hour, the one whose rain is nearest to the likely amount.
 *
 * It is the run that tracks and bars are drawn from. Without a median within the horizon it is a dry run.
 *
 * @returns index of the run; the lower index when two are alike
 */
export function middleRun(runs: readonly Float64Array[], onsets: ArrayLike<number>): number {
  const median = quantileByRank(onsets, 0.5)
  const { likelyMm } = rainLine(runs, onsets)
  let best = 0
  let least = Infinity
  for (let run = 0; run < runs.length; run++) {
    if (onsets[run] !== median) continue
    const off = Number.isFinite(median) ? Math.abs(rainAfter(runs[run]!, median) - likelyMm!) : 0
    if (off < least) [best, least] = [run, off]
  }
  return best
}

/** Hour by hour over the runs: mean rain, mm, and the share of runs with a wet hour, 0 to 1. */
export function hourlyRain(runs: readonly Float64Array[], hours: number): { meanMm: Float64Array, wetShare: Float64Array } {
  const meanMm = new Float64Array(hours)
  const wetShare = new Float64Array(hours)
  for (const rainMm of runs) {
    for (let hour = 0; hour < hours; hour++) {
      meanMm[hour]! += rainMm[hour]!
      if (rainMm[hour]! > WET_HOUR_MM) wetShare[hour]!++
    }
  }
  const perRun = (sum: number) => sum / runs.length
  return { meanMm: meanMm.map(perRun), wetShare: wetShare.map(perRun) }
}
