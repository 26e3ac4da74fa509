import { assignMachines } from './assign-machines'
import { DIG, hasWorkLeft, PASS_COUNT, PLANT, type PlanProblem } from './problem'
import { simulate } from './simulate'
import { createTimeline, type Timeline } from './timeline'

/** Part of the acres opened before rain that must be planted before it for opening them to be worth while. A design choice. */
const WORTH_OPENING_SHARE = 0.5

/** Order and problem with some fields held back until the rain has started, and put last so that no machine waits at them. */
export interface HeldPlan { problem: PlanProblem, list: number[] }

/**
 * Fields to leave undug: unlikely to be planted before rain, not begun, and of which the order, worked down as it
 * stands, would open ground before the rain that it mostly would not plant. Open ground that is rained on takes longer
 * to dry and crusts: common practice, no source.
 *
 * Each field that is held back leaves time for those behind it, so they are judged anew.
 *
 * @param list - fields in the order to do them
 * @param unlikely - those of them that are unlikely before rain, in the same order
 * @param run - the middle run
 */
export function fieldsToLeaveUndug(problem: PlanProblem, list: readonly number[], unlikely: readonly number[], run: number): number[] {
  const timeline = createTimeline(problem.fields.length)
  const held: number[] = []
  for (;;) {
    const plan = holdBack(problem, list, held, run)
    simulate(plan.problem, assignMachines(plan.problem, plan.list).sequences, run, PLANT, timeline)
    const next = unlikely.find(field => !held.includes(field) && liesOpen(problem, field, run, timeline))
    if (next === undefined) return held
    held.push(next)
  }
}

/** The order with fields held back until the run's rain. */
export function holdBack(problem: PlanProblem, list: readonly number[], held: readonly number[], run: number): HeldPlan {
  return {
    problem: {
      ...problem,
      fields: problem.fields.map((field, index) => held.includes(index) ? { ...field, heldUntil: rainOf(problem, index, run) } : field),
    },
    list: [...list.filter(field => !held.includes(field)), ...held],
  }
}

function liesOpen(problem: PlanProblem, field: number, run: number, timeline: Timeline): boolean {
  const { doneAc } = problem.fields[field]!
  const rainAt = rainOf(problem, field, run)
  if (rainAt === Infinity || !hasWorkLeft(problem.fields[field]!, DIG) || doneAc[DIG]! > 0) return false
  const opened = acresBy(timeline, field * PASS_COUNT + DIG, rainAt)
  return opened > 0 && acresBy(timeline, field * PASS_COUNT + PLANT, rainAt) < WORTH_OPENING_SHARE * opened
}

/** Acres that the plan itself gets done of a node by an hour. */
export function acresBy(timeline: Timeline, node: number, hour: number): number {
  let acres = 0
  for (let piece = timeline.first[node]!; piece < timeline.first[node]! + timeline.count[node]!; piece++) {
    const [from, to] = [timeline.from[piece]!, timeline.to[piece]!]
    if (from < hour) acres += (timeline.acTo[piece]! - timeline.acFrom[piece]!) * Math.min(1, (hour - from) / (to - from))
  }
  return acres
}

function rainOf({ fields, rainAt, runs }: PlanProblem, field: number, run: number): number {
  return rainAt[fields[field]!.ground * runs + run]!
}
