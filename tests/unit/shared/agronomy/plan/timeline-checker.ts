import { LEAD_AC, LEAD_SHARE } from '../../../../../shared/agronomy/plan/work-pass'
import type { Timeline } from '../../../../../shared/agronomy/plan/timeline'
import { localHour, type SmallFarm } from './small-farm'

interface Piece { field: number, pass: number, machine: number, from: number, to: number, acFrom: number, acTo: number }

const TOLERANCE_AC = 1e-4
const TOLERANCE_H = 1e-6

/**
 * Reads a timeline against the farm as it was written down, not as the simulator was given it, and says in words what
 * is impossible about it. Nothing of the simulator is called.
 */
export function whatIsWrong(farm: SmallFarm, run: number, timeline: Timeline): string[] {
  const pieces = readPieces(farm, timeline)
  return [
    ...pieces.flatMap(piece => wrongWithPiece(farm, run, piece)),
    ...wrongWithMachines(farm, pieces),
    ...farm.fields.flatMap((_, field) => wrongWithField(farm, timeline, field, pieces.filter(piece => piece.field === field))),
  ]
}

function readPieces(farm: SmallFarm, timeline: Timeline): Piece[] {
  return farm.fields.flatMap((_, field) => [0, 1, 2, 3, 4].flatMap((pass) => {
    const node = field * 5 + pass
    return Array.from({ length: timeline.count[node]! }, (_, i) => {
      const at = timeline.first[node]! + i
      return { field, pass, machine: timeline.machine[node]!, from: timeline.from[at]!, to: timeline.to[at]!, acFrom: timeline.acFrom[at]!, acTo: timeline.acTo[at]! }
    })
  }))
}

function wrongWithPiece(farm: SmallFarm, run: number, piece: Piece): string[] {
  const { field, pass, from, to, acFrom, acTo } = piece
  const name = `field ${field} pass ${pass} from ${from} to ${to}`
  const machine = farm.machines[piece.machine]
  if (!machine) return [`${name}: no machine`]
  const { rainAt, flags } = farm.runs[run]![farm.fields[field]!.ground ?? 0]!
  const wrong: string[] = []
  if (machine.pass !== pass) wrong.push(`${name}: a machine for another pass`)
  if (!(from < to)) wrong.push(`${name}: no time`)
  if (!(acTo > acFrom)) wrong.push(`${name}: no acres`)
  if (acTo - acFrom > machine.rateAcPerHour * (to - from) + TOLERANCE_AC) wrong.push(`${name}: faster than its machine`)
  if (from < (machine.downUntil ?? 0) - TOLERANCE_H) wrong.push(`${name}: while down`)
  const clock = localHour(farm.hours)
  for (let hour = Math.floor(from + TOLERANCE_H); hour < to - TOLERANCE_H; hour++) {
    if (flags[pass]![hour] !== 1) wrong.push(`${name}: unfit in hour ${hour}`)
    if (hour === rainAt) wrong.push(`${name}: at the onset of rain`)
    const [starts, ends] = [Math.max(from, hour) - hour + clock[hour]!, Math.min(to, hour + 1) - hour + clock[hour]!]
    if (starts < (machine.fromHour ?? 6) - TOLERANCE_H || ends > (machine.toHour ?? 21) + TOLERANCE_H) wrong.push(`${name}: outside the shift in hour ${hour}`)
  }
  return wrong
}

/** No machine in two places, and time to move between them. */
function wrongWithMachines(farm: SmallFarm, pieces: Piece[]): string[] {
  return farm.machines.flatMap((_, machine) => {
    const own = pieces.filter(piece => piece.machine === machine).sort((a, b) => a.from - b.from)
    return own.slice(1).flatMap((piece, i) => {
      const before = own[i]!
      const move = before.field === piece.field ? 0 : farm.moveHours ?? 0.25
      return piece.from < before.to + move - TOLERANCE_H ? [`machine ${machine}: at ${piece.from} already in field ${piece.field}`] : []
    })
  })
}

/** Acres add up, and no pass overtakes the one before it or starts without its lead. */
function wrongWithField(farm: SmallFarm, timeline: Timeline, field: number, pieces: Piece[]): string[] {
  const { areaAc, doneAc = [0, 0, 0, 0, 0], needed = [1, 0, 1, 0, 0] } = farm.fields[field]!
  const wrong: string[] = []
  let before: number | null = null
  for (let pass = 0; pass < 5; pass++) {
    if (!needed[pass]) {
      if (pieces.some(piece => piece.pass === pass)) wrong.push(`field ${field}: pass ${pass} isn't needed`)
      continue
    }
    const own = pieces.filter(piece => piece.pass === pass)
    let acres = doneAc[pass]!
    for (const piece of own) {
      if (Math.abs(piece.acFrom - acres) > TOLERANCE_AC) wrong.push(`field ${field} pass ${pass}: acres jump at ${piece.from}`)
      acres = piece.acTo
    }
    if (acres > areaAc + TOLERANCE_AC) wrong.push(`field ${field} pass ${pass}: more acres than the field has`)
    const finished = timeline.finishedAt[field * 5 + pass]! < Infinity
    if (finished !== (areaAc - acres < TOLERANCE_AC)) wrong.push(`field ${field} pass ${pass}: ${finished ? 'called' : 'not called'} finished at ${acres} ac`)
    if (before !== null) wrong.push(...overtakes(farm, field, before, pass, pieces))
    before = pass
  }
  return wrong
}

function overtakes(farm: SmallFarm, field: number, ahead: number, behind: number, pieces: Piece[]): string[] {
  const { areaAc, doneAc = [0, 0, 0, 0, 0] } = farm.fields[field]!
  const doneBy = (pass: number, hour: number) => pieces.filter(piece => piece.pass === pass && piece.from < hour)
    .reduce((acres, piece) => piece.acFrom + (piece.acTo - piece.acFrom) * Math.min(1, (hour - piece.from) / (piece.to - piece.from)), doneAc[pass]!)
  const own = pieces.filter(piece => piece.pass === behind)
  const wrong: string[] = []
  for (const hour of pieces.flatMap(piece => [piece.from, piece.to])) {
    if (own.length > 0 && hour >= own[0]!.from && doneBy(behind, hour) > doneBy(ahead, hour) + TOLERANCE_AC) wrong.push(`field ${field}: pass ${behind} overtakes ${ahead} at ${hour}`)
  }
  // The least lead that the pass before must have had.
  const wanted = Math.min(areaAc, doneAc[behind]! + Math.min(areaAc * LEAD_SHARE, LEAD_AC))
  if (own.length > 0 && doneBy(ahead, own[0]!.from) < wanted - TOLERANCE_AC) wrong.push(`field ${field}: pass ${behind} starts without its lead`)
  return wrong
}
