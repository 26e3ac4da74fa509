import { hoursForArea } from '../machine/capacity'
import { hasWorkLeft, PASS_COUNT, type PlanProblem } from './problem'
import { afterWorking } from './simulate'

/** Who goes where when the fields are taken in a certain order. */
export interface Assignment {
  /** for each machine the fields that it goes to, in turn */
  sequences: number[][]
  /** machine of each pass of each field, field · 5 + pass; −1: nothing left to do, or no machine for it */
  machineOf: Int32Array
  /** working hours that each machine is booked for */
  bookedHours: Float64Array
}

/** Nobody assigned to anything yet. */
export function emptyAssignment(problem: PlanProblem): Assignment {
  return {
    sequences: problem.machines.map(() => []),
    machineOf: new Int32Array(problem.fields.length * PASS_COUNT).fill(-1),
    bookedHours: new Float64Array(problem.machines.length),
  }
}

/**
 * Gives each pass of the fields, taken one after another, to the machine that would be through with it first if the
 * ground were always fit; the one that comes first in the list when two are alike.
 *
 * The choice is the same for all runs: nobody knows which of them will come true.
 *
 * @param list - fields in the order to do them
 */
export function assignMachines(problem: PlanProblem, list: readonly number[]): Assignment {
  const assignment = emptyAssignment(problem)
  for (const field of list) assignField(problem, field, assignment)
  return assignment
}

/** Adds one field behind those that are assigned already. */
export function assignField(problem: PlanProblem, field: number, assignment: Assignment): void {
  for (let pass = 0; pass < PASS_COUNT; pass++) {
    const machine = soonest(problem, field, pass, assignment)
    assignment.machineOf[field * PASS_COUNT + pass] = machine
    if (machine < 0) continue
    assignment.bookedHours[machine] = bookedAfter(problem, machine, field, assignment)
    assignment.sequences[machine]!.push(field)
  }
}

/** Takes back the field that was added last. */
export function unassignField(problem: PlanProblem, field: number, assignment: Assignment, bookedHours: Float64Array): void {
  for (let pass = 0; pass < PASS_COUNT; pass++) {
    const machine = assignment.machineOf[field * PASS_COUNT + pass]!
    if (machine >= 0) assignment.sequences[machine]!.pop()
    assignment.machineOf[field * PASS_COUNT + pass] = -1
  }
  assignment.bookedHours.set(bookedHours)
}

function soonest(problem: PlanProblem, field: number, pass: number, assignment: Assignment): number {
  let best = -1
  if (!hasWorkLeft(problem.fields[field]!, pass)) return best
  let least = Infinity
  for (let machine = 0; machine < problem.machines.length; machine++) {
    if (problem.machines[machine]!.pass !== pass) continue
    const through = afterWorking(problem.machines[machine]!.working, 0, bookedAfter(problem, machine, field, assignment))
    if (best < 0 || through < least) [best, least] = [machine, through]
  }
  return best
}

function bookedAfter(problem: PlanProblem, machine: number, field: number, { sequences, bookedHours }: Assignment): number {
  const { firstMoveHours, moveHours, rateAcPerHour, pass } = problem.machines[machine]!
  const at = sequences[machine]!.at(-1)
  const move = at === undefined ? firstMoveHours[field]! : moveHours[at * problem.fields.length + field]!
  const { areaAc, doneAc } = problem.fields[field]!
  return bookedHours[machine]! + move + hoursForArea(areaAc - doneAc[pass]!, rateAcPerHour)
}
