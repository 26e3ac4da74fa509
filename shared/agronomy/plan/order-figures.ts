import { assignMachines } from './assign-machines'
import { PLANT, type PlanProblem } from './problem'
import { simulate } from './simulate'
import { createTimeline, type Timeline } from './timeline'
import { isDoneBeforeRain, plantedWorthUsd } from './worth'

/** What an order does for each field, over all runs. */
export interface OrderFigures {
  /** mean worth of what is planted before rain, $; NaN: not known */
  worthUsd: Float64Array
  /** runs in which planting is finished before rain */
  doneRuns: Int32Array
}

/**
 * Simulates an order in every run.
 *
 * @param list - fields in the order to do them
 */
export function orderFigures(problem: PlanProblem, list: readonly number[], timeline: Timeline = createTimeline(problem.fields.length)): OrderFigures {
  const { sequences } = assignMachines(problem, list)
  const worthUsd = new Float64Array(problem.fields.length)
  const doneRuns = new Int32Array(problem.fields.length)
  for (let run = 0; run < problem.runs; run++) {
    simulate(problem, sequences, run, PLANT, timeline)
    for (const field of list) {
      worthUsd[field]! += plantedWorthUsd(problem, timeline, run, field) / problem.runs
      if (isDoneBeforeRain(problem, timeline, run, field)) doneRuns[field]!++
    }
  }
  return { worthUsd, doneRuns }
}

/**
 * Worth of each field if the order stayed as it is but this field went last, mean over the runs, $.
 *
 * @returns one element a field; NaN: not known
 */
export function worthWhenLastUsd(problem: PlanProblem, list: readonly number[], timeline: Timeline = createTimeline(problem.fields.length)): Float64Array {
  const worthUsd = new Float64Array(problem.fields.length)
  for (const field of list) {
    const { sequences } = assignMachines(problem, [...list.filter(other => other !== field), field])
    for (let run = 0; run < problem.runs; run++) {
      simulate(problem, sequences, run, PLANT, timeline)
      worthUsd[field]! += plantedWorthUsd(problem, timeline, run, field) / problem.runs
    }
  }
  return worthUsd
}
