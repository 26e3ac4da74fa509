import { plottingPosition } from './chance'
import { byStakePerHour, greedyOrder } from './greedy-order'
import { orderFigures, type OrderFigures } from './order-figures'
import { PLANT, type PlanProblem } from './problem'
import { createTimeline, type Timeline } from './timeline'
import { firstPlantingHour } from './worth'

/**
 * Chance of being planted before rain under which a field counts as unlikely: under 1 in 5, which the weather service
 * calls a 'slight chance'. A setting.
 */
export const UNLIKELY_BELOW = 0.2

/**
 * First version of the order: the best of a few that are quickly made, by the mean worth of what they get planted
 * before rain. Two are greedy by what a planter hour saves (greedy-order.ts); three are what a person would try: most
 * money per planter hour first, nearest first, driest first. In each, fields that are unlikely before rain go behind
 * the others. When two are worth the same the one named first is taken. It is no search: a later version improves on it.
 *
 * @returns fields in the order to do them
 */
export function rankFields(problem: PlanProblem): number[] {
  const timeline = createTimeline(problem.fields.length)
  const tried = [greedyOrder(problem, 'planter'), greedyOrder(problem, 'every machine'), byStakePerHour(problem), nearestFirst(problem), driestFirst(problem)]
    .map((made) => {
      const list = unlikelyLast(problem, made, timeline)
      return { list, totalUsd: totalWorthUsd(orderFigures(problem, list, timeline)) }
    })
  return tried.reduce((most, order) => order.totalUsd > most.totalUsd + CENT ? order : most).list
}

/** Less than this is rounding, not worth. */
const CENT = 0.01

/** Mean worth of all fields whose worth is known, $. */
export function totalWorthUsd({ worthUsd }: OrderFigures): number {
  return worthUsd.reduce((sum, usd) => Number.isNaN(usd) ? sum : sum + usd, 0)
}

/** From where the planter stands, always to the nearest field that is left. */
export function nearestFirst(problem: PlanProblem): number[] {
  const left = problem.fields.map((_, field) => field)
  const planter = problem.machines.find(machine => machine.pass === PLANT)
  if (!planter) return left
  const list: number[] = []
  while (left.length > 0) {
    const at = list.at(-1)
    const hours = (field: number) => at === undefined ? planter.firstMoveHours[field]! : planter.moveHours[at * problem.fields.length + field]!
    const next = left.reduce((nearest, field) => hours(field) < hours(nearest) ? field : nearest)
    left.splice(left.indexOf(next), 1)
    list.push(next)
  }
  return list
}

/** By the hour in which they may first be planted, mean over the runs. */
export function driestFirst(problem: PlanProblem): number[] {
  const first = problem.fields.map(({ ground }) => {
    let hours = 0
    for (let run = 0; run < problem.runs; run++) hours += Math.min(problem.hours, firstPlantingHour(problem, run, ground))
    return hours
  })
  return problem.fields.map((_, field) => field).sort((a, b) => first[a]! - first[b]! || a - b)
}

/** The same order with the fields that are unlikely before rain behind the others, whose chances can only gain by it. */
export function unlikelyLast(problem: PlanProblem, list: readonly number[], timeline: Timeline = createTimeline(problem.fields.length)): number[] {
  const { doneRuns } = orderFigures(problem, list, timeline)
  const likely = (field: number) => plottingPosition(doneRuns[field]!, problem.runs) >= UNLIKELY_BELOW
  return [...list.filter(likely), ...list.filter(field => !likely(field))]
}
