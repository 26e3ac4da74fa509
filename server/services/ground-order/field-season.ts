import { PASSES, type Pass } from '../../../shared/agronomy/ground'
import type { PassProgress } from '../../../shared/types/ground-order'
import type { FieldRow } from '../../db/queries/fields'
import type { PassTotal } from '../../db/queries/pass-records'

/** Acres that may be missing from a pass that counts as done: records are rounded. */
const ROUNDING_AC = 0.05

/** How far a field has got this season. */
export interface FieldSeason {
  field: FieldRow
  needed: readonly boolean[]
  /** acres done of each pass, at most the field's */
  doneAc: number[]
  /** next pass with work left; null when there is none */
  next: Pass | null
  plantedAt: Date | null
}

/**
 * Adds up a field's records.
 *
 * Acres of a later pass through Plant count for the passes before it: what is planted was dug, whether or not somebody
 * wrote it down.
 */
export function fieldSeason(field: FieldRow, totals: readonly PassTotal[]): FieldSeason {
  const own = totals.filter(total => total.fieldId === field.id)
  const needed = PASSES.map(pass => field.chain.includes(pass))
  const doneAc = PASSES.map((pass, index) => {
    const later = index <= PLANT ? PASSES.slice(index, PLANT + 1) : [pass]
    const acres = Math.max(0, ...own.filter(total => later.includes(total.pass)).map(total => total.areaAc))
    return acres >= field.areaAc - ROUNDING_AC ? field.areaAc : acres
  })
  const next = PASSES.find((_, index) => needed[index] && doneAc[index]! < field.areaAc) ?? null
  const planted = needed[PLANT] && doneAc[PLANT] === field.areaAc
  return { field, needed, doneAc, next, plantedAt: planted ? own.find(total => total.pass === 'plant')?.lastEndedAt ?? null : null }
}

const PLANT = PASSES.indexOf('plant')

export function isPlanted({ needed, doneAc, field }: FieldSeason): boolean {
  return needed[PLANT]! && doneAc[PLANT] === field.areaAc
}

export function needsPlanting({ needed, doneAc, field }: FieldSeason): boolean {
  return needed[PLANT]! && doneAc[PLANT]! < field.areaAc
}

export function passProgress({ needed, doneAc, field }: FieldSeason): PassProgress[] {
  return PASSES.map((pass, index) => {
    const acres = needed[index] ? doneAc[index]! : 0
    const state = !needed[index] ? 'not-needed' : acres >= field.areaAc ? 'done' : acres > 0 ? 'part' : 'to-do'
    return { pass, state, doneAc: acres }
  })
}
