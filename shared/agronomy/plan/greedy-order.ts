import { assignField, emptyAssignment, unassignField, type Assignment } from './assign-machines'
import { quantileByRank } from './chance'
import { PASS_COUNT, PLANT, type PlanProblem } from './problem'
import { clearField, visitField } from './simulate'
import { createTimeline, type Timeline } from './timeline'
import { planterHours, plantedWorthUsd, stakeUsd } from './worth'

/** Where every machine is, in every run, once the fields ranked so far are done: machine · runs + run. */
interface Crew { freeAt: Float64Array, at: Int32Array }

/** What comes of taking a field next: for each pass, the hours by which it has started in 8 of 10 runs, and is finished in half of them. */
interface Prospect { savedPerHourUsd: number, startsAt: Float64Array, finishesAt: Float64Array }
const SURE_ENOUGH = 0.8
/** Less than this is rounding, not worth, $. */
const CENT = 0.01

/** Machines that must not be kept waiting: the planter only, or all that work before planting ends. */
export type KeepBusy = 'planter' | 'every machine'

/**
 * One field after another, greedy.
 *
 * At each step every field left is simulated as the next one in all runs. Fields at which a machine would still wait, in
 * 2 of 10 runs or more, when it could have finished another whole field are passed over. Of the others the one that
 * saves most per planter hour is taken: (worth when taken next − worth when left to the last) ÷ the planter hours it
 * needs. When two save the same, as when both are done before rain either way, the one with more at stake per planter
 * hour is taken, then the one that comes first in the problem.
 *
 * @returns fields in the order to do them
 */
export function greedyOrder(problem: PlanProblem, keepBusy: KeepBusy): number[] {
  const timeline = createTimeline(problem.fields.length)
  const all = byStakePerHour(problem)
  const lastUsd = worthBehindAllUsd(problem, all, timeline)
  const crew = newCrew(problem)
  const assignment = emptyAssignment(problem)
  const list: number[] = []
  while (list.length < all.length) {
    const left = all.filter(field => !list.includes(field))
    const prospects = left.map(field => prospectOf(problem, field, lastUsd[field]!, crew, assignment, timeline))
    const next = left[bestProspect(prospects, keepBusy === 'planter' ? PLANT : 0)]!
    sendCrew(problem, next, assignment, crew, timeline)
    list.push(next)
  }
  return list
}

function newCrew(problem: PlanProblem): Crew {
  return {
    freeAt: new Float64Array(problem.machines.length * problem.runs),
    at: new Int32Array(problem.machines.length * problem.runs).fill(-1),
  }
}

/** Has the crew work a field, in every run, behind what it has done. */
function sendCrew(problem: PlanProblem, field: number, assignment: Assignment, crew: Crew, timeline: Timeline): void {
  assignField(problem, field, assignment)
  for (let run = 0; run < problem.runs; run++) workField(problem, field, run, assignment, crew, timeline, true)
}

/** Worth of each field, mean over the runs, if it were begun when the crew is through with all of them: a yardstick for 'last'. */
function worthBehindAllUsd(problem: PlanProblem, list: readonly number[], timeline: Timeline): Float64Array {
  const crew = newCrew(problem)
  const assignment = emptyAssignment(problem)
  for (const field of list) sendCrew(problem, field, assignment, crew, timeline)
  const worthUsd = new Float64Array(problem.fields.length)
  for (let field = 0; field < problem.fields.length; field++) {
    for (let run = 0; run < problem.runs; run++) {
      workField(problem, field, run, assignment, crew, timeline, false)
      worthUsd[field]! += plantedWorthUsd(problem, timeline, run, field) / problem.runs
    }
  }
  return worthUsd
}

/** The fields by what each hour of the planter has at stake. */
export function byStakePerHour(problem: PlanProblem): number[] {
  const fields = problem.fields.map((_, field) => field)
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
  const starts = Array.from({ length: PLANT + 1 }, () => new Float64Array(problem.runs))
  const finishes = Array.from({ length: PLANT + 1 }, () => new Float64Array(problem.runs))
  let worthUsd = 0
  for (let run = 0; run < problem.runs; run++) {
    workField(problem, field, run, assignment, crew, timeline, false)
    worthUsd += plantedWorthUsd(problem, timeline, run, field) / problem.runs
    for (let pass = 0; pass <= PLANT; pass++) {
      const node = field * PASS_COUNT + pass
      finishes[pass]![run] = timeline.finishedAt[node]!
      starts[pass]![run] = timeline.finishedAt[node] === 0 ? NOTHING_TO_DO : timeline.count[node]! > 0 ? timeline.from[timeline.first[node]!]! : Infinity
    }
  }
  unassignField(problem, field, assignment, booked)
  const hours = planter < 0 ? Number.NaN : planterHours(problem.fields[field]!, problem.machines[planter]!.rateAcPerHour)
  return {
    savedPerHourUsd: known((worthUsd - lastUsd) / hours),
    startsAt: Float64Array.from(starts, hoursOfRuns => quantileByRank(hoursOfRuns, SURE_ENOUGH)),
    finishesAt: Float64Array.from(finishes, hoursOfRuns => quantileByRank(hoursOfRuns, 0.5)),
  }
}

/** Start of a pass that has nothing left: it keeps no machine waiting. */
const NOTHING_TO_DO = -1

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

/** The most saved per planter hour among those that keep no machine waiting, from the first pass that counts on. */
function bestProspect(prospects: readonly Prospect[], firstPass: number): number {
  const firstDone = Float64Array.from({ length: PLANT + 1 }, (_, pass) =>
    Math.min(...prospects.map(prospect => prospect.startsAt[pass] === NOTHING_TO_DO ? Infinity : prospect.finishesAt[pass]!)))
  const keepsWaiting = ({ startsAt }: Prospect) => startsAt.some((hour, pass) => pass >= firstPass && hour >= firstDone[pass]!)
  const noneStarts = prospects.every(keepsWaiting)
  let best = -1
  for (const [index, prospect] of prospects.entries()) {
    if (!noneStarts && keepsWaiting(prospect)) continue
    if (best < 0 || prospect.savedPerHourUsd > prospects[best]!.savedPerHourUsd + CENT) best = index
  }
  return best
}

/** What isn't known ranks last. */
function known(usd: number): number {
  return Number.isNaN(usd) ? -Infinity : usd
}
