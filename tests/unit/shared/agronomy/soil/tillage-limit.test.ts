import { describe, expect, it } from 'vitest'
import { bestTillageWater, CLASS_RETENTION, wettestTillageWater } from '../../../../../shared/agronomy/soil/tillage-limit'

describe('tillage limits', () => {
  // Dexter & Bird (2001) eqs. 6 and 11, recomputed with the class curves shown, m³/m³.
  it.each([
    ['silty clay', 0.3045, 0.3267],
    ['clay', 0.3203, 0.3442],
    ['silty clay loam', 0.3304, 0.3702],
    ['clay loam', 0.3080, 0.3488],
    ['silt loam', 0.3153, 0.3692],
    ['loam', 0.2963, 0.3498],
  ] as const)('%s breaks up best at %s and may be tilled up to %s', (name, best, wettest) => {
    expect(bestTillageWater(CLASS_RETENTION[name])).toBeCloseTo(best, 4)
    expect(wettestTillageWater(CLASS_RETENTION[name])).toBeCloseTo(wettest, 4)
  })

  it('lies between best and full for every class', () => {
    for (const curve of Object.values(CLASS_RETENTION)) {
      expect(wettestTillageWater(curve)).toBeGreaterThan(bestTillageWater(curve))
      expect(wettestTillageWater(curve)).toBeLessThan(curve.saturation)
    }
  })

  it('refuses what is no curve', () => {
    expect(() => bestTillageWater({ residual: 0.4, saturation: 0.3, alpha: 0.01, n: 1.2 })).toThrow(RangeError)
    expect(() => bestTillageWater({ residual: 0.1, saturation: 0.4, alpha: 0.01, n: 1 })).toThrow(RangeError)
    expect(() => wettestTillageWater({ residual: 0.1, saturation: Number.NaN, alpha: 0.01, n: 1.2 })).toThrow(RangeError)
  })
})
