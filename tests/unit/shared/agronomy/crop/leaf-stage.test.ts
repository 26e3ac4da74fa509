import { describe, expect, it } from 'vitest'
import { cornLeafStage } from '../../../../../shared/agronomy/crop/leaf-stage'

// Published figures: shared/agronomy/figures. Here is what no table prints.

describe('cornLeafStage', () => {
  it('is none before emergence, and quicker behind V10 without a jump', () => {
    expect(cornLeafStage(100, 119)).toBeNull()
    expect(cornLeafStage(119 + 820, 119)).toBeCloseTo(10, 9)
    expect(cornLeafStage(119 + 870, 119)).toBeCloseTo(11, 9)
  })

  it('refuses sums that are none', () => {
    expect(() => cornLeafStage(-1, 119)).toThrow(RangeError)
    expect(() => cornLeafStage(100, Number.NaN)).toThrow(RangeError)
  })
})
