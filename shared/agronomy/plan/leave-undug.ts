import { assignMachines } from './assign-machines'
import { DIG, hasWorkLeft, PASS_COUNT, PLANT, type PlanProblem } from './problem'
import { simulate } from './simulate'
import { createTimeline } from './timeline'

/**
 * Fields to leave undug: unlikely to be planted before rain, not begun, and reached by the digger before rain if the
 * order were simply worked down. Open ground that is rained on takes longer to dry and crusts: common practice, no
 * source.
 *
 * @param list - fields in the order to do them
 * @param unlikely - those of them that are unlikely before rain
 * @param run - the middle run
 */
export function fieldsToLeaveUndug(problem: PlanProblem, list: readonly number[], unlikely: readonly number[], run: number): number[] {
  const timeline = createTimeline(problem.fields.length)
  simulate(problem, assignMachines(problem, list).sequences, run, PLANT, timeline)
  return unlikely.filter((field) => {
    const { ground, doneAc } = problem.fields[field]!
    const node = field * PASS_COUNT + DIG
    if (!hasWorkLeft(problem.fields[field]!, DIG) || doneAc[DIG]! > 0 || timeline.count[node] === 0) return false
    return timeline.from[timeline.first[node]!]! < problem.rainAt[ground * problem.runs + run]! && problem.rainAt[ground * problem.runs + run]! < Infinity
  })
}

/**
 * The plan as it is drawn: the order in the middle run, with the fields to leave undug held back until the rain has
 * started and put last, so that no machine waits at them.
 */
export function holdBack(problem: PlanProblem, list: readonly number[], held: readonly number[], run: number): { problem: PlanProblem, list: number[] } {
  return {
    problem: {
      ...problem,
      fields: problem.fields.map((field, index) => held.includes(index) ? { ...field, heldUntil: problem.rainAt[field.ground * problem.runs + run]! } : field),
    },
    list: [...list.filter(field => !held.includes(field)), ...list.filter(field => held.includes(field))],
  }
}
