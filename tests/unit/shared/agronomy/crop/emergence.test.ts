import { describe, expect, it } from 'vitest'
import { cornEmergence, smallGrainEmergence, sugarbeetDays } from '../../../../../shared/agronomy/crop/emergence'

// Published figures: shared/agronomy/figures. Here is what no table prints.

describe('heat to emergence', () => {
  it('is held to 60 either side of 125, and is a range in order', () => {
    const worst = cornEmergence({ texture: 'fine', depthIn: 4, dry: true, residuePct: 90 })
    expect(worst).toEqual({ low: 185, usual: 185, high: 185 })
    for (const texture of ['fine', 'medium', 'coarse'] as const) {
      const { low, usual, high } = cornEmergence({ texture, depthIn: 2, dry: false, residuePct: 80 })
      expect(low).toBeLessThanOrEqual(usual)
      expect(usual).toBeLessThanOrEqual(high)
    }
  })

  it('is not known for sugarbeet outside NDSU’s table', () => {
    expect([sugarbeetDays(30), sugarbeetDays(80)]).toEqual([null, null])
    expect(sugarbeetDays(40)).toEqual({ fewest: 21, most: null })
  })

  it('refuses beds that are none', () => {
    for (const wrong of [() => cornEmergence({ texture: 'fine', depthIn: 0, dry: false, residuePct: 0 }), () => cornEmergence({ texture: 'fine', depthIn: 2, dry: false, residuePct: 120 }), () => smallGrainEmergence(9), () => sugarbeetDays(Number.NaN)]) expect(wrong).toThrow(RangeError)
  })
})
