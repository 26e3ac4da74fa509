import { assignField, emptyAssignment, unassignField, type Assignment } from './assign-machines'
import { plottingPosition, quantileByRank } from './chance'
import { orderFigures, worthWhenLastUsd } from './order-figures'
import { PASS_COUNT, PLANT, type PlanProblem } from './problem'
import { clearField, visitField } from './simulate'
import { createTimeline, type Timeline } from './timeline'
import { planterHours, plantedWorthUsd, stakeUsd } from './worth'

/**
 * Chance of being planted before rain under which a field counts as unlikely: under 1 in 5, which the weather service
 * calls a 'slight chance'. A setting.
 */
export const UNLIKELY_BELOW = 0.2

/** Where every machine is, in every run, once the fields ranked so far are done: machine · runs + run. */
interface Crew { freeAt: Float64Array, at: Int32Array }

/** What comes of taking a field next: planting has started in 8 of 10 runs, and is finished in half of them, by these hours. */
interface Prospect { savedPerHourUsd: number, startsAt: number, finishesAt: number }
const SURE_ENOUGH = 0.8

/**
 * First version of the order: one field after another, greedy.
 *
 * At each step every field left is simulated as the next one in all runs. Of those whose planting has started in 8 of
 * 10 runs before another could be finished in half of them (so that the planter isn't sent to stand at wet ground while
 * a whole field could be planted), the one that saves most per planter hour is taken: (worth when taken next − worth
 * when left to the last) ÷ the planter hours it needs. In the end, fields that are unlikely before rain go behind those that are likely.
 * Ties fall to the field that comes first in the problem. It is no search: a later version improves on it.
 *
 * @returns fields in the order to do them
 */
export function rankFields(problem: PlanProblem): number[] {
  const timeline = createTimeline(problem.fields.length)
  const all = problem.fields.map((_, field) => field)
  const lastUsd = worthWhenLastUsd(problem, byStakePerHour(problem, all), timeline)
  const crew: Crew = {
    freeAt: new Float64Array(problem.machines.length * problem.runs),
    at: new Int32Array(problem.machines.length * problem.runs).fill(-1),
  }
  const assignment = emptyAssignment(problem)
  const list: number[] = []
  while (list.length < all.length) {
    const left = all.filter(field => !list.includes(field))
    const prospects = left.map(field => prospectOf(problem, field, lastUsd[field]!, crew, assignment, timeline))
    const next = left[bestProspect(prospects)]!
    assignField(problem, next, assignment)
    for (let run = 0; run < problem.runs; run++) workField(problem, next, run, assignment, crew, timeline, true)
    list.push(next)
  }
  return likelyFirst(problem, list, timeline)
}

/** A rough order to start from: what each planter hour has at stake. */
function byStakePerHour(problem: PlanProblem, fields: readonly number[]): number[] {
  const rate = problem.machines.find(machine => machine.pass === PLANT)?.rateAcPerHour ?? 1
  const perHour = fields.map((field) => {
    let usd = 0
    for (let run = 0; run < problem.runs; run++) usd += stakeUsd(problem, run, field) / problem.runs
    return known(usd / planterHours(problem.fields[field]!, rate))
  })
  return [...fields].sort((a, b) => perHour[b]! - perHour[a]! || a - b)
}

/** Simulates a field as the next one, in all runs, and leaves everything as it was. */
function prospectOf(problem: PlanProblem, field: number, lastUsd: number, crew: Crew, assignment: Assignment, timeline: Timeline): Prospect {
  const booked = assignment.bookedHours.slice()
  assignField(problem, field, assignment)
  const planter = assignment.machineOf[field * PASS_COUNT + PLANT]!
  const node = field * PASS_COUNT + PLANT
  const starts = new Float64Array(problem.runs)
  const finishes = new Float64Array(problem.runs)
  let worthUsd = 0
  for (let run = 0; run < problem.runs; run++) {
    workField(problem, field, run, assignment, crew, timeline, false)
    worthUsd += plantedWorthUsd(problem, timeline, run, field) / problem.runs
    starts[run] = timeline.count[node]! > 0 ? timeline.from[timeline.first[node]!]! : Infinity
    finishes[run] = timeline.finishedAt[node]!
  }
  unassignField(problem, field, assignment, booked)
  const hours = planter < 0 ? NaN : planterHours(problem.fields[field]!, problem.machines[planter]!.rateAcPerHour)
  return {
    savedPerHourUsd: known((worthUsd - lastUsd) / hours),
    startsAt: quantileByRank(starts, SURE_ENOUGH),
    finishesAt: quantileByRank(finishes, 0.5),
  }
}

/** Works the passes of one field through planting, behind what the crew has done. @param moves - whether the crew stays there */
function workField(problem: PlanProblem, field: number, run: number, { machineOf }: Assignment, crew: Crew, timeline: Timeline, moves: boolean): void {
  timeline.used = 0
  clearField(problem, field, timeline)
  for (let pass = 0; pass <= PLANT; pass++) {
    const machine = machineOf[field * PASS_COUNT + pass]!
    if (machine < 0) continue
    const place = machine * problem.runs + run
    const after = visitField(problem, machine, field, run, crew.freeAt[place]!, crew.at[place]!, timeline)
    if (!moves || Number.isNaN(after)) continue
    crew.freeAt[place] = after
    crew.at[place] = field
  }
}

/** The most saved per planter hour among those that could start before any could be finished. */
function bestProspect(prospects: readonly Prospect[]): number {
  const firstDone = Math.min(...prospects.map(prospect => prospect.finishesAt))
  const noneStarts = !prospects.some(prospect => prospect.startsAt < firstDone)
  let best = -1
  for (const [index, prospect] of prospects.entries()) {
    if (!noneStarts && prospect.startsAt >= firstDone) continue
    if (best < 0 || prospect.savedPerHourUsd > prospects[best]!.savedPerHourUsd) best = index
  }
  return best
}

/** Fields that are unlikely before rain go behind the others, which can only gain by it. */
function likelyFirst(problem: PlanProblem, list: readonly number[], timeline: Timeline): number[] {
  const { doneRuns } = orderFigures(problem, list, timeline)
  const likely = (field: number) => plottingPosition(doneRuns[field]!, problem.runs) >= UNLIKELY_BELOW
  return [...list.filter(likely), ...list.filter(field => !likely(field))]
}

/** What isn't known ranks last. */
function known(usd: number): number {
  return Number.isNaN(usd) ? -Infinity : usd
}
