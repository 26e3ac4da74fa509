import { PASS_COUNT } from './problem'

/**
 * What happens in one run under one order: for every pass of every field (node field · 5 + pass) the pieces of work,
 * each at one steady rate. Made once, filled again for every run.
 */
export interface Timeline {
  /** pieces of a node: first, first + 1, …, first + count − 1 */
  first: Int32Array
  count: Int32Array
  /** hour in which the last acre is done; 0 when nothing was left, Infinity when it isn't finished within the horizon */
  finishedAt: Float64Array
  /** machine that works the node; −1: none */
  machine: Int32Array
  /** pieces in use */
  used: number
  /** hours */
  from: Float64Array
  to: Float64Array
  /** acres of the pass done in the field by then, what was done before the plan included */
  acFrom: Float64Array
  acTo: Float64Array
}

/** Pieces per node to start with; more are made when a run needs them. */
const ROOM_PER_NODE = 8

/** An empty timeline for a number of fields, written anew for each run. */
export function createTimeline(fields: number): Timeline {
  const nodes = fields * PASS_COUNT
  const room = Math.max(1, nodes * ROOM_PER_NODE)
  return {
    first: new Int32Array(nodes),
    count: new Int32Array(nodes),
    finishedAt: new Float64Array(nodes),
    machine: new Int32Array(nodes),
    used: 0,
    from: new Float64Array(room),
    to: new Float64Array(room),
    acFrom: new Float64Array(room),
    acTo: new Float64Array(room),
  }
}

/** Makes a node the one that addPiece adds to. */
export function openNode(timeline: Timeline, node: number, machine: number): void {
  timeline.first[node] = timeline.used
  timeline.count[node] = 0
  timeline.finishedAt[node] = Infinity
  timeline.machine[node] = machine
}

/** Adds a piece to the node that was opened last. */
export function addPiece(timeline: Timeline, node: number, from: number, to: number, acFrom: number, acTo: number): void {
  if (timeline.used === timeline.from.length) grow(timeline)
  const piece = timeline.used++
  timeline.from[piece] = from
  timeline.to[piece] = to
  timeline.acFrom[piece] = acFrom
  timeline.acTo[piece] = acTo
  timeline.count[node]!++
}

function grow(timeline: Timeline): void {
  for (const column of ['from', 'to', 'acFrom', 'acTo'] as const) {
    const wider = new Float64Array(timeline[column].length * 2)
    wider.set(timeline[column])
    timeline[column] = wider
  }
}

/** Hour by which a node has done so many acres; Infinity when it never has. @param doneAc - acres done before the plan */
export function hourWhenDone(timeline: Timeline, node: number, acres: number, doneAc: number): number {
  if (doneAc >= acres) return 0
  const end = timeline.first[node]! + timeline.count[node]!
  for (let piece = timeline.first[node]!; piece < end; piece++) {
    const acTo = timeline.acTo[piece]!
    if (acTo < acres) continue
    const acFrom = timeline.acFrom[piece]!
    const from = timeline.from[piece]!
    return from + (timeline.to[piece]! - from) * Math.max(0, acres - acFrom) / (acTo - acFrom)
  }
  return Infinity
}
