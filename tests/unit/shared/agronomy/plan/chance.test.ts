import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plottingPosition, quantileByRank } from '../../../../../shared/agronomy/plan/chance'

describe('plottingPosition', () => {
  // Worked from (k + 1/3)/(n + 2/3): Tukey's plotting position, to four digits.
  it.each([
    [0, 31, 0.0105],
    [31, 31, 0.9895],
    [0, 51, 0.0065],
    [51, 51, 0.9935],
    [1, 2, 0.5],
  ])('puts %i of %i at %d', (count, of, share) => {
    expect(plottingPosition(count, of)).toBeCloseTo(share, 4)
  })

  it('is never 0 or 1, grows with the count, and is fair to both sides', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 200 }), fc.nat(), (of, any) => {
      const count = any % (of + 1)
      const share = plottingPosition(count, of)
      expect(share).toBeGreaterThan(0)
      expect(share).toBeLessThan(1)
      expect(share + plottingPosition(of - count, of)).toBeCloseTo(1, 12)
      if (count > 0) expect(share).toBeGreaterThan(plottingPosition(count - 1, of))
    }))
  })

  it.each([[1, 0], [-1, 5], [6, 5], [1.5, 5], [Number.NaN, 5]])('refuses %d of %d', (count, of) => {
    expect(() => plottingPosition(count, of)).toThrow(RangeError)
  })
})

describe('quantileByRank', () => {
  it('takes the value of rank k = ⌈q·n⌉, with none last', () => {
    const onsets = [5, 6, Infinity, 3, 5, 4, 5, 5, Infinity, 4]
    expect(quantileByRank(onsets, 0.1)).toBe(3)
    expect(quantileByRank(onsets, 0.5)).toBe(5)
    expect(quantileByRank(onsets, 0.8)).toBe(6)
    expect(quantileByRank(onsets, 0.9)).toBe(Infinity)
  })

  it('leaves its input alone', () => {
    const values = [3, 1, 2]
    quantileByRank(values, 0.5)
    expect(values).toEqual([3, 1, 2])
  })

  it('refuses no values, a value that is no number, and a share outside 0 to 1', () => {
    expect(() => quantileByRank([], 0.5)).toThrow(RangeError)
    expect(() => quantileByRank([1, Number.NaN], 0.5)).toThrow(RangeError)
    expect(() => quantileByRank([1], 0)).toThrow(RangeError)
    expect(() => quantileByRank([1], 1.1)).toThrow(RangeError)
  })
})
