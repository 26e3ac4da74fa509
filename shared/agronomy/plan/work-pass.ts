import { ACRE_TOLERANCE, PASS_COUNT, type PlanProblem } from './problem'
import { addPiece, hourWhenDone, openNode, type Timeline } from './timeline'

/** How far the pass before must be ahead before a pass starts: the lesser of a share of the field and so many acres. */
export const LEAD_SHARE = 0.25
export const LEAD_AC = 20

/** One machine's visit to one field. */
export interface Visit {
  machine: number
  field: number
  /** pass that must stay ahead; −1: none */
  leader: number
  /** hour at which the machine is there, ready to work */
  arriveAt: number
  /** hours before and after which the pass may not be worked in this field */
  notBefore: number
  notAfter: number
}

/**
 * Works one pass of one field in one run, hour by hour as ground, shift and the pass before allow.
 *
 * It starts once the pass before has its lead, never overtakes it, stops when the ground stops being fit, at rain
 * and at the end of the shift, and goes on where it stopped.
 *
 * @param timeline - gets the node's pieces; the leader's are in it already
 * @returns hour at which the machine leaves: the last acre's, or `notAfter`; Infinity when the field keeps it to the end
 *   of the horizon. It waits for ground that isn't fit, however long: giving up would need to know the future.
 */
export function workPass(problem: PlanProblem, run: number, visit: Visit, timeline: Timeline): number {
  const { machine, field, leader, arriveAt } = visit
  const { rateAcPerHour, working, pass } = problem.machines[machine]!
  const { areaAc, doneAc, ground } = problem.fields[field]!
  const node = field * PASS_COUNT + pass
  openNode(timeline, node, machine)
  const { bounds, starts } = problem.workable[ground]!
  const list = run * PASS_COUNT + pass
  let stretch = starts[list]!
  const lastStretch = starts[list + 1]!
  let acres = doneAc[pass]!
  let hour = Math.max(arriveAt, visit.notBefore, leadHour(problem, visit, acres, timeline))
  for (let shift = 0; stretch < lastStretch && shift < working.length && hour < visit.notAfter;) {
    const from = Math.max(hour, bounds[stretch]!, working[shift]!)
    const to = Math.min(bounds[stretch + 1]!, working[shift + 1]!, visit.notAfter)
    if (from < to) {
      acres = leader < 0
        ? workAlone(timeline, node, from, to, acres, areaAc, rateAcPerHour)
        : workBehind(timeline, node, field * PASS_COUNT + leader, doneAc[leader]!, from, to, acres, areaAc, rateAcPerHour)
      if (acres >= areaAc) return timeline.finishedAt[node] = timeline.to[timeline.used - 1]!
      hour = to
    }
    if (bounds[stretch + 1]! <= working[shift + 1]!) stretch += 2
    else shift += 2
  }
  return Math.max(arriveAt, visit.notAfter)
}

/** Hour at which the pass before is far enough ahead. */
function leadHour(problem: PlanProblem, { field, leader }: Visit, acres: number, timeline: Timeline): number {
  if (leader < 0) return 0
  const { areaAc, doneAc } = problem.fields[field]!
  const wanted = Math.min(areaAc, acres + Math.min(areaAc * LEAD_SHARE, LEAD_AC))
  return hourWhenDone(timeline, field * PASS_COUNT + leader, wanted - ACRE_TOLERANCE, doneAc[leader]!)
}

/** Nothing ahead to wait for. @returns acres done at the end */
function workAlone(timeline: Timeline, node: number, from: number, to: number, acres: number, areaAc: number, rate: number): number {
  const left = areaAc - acres
  // An acre that is only missing by rounding must not wait for the next fit hour.
  const finishes = left <= rate * (to - from) + ACRE_TOLERANCE
  const until = finishes ? Math.min(to, from + left / rate) : to
  const after = finishes ? areaAc : acres + rate * (to - from)
  addPiece(timeline, node, from, until, acres, after)
  return after
}

/** Works up to the pass ahead, then at its pace. @returns acres done at the end */
function workBehind(
  timeline: Timeline, node: number, ahead: number, aheadDoneAc: number,
  from: number, to: number, acres: number, areaAc: number, rate: number,
): number {
  let piece = timeline.first[ahead]!
  const lastPiece = piece + timeline.count[ahead]!
  for (let hour = from; hour < to;) {
    while (piece < lastPiece && timeline.to[piece]! <= hour) piece++
    const moving = piece < lastPiece && timeline.from[piece]! <= hour
    const aheadRate = moving ? (timeline.acTo[piece]! - timeline.acFrom[piece]!) / (timeline.to[piece]! - timeline.from[piece]!) : 0
    const aheadAcres = moving
      ? timeline.acFrom[piece]! + aheadRate * (hour - timeline.from[piece]!)
      : piece > timeline.first[ahead]! ? timeline.acTo[piece - 1]! : aheadDoneAc
    let until = Math.min(to, moving ? timeline.to[piece]! : piece < lastPiece ? timeline.from[piece]! : to)
    const gap = aheadAcres - acres
    const pace = gap <= ACRE_TOLERANCE ? Math.min(rate, aheadRate) : rate
    if (gap > ACRE_TOLERANCE && rate > aheadRate) until = Math.min(until, hour + gap / (rate - aheadRate))
    if (pace > 0) {
      const left = areaAc - acres
      const finishes = left <= pace * (until - hour) + ACRE_TOLERANCE
      if (finishes) until = Math.min(until, hour + left / pace)
      const after = finishes ? areaAc : acres + pace * (until - hour)
      addPiece(timeline, node, hour, until, acres, after)
      if (finishes) return areaAc
      acres = after
    }
    hour = until
  }
  return acres
}
