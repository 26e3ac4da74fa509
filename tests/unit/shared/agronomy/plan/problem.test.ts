import { describe, expect, it } from 'vitest'
import { hasWorkLeft, passBefore } from '../../../../../shared/agronomy/plan/problem'
import { fitIn, planProblem } from './small-farm'

const field = (needed: number[], doneAc: number[]) => planProblem({
  hours: 24,
  fields: [{ areaAc: 100, needed, doneAc }],
  machines: [],
  runs: [[{ rainAt: Infinity, flags: fitIn(24, [0, 24]) }]],
}).fields[0]!

describe('hasWorkLeft', () => {
  it('is so while acres are missing, and never for a pass that the field doesn’t get', () => {
    const half = field([1, 0, 1, 0, 0], [100, 0, 50, 0, 0])
    expect([0, 1, 2].map(pass => hasWorkLeft(half, pass))).toEqual([false, false, true])
  })
})

describe('passBefore', () => {
  it('skips passes that the field doesn’t get', () => {
    expect(passBefore(field([1, 0, 1, 0, 1], [0, 0, 0, 0, 0]), 2)).toBe(0)
    expect(passBefore(field([1, 1, 1, 0, 1], [0, 0, 0, 0, 0]), 2)).toBe(1)
    expect(passBefore(field([0, 0, 1, 0, 1], [0, 0, 0, 0, 0]), 4)).toBe(2)
    expect(passBefore(field([1, 0, 1, 0, 0], [0, 0, 0, 0, 0]), 0)).toBe(-1)
  })
})
