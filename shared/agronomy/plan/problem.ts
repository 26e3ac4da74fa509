import { PASSES } from '../ground'

/** Passes by number: index into PASSES, Dig 0 to Spray 4. */
export const PASS_COUNT = PASSES.length
export const DIG = PASSES.indexOf('dig')
export const PLANT = PASSES.indexOf('plant')
export const ROLL = PASSES.indexOf('roll')
export const SPRAY = PASSES.indexOf('spray')

/**
 * What an order is made for. Hours are counted from the start of the plan, fields, machines, grounds and runs by
 * their place in the arrays. Fields come sorted by id, so that ties fall the same way whatever the input's order.
 */
export interface PlanProblem {
  hours: number
  runs: number
  fields: readonly PlanField[]
  machines: readonly PlanMachine[]
  /** when each pass may be worked, one element a ground: stretch list run · 5 + pass */
  workable: readonly StretchLists[]
  /** hour at which the run's rain starts on each ground, ground · runs + run; Infinity: not within the horizon */
  rainAt: Float64Array
}

export interface PlanField {
  id: string
  areaAc: number
  /** acres done of each pass, at most the area */
  doneAc: Float64Array
  /** 1 for each pass that the field gets */
  needed: Uint8Array
  /** fields alike in place, soil and crop share a ground */
  ground: number
  /** hour before which nothing is begun in it; 0: not held back */
  heldUntil: number
  /** share of the highest yield kept by planting in each hour of the plan, 0 to 1; NaN: not known */
  shareByHour: Float64Array
  /** share kept by waiting until the field is fit again after each run's rain, 0 to 1; NaN: not known */
  shareAfter: Float64Array
  /** goal yield times price, $/ac; NaN: not known */
  usdPerAc: number
}

export interface PlanMachine {
  id: string
  pass: number
  rateAcPerHour: number
  /** when it may work, pairs of hours, rising and apart */
  working: Float64Array
  /** working hours from where it stands to starting work in each field; 0 for the field that it stands in */
  firstMoveHours: Float64Array
  /** working hours from stopping work in one field to starting in another, from · fields + to */
  moveHours: Float64Array
}

/** Lists of stretches end to end: list i is bounds[starts[i]] to bounds[starts[i + 1]], pairs [from, to). */
export interface StretchLists {
  starts: Int32Array
  bounds: Float64Array
}

/** For each machine, the fields in the order in which it goes to them. */
export type Sequences = readonly (readonly number[])[]

/** Acres under which a pass counts as finished. */
export const ACRE_TOLERANCE = 1e-6

/** True when the field still needs acres of the pass. */
export function hasWorkLeft(field: PlanField, pass: number): boolean {
  return field.needed[pass] === 1 && field.areaAc - field.doneAc[pass]! > ACRE_TOLERANCE
}

/** The pass that goes before a pass in a field's chain; -1 when it is the first. */
export function passBefore(field: PlanField, pass: number): number {
  for (let before = pass - 1; before >= 0; before--) if (field.needed[before] === 1) return before
  return -1
}
