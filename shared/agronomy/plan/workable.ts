import type { StretchLists } from './problem'

/** Rain in an hour that stops work in it, mm: 0.01 in, the least that counts as measurable (AMS Glossary). */
export const STOPPING_RAIN_MM = 0.254
/** Hours on end that ground must be workable to count as fit again after rain. A design choice: a pause in the rain is not. */
const AGAIN_HOURS = 6

/** Collects the stretch lists of one ground: for each run, its five passes. */
export class StretchListBuilder {
  private readonly starts: number[] = [0]
  private readonly bounds: number[] = []

  /**
   * Adds the list of one pass: the hours that are flagged, without those in which it rains.
   *
   * @param flags - 1 for each hour in which the ground may be worked
   * @param rainMm - mm in each hour
   * @param rainAt - hour in which the rain starts, which is lost whatever falls in it
   * @param offset - index of the plan's first hour in `flags` and `rainMm`
   * @param hours - length of the plan
   */
  add(flags: Uint8Array, rainMm: Float64Array, rainAt: number, offset: number, hours: number): void {
    let open = false
    for (let hour = 0; hour <= hours; hour++) {
      const may = hour < hours && mayWork(flags, rainMm, offset + hour) && hour !== rainAt
      if (may !== open) this.bounds.push(hour)
      open = may
    }
    this.starts.push(this.bounds.length)
  }

  build(): StretchLists {
    return { starts: Int32Array.from(this.starts), bounds: Float64Array.from(this.bounds) }
  }
}

function mayWork(flags: Uint8Array, rainMm: Float64Array, index: number): boolean {
  return flags[index] === 1 && !(rainMm[index]! >= STOPPING_RAIN_MM)
}

/**
 * First hour after the rain has started in which the ground is fit again, for six hours on end.
 *
 * @param flags - 1 for each hour in which it may be planted
 * @param rainMm - mm in each hour
 * @param rainAt - hour of the plan in which the rain starts
 * @param offset - index of the plan's first hour in `flags` and `rainMm`
 * @param end - index behind the last hour that counts
 * @returns hour of the plan; Infinity when not by then
 */
export function fitAgainAt(flags: Uint8Array, rainMm: Float64Array, rainAt: number, offset: number, end: number): number {
  let held = 0
  for (let index = offset + rainAt + 1; index < end; index++) {
    held = mayWork(flags, rainMm, index) ? held + 1 : 0
    if (held === AGAIN_HOURS) return index - offset - AGAIN_HOURS + 1
  }
  return Infinity
}
