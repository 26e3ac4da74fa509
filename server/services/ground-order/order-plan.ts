import { PASSES } from '../../../shared/agronomy/ground'
import { yieldShare } from '../../../shared/agronomy/crop/yield-share'
import { assignMachines, type Assignment } from '../../../shared/agronomy/plan/assign-machines'
import { plottingPosition } from '../../../shared/agronomy/plan/chance'
import { fieldsToLeaveUndug, holdBack } from '../../../shared/agronomy/plan/leave-undug'
import { orderFigures, worthWhenLastUsd, type OrderFigures } from '../../../shared/agronomy/plan/order-figures'
import { PASS_COUNT, PLANT, SPRAY, type PlanField, type PlanProblem } from '../../../shared/agronomy/plan/problem'
import { rankFields, UNLIKELY_BELOW } from '../../../shared/agronomy/plan/rank-fields'
import { simulate } from '../../../shared/agronomy/plan/simulate'
import { createTimeline, type Timeline } from '../../../shared/agronomy/plan/timeline'
import { planterHours, stakeUsd } from '../../../shared/agronomy/plan/worth'
import type { FieldRow } from '../../db/queries/fields'
import type { MachineRow } from '../../db/queries/machines'
import type { Ground } from './field-ground'
import { planMachine, whatMachineMisses } from './machine-hours'
import type { KnownField } from './rankable'

/** A field in the plan, with the ground it lies on. */
export interface PlannedField { known: KnownField, ground: Ground }

/** The order and all that it says. Fields go by their place in `fields`. */
export interface OrderPlan {
  fields: PlannedField[]
  machines: MachineRow[]
  problem: PlanProblem
  /** in the order to do them */
  list: number[]
  assignment: Assignment
  figures: OrderFigures
  lastUsd: Float64Array
  /** at stake by waiting in each run, $ */
  stakes: Float64Array[]
  planterHours: Float64Array
  unlikely: ReadonlySet<number>
  held: ReadonlySet<number>
  /** the plan as drawn, in the middle run */
  drawn: Timeline
}

/** Ranks the fields and works out what the order does. */
export function orderPlan(fields: PlannedField[], allFields: readonly FieldRow[], machines: readonly MachineRow[], startsAt: number, hours: number, middle: number): OrderPlan {
  const usable = machines.filter(machine => whatMachineMisses(machine) === null)
  const problem = planProblem(fields, allFields, usable, startsAt, hours)
  const timeline = createTimeline(fields.length)
  const list = rankFields(problem)
  const figures = orderFigures(problem, list, timeline)
  const assignment = assignMachines(problem, list)
  const unlikely = list.filter(field => plottingPosition(figures.doneRuns[field]!, problem.runs) < UNLIKELY_BELOW)
  const held = fieldsToLeaveUndug(problem, list, unlikely, middle)
  return {
    fields,
    machines: usable,
    problem,
    list,
    assignment,
    figures,
    lastUsd: worthWhenLastUsd(problem, list, timeline),
    stakes: fields.map((_, field) => Float64Array.from({ length: problem.runs }, (_, run) => stakeUsd(problem, run, field))),
    planterHours: Float64Array.from(fields, (_, field) => planterHours(problem.fields[field]!, problem.machines[assignment.machineOf[field * PASS_COUNT + PLANT]!]!.rateAcPerHour)),
    unlikely: new Set(unlikely),
    held: new Set(held),
    drawn: drawnTimeline(problem, list, held, middle),
  }
}

function drawnTimeline(problem: PlanProblem, list: readonly number[], held: readonly number[], middle: number): Timeline {
  const drawn = holdBack(problem, list, held, middle)
  const timeline = createTimeline(problem.fields.length)
  simulate(drawn.problem, assignMachines(drawn.problem, drawn.list).sequences, middle, SPRAY, timeline)
  return timeline
}

function planProblem(fields: readonly PlannedField[], allFields: readonly FieldRow[], machines: readonly MachineRow[], startsAt: number, hours: number): PlanProblem {
  const grounds = [...new Set(fields.map(({ ground }) => ground))]
  const runs = fields[0]!.known.place.runs.length
  const rows = fields.map(({ known }) => known.season.field)
  const rainAt = new Float64Array(grounds.length * runs)
  for (const { known, ground } of fields) rainAt.set(known.place.rainAt, grounds.indexOf(ground) * runs)
  const localHour = fields[0]!.known.place.ahead.hourOfDay.subarray(0, hours)
  return {
    hours,
    runs,
    fields: fields.map(field => planField(field, grounds.indexOf(field.ground), hours)),
    machines: machines.map(machine => planMachine(machine, rows, allFields, localHour, startsAt)),
    workable: grounds.map(ground => ground.workable),
    rainAt,
  }
}

function planField({ known, ground }: PlannedField, index: number, hours: number): PlanField {
  const { season, crop, table, place } = known
  const shareOn = (hour: number) => (table ? yieldShare(table, place.ahead.calendarDay[hour]!) : null) ?? Number.NaN
  return {
    id: season.field.id,
    areaAc: season.field.areaAc,
    doneAc: Float64Array.from(PASSES, (_, pass) => season.needed[pass] ? season.doneAc[pass]! : 0),
    needed: Uint8Array.from(PASSES, (_, pass) => season.needed[pass] ? 1 : 0),
    ground: index,
    heldUntil: 0,
    shareByHour: Float64Array.from({ length: hours }, (_, hour) => shareOn(hour)),
    shareAfter: Float64Array.from(ground.fitAgainAt, (again, run) => shareOn(hourOfWaiting(known, again, run, hours))),
    usdPerAc: crop ? crop.goalYieldBuPerAc * crop.priceUsdPerBu : Number.NaN,
  }
}

/**
 * Hour in which a field that waits is planted in a run: when it is fit again, the end of the spell when it isn't by
 * then, and the end of the horizon in a run without rain. The last two are the least that waiting takes.
 */
export function hourOfWaiting({ place }: KnownField, fitAgainAt: number, run: number, hours: number): number {
  if (place.rainAt[run] === Infinity) return hours - 1
  return Math.min(fitAgainAt, place.ahead.hourOfDay.length - 1)
}
