import { PASSES } from '../../../shared/agronomy/ground'
import { PASS_COUNT } from '../../../shared/agronomy/plan/problem'
import type { Timeline } from '../../../shared/agronomy/plan/timeline'
import type { Bar } from '../../../shared/types/ground-order'
import type { MachineRow } from '../../db/queries/machines'

/** Hours that may lie between two pieces of work for them to be drawn as one bar. */
const SAME_BAR_HOURS = 0.01

/**
 * The bars of one field: its pieces of work, those that touch made one.
 *
 * @param at - instant of an hour of the plan
 * @param earlyHour - hour from which a bar may not come to pass; null when no rain is in sight
 */
export function barsOf(field: number, timeline: Timeline, machines: readonly MachineRow[], at: (hour: number) => string, earlyHour: number | null): Bar[] {
  return PASSES.flatMap((pass, index) => {
    const node = field * PASS_COUNT + index
    const machine = machines[timeline.machine[node]!]
    if (!machine) return []
    return joinedPieces(timeline, node).map(({ from, to }) => ({
      pass,
      machineId: machine.id,
      machine: machine.name,
      from: at(from),
      to: at(to),
      afterRain: earlyHour !== null && from >= earlyHour,
    }))
  })
}

function joinedPieces(timeline: Timeline, node: number): { from: number, to: number }[] {
  const joined: { from: number, to: number }[] = []
  const end = timeline.first[node]! + timeline.count[node]!
  for (let piece = timeline.first[node]!; piece < end; piece++) {
    const last = joined.at(-1)
    if (last && timeline.from[piece]! - last.to < SAME_BAR_HOURS) last.to = timeline.to[piece]!
    else joined.push({ from: timeline.from[piece]!, to: timeline.to[piece]! })
  }
  return joined
}
