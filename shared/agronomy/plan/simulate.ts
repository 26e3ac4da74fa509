import { hasWorkLeft, passBefore, PASS_COUNT, PLANT, ROLL, SPRAY, type PlanProblem, type Sequences } from './problem'
import { openNode, type Timeline } from './timeline'
import { workPass, type Visit } from './work-pass'

/**
 * Hours after the last acre is planted by which rolling must be over: later it breaks seedlings underground (UMN
 * rolling trials 2008–2010: before or within hours of planting, not 'more than a few days' after). A setting.
 */
export const ROLL_CLOSES_HOURS = 48
/** Hours after planting by which a pre-emerge must be on: three days, as most soybean labels say (ISU 2017). A setting. */
export const SPRAY_CLOSES_HOURS = 72

/**
 * One order in one run: every machine walks its sequence of fields.
 *
 * A machine drives (working hours only), works the field as workPass says, and goes on when the field is finished. It
 * waits at a field that isn't fit, through rain too, so nothing that it does depends on what is yet to come. Passes are walked one after another, because a pass
 * depends on earlier passes only; within a pass each machine's fields follow each other.
 *
 * @param sequences - for each machine the fields it goes to, each field under one machine a pass
 * @param run - 0 to runs − 1
 * @param throughPass - last pass to walk; later ones are left as they were
 * @param timeline - overwritten; allocate it once
 */
export function simulate(problem: PlanProblem, sequences: Sequences, run: number, throughPass: number, timeline: Timeline): void {
  clearTimeline(problem, timeline)
  for (let pass = 0; pass <= throughPass; pass++) {
    for (let machine = 0; machine < problem.machines.length; machine++) {
      if (problem.machines[machine]!.pass === pass) walk(problem, machine, sequences[machine]!, run, timeline)
    }
  }
}

/** Nothing worked yet: what isn't needed or was done before the plan is finished at hour 0. */
export function clearTimeline(problem: PlanProblem, timeline: Timeline): void {
  timeline.used = 0
  for (let field = 0; field < problem.fields.length; field++) clearField(problem, field, timeline)
}

/** The same for one field. */
export function clearField(problem: PlanProblem, field: number, timeline: Timeline): void {
  for (let pass = 0; pass < PASS_COUNT; pass++) {
    const node = field * PASS_COUNT + pass
    openNode(timeline, node, -1)
    if (!hasWorkLeft(problem.fields[field]!, pass)) timeline.finishedAt[node] = 0
  }
}

function walk(problem: PlanProblem, machine: number, fields: readonly number[], run: number, timeline: Timeline): void {
  let freeAt = 0
  let at = -1
  for (const field of fields) {
    const after = visitField(problem, machine, field, run, freeAt, at, timeline)
    if (Number.isNaN(after)) continue
    freeAt = after
    at = field
  }
}

/**
 * Sends a machine to a field.
 *
 * @param freeAt - hour from which it is free
 * @param at - field that it is in; −1: where it stood when the plan starts
 * @returns hour at which it is free again; NaN when it has nothing to do there and doesn't go
 */
export function visitField(problem: PlanProblem, machine: number, field: number, run: number, freeAt: number, at: number, timeline: Timeline): number {
  const { pass, working, firstMoveHours, moveHours } = problem.machines[machine]!
  const target = problem.fields[field]!
  if (!hasWorkLeft(target, pass)) return NaN
  const move = at < 0 ? firstMoveHours[field]! : moveHours[at * problem.fields.length + field]!
  const visit: Visit = { machine, field, leader: passBefore(target, pass), arriveAt: afterWorking(working, freeAt, move), notBefore: target.heldUntil, notAfter: Infinity }
  if (pass === ROLL) visit.notAfter = timeline.finishedAt[field * PASS_COUNT + PLANT]! + ROLL_CLOSES_HOURS
  if (pass === SPRAY) followPlanting(visit, timeline)
  if (visit.leader >= 0 && !hasWorkLeft(target, visit.leader)) visit.leader = -1
  return workPass(problem, run, visit, timeline)
}

/** Spray follows the roller, or planting once it is too late to roll. */
function followPlanting(visit: Visit, timeline: Timeline): void {
  const planted = timeline.finishedAt[visit.field * PASS_COUNT + PLANT]!
  visit.notAfter = planted + SPRAY_CLOSES_HOURS
  if (visit.leader === ROLL && planted < Infinity && timeline.finishedAt[visit.field * PASS_COUNT + ROLL] === Infinity) {
    visit.leader = PLANT
    visit.notBefore = Math.max(visit.notBefore, planted + ROLL_CLOSES_HOURS)
  }
}

/** Hour at which so many working hours have gone by since an hour; Infinity when the shifts don't reach. */
export function afterWorking(working: Float64Array, since: number, hours: number): number {
  if (hours === 0) return since
  let left = hours
  for (let shift = 0; shift < working.length; shift += 2) {
    const from = Math.max(since, working[shift]!)
    const to = working[shift + 1]!
    if (from >= to) continue
    if (from + left <= to) return from + left
    left -= to - from
  }
  return Infinity
}
