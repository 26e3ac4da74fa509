import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { flowAtPressure, gallonsPerAcre, litresPerHectare, load, nozzleFlow, ounceCourseFt, speedFromCourse } from '../../../../../shared/agronomy/spray/nozzle'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const some = fc.double({ min: 0.1, max: 100, noNaN: true })

describe('nozzle arithmetic', () => {
  it('comes back', () => {
    fc.assert(fc.property(some, some, some, (flow, speed, spacing) => {
      expect(nozzleFlow(gallonsPerAcre(flow, speed, spacing), speed, spacing)).toBeCloseTo(flow, 9)
      expect(flowAtPressure(flowAtPressure(flow, speed, spacing), spacing, speed)).toBeCloseTo(flow, 9)
    }), { numRuns: 1000 })
  })

  it('refuses what is not above 0, by name', () => {
    for (const wrong of [() => gallonsPerAcre(0, 1, 1), () => nozzleFlow(1, -1, 1), () => flowAtPressure(1, 1, Number.NaN), () => ounceCourseFt(0), () => speedFromCourse(1, 0), () => litresPerHectare(Infinity), () => load(0, 15, []), () => load(1, 15, [{ name: 'a', rate: -1, per: 'acre', unit: 'lb' }])]) expect(wrong).toThrow(RangeError)
    expect(() => gallonsPerAcre(1, 0, 1)).toThrow('The speed (0) must be above 0')
  })
})
