import { describe, expect, it } from 'vitest'
import { fieldSeason, isPlanted, needsPlanting, passProgress } from '../../../../server/services/ground-order/field-season'
import type { Pass } from '../../../../shared/agronomy/ground'
import { madeField } from './made-farm'

const field = madeField('North', { areaAc: 100, chain: ['dig', 'rocks', 'plant', 'spray'] })
const total = (pass: Pass, areaAc: number, lastEndedAt = new Date('2025-05-05T20:00:00Z')) => ({ fieldId: field.id, pass, areaAc, lastEndedAt })

describe('fieldSeason', () => {
  it('is to do all through when nothing is logged', () => {
    const season = fieldSeason(field, [])
    expect(season.next).toBe('dig')
    expect(passProgress(season).map(({ state }) => state)).toEqual(['to-do', 'to-do', 'to-do', 'not-needed', 'to-do'])
  })

  it('counts planted acres as dug and cleared, whether or not that was written down', () => {
    const season = fieldSeason(field, [total('dig', 30), total('plant', 40)])
    expect(season.doneAc).toEqual([40, 40, 40, 0, 0])
    expect(season.next).toBe('dig')
    expect(needsPlanting(season)).toBe(true)
  })

  it('is planted when the acres add up, give or take a rounded record, and says when', () => {
    const season = fieldSeason(field, [total('dig', 100), total('rocks', 100), total('plant', 99.97)])
    expect(isPlanted(season)).toBe(true)
    expect(season.plantedAt).toEqual(new Date('2025-05-05T20:00:00Z'))
    expect(season.next).toBe('spray')
  })

  it('never counts more acres than the field has', () => {
    expect(fieldSeason(field, [total('dig', 104)]).doneAc[0]).toBe(100)
  })

  it('leaves other fields’ acres alone', () => {
    expect(fieldSeason(field, [{ ...total('plant', 100), fieldId: madeField('South').id }]).doneAc[2]).toBe(0)
  })
})
