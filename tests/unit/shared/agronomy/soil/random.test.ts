import { describe, expect, it } from 'vitest'
import { mean, sampleKurtosis, sampleStandardDeviation } from 'simple-statistics'
import { normalNumber, seededRandom } from '../../../../../shared/agronomy/soil/random'

describe('seededRandom', () => {
  it('repeats itself, and differs by seed', () => {
    const row = (seed: number) => Array.from({ length: 5 }, seededRandom(seed))
    expect(row(7)).toEqual(row(7))
    expect(row(7)).not.toEqual(row(8))
  })

  it('is even over its range', () => {
    const random = seededRandom(3)
    const counts = new Array<number>(10).fill(0)
    for (let i = 0; i < 100_000; i++) counts[Math.floor(random() * 10)]!++
    // Chi-squared with 9 degrees of freedom is under 27.9 in 999 of 1,000 cases.
    expect(counts.reduce((sum, count) => sum + (count - 10_000) ** 2 / 10_000, 0)).toBeLessThan(27.9)
  })
})

describe('normalNumber', () => {
  it('has mean 0, spread 1 and no excess in its tails', () => {
    const random = seededRandom(5)
    const numbers = Array.from({ length: 50_000 }, () => normalNumber(random))
    expect(mean(numbers)).toBeCloseTo(0, 1)
    expect(sampleStandardDeviation(numbers)).toBeCloseTo(1, 1)
    expect(Math.abs(sampleKurtosis(numbers))).toBeLessThan(0.1)
  })
})
