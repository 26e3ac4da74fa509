import { hasWorkLeft, PASS_COUNT, PLANT, type PlanField, type PlanProblem } from './problem'
import type { Timeline } from './timeline'

/**
 * What planting before rain is worth.
 *
 * An acre planted in hour τ, before its run's rain, is worth (share of yield at τ − share when the field is fit again
 * after that rain) × goal yield × price. An acre that isn't planted by then waits either way and is worth 0. In a run
 * without rain within the horizon the comparison is with planting at the horizon's end: the rain comes later still,
 * so that is the least that waiting costs. Fuel, road hours and a missed pre-emerge are not charged yet.
 */

/**
 * Worth of one field in one run under the order that the timeline shows, $.
 *
 * @returns NaN when a share, the yield or the price isn't known
 */
export function plantedWorthUsd(problem: PlanProblem, timeline: Timeline, run: number, field: number): number {
  const { shareByHour, shareAfter, usdPerAc, ground } = problem.fields[field]!
  const rainAt = Math.min(problem.rainAt[ground * problem.runs + run]!, problem.hours)
  const node = field * PASS_COUNT + PLANT
  const end = timeline.first[node]! + timeline.count[node]!
  let keptAc = 0
  let acres = 0
  for (let piece = timeline.first[node]!; piece < end; piece++) {
    const from = timeline.from[piece]!
    const to = Math.min(timeline.to[piece]!, rainAt)
    if (from >= to) break
    const rate = (timeline.acTo[piece]! - timeline.acFrom[piece]!) / (timeline.to[piece]! - from)
    acres += rate * (to - from)
    for (let hour = Math.floor(from); hour < to; hour++) {
      keptAc += rate * (Math.min(to, hour + 1) - Math.max(from, hour)) * shareByHour[hour]!
    }
  }
  return acres === 0 ? 0 * usdPerAc : (keptAc - acres * shareAfter[run]!) * usdPerAc
}

/**
 * What a field has at stake by waiting in one run: all its acres planted in the first hour in which it may be planted,
 * against after the rain.
 *
 * @returns $; 0 when it can't be planted before the run's rain, so that nothing is lost by waiting; NaN when a share,
 *   the yield or the price isn't known
 */
export function stakeUsd(problem: PlanProblem, run: number, field: number): number {
  const { shareByHour, shareAfter, usdPerAc, ground, areaAc, doneAc } = problem.fields[field]!
  const hour = firstPlantingHour(problem, run, ground)
  if (hour >= Math.min(problem.rainAt[ground * problem.runs + run]!, problem.hours)) return 0 * usdPerAc
  return (shareByHour[hour]! - shareAfter[run]!) * usdPerAc * (areaAc - doneAc[PLANT]!)
}

/** First hour in which the ground may be planted in a run; Infinity when never within the horizon. */
export function firstPlantingHour({ workable }: PlanProblem, run: number, ground: number): number {
  const { starts, bounds } = workable[ground]!
  const first = starts[run * PASS_COUNT + PLANT]!
  return first < starts[run * PASS_COUNT + PLANT + 1]! ? bounds[first]! : Infinity
}

/** True when the last acre is planted before the run's rain, or, in a dry run, within the horizon. */
export function isDoneBeforeRain(problem: PlanProblem, timeline: Timeline, run: number, field: number): boolean {
  const finishedAt = timeline.finishedAt[field * PASS_COUNT + PLANT]!
  return finishedAt < Infinity && finishedAt <= problem.rainAt[problem.fields[field]!.ground * problem.runs + run]!
}

/** Hours of planting that a field still needs at a rate. */
export function planterHours(field: PlanField, rateAcPerHour: number): number {
  return hasWorkLeft(field, PLANT) ? (field.areaAc - field.doneAc[PLANT]!) / rateAcPerHour : 0
}
