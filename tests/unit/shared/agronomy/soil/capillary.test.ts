import { describe, expect, it } from 'vitest'
import { capillaryRiseMm } from '../../../../../shared/agronomy/soil/capillary'

describe('capillaryRiseMm', () => {
  it('moves its share of the difference in the thinner layer: 0.05 over 100 mm at 0.01/h is 0.05 mm', () => {
    expect(capillaryRiseMm(0.37, 0.42, 0.42, 0.42, 100, 0.01)).toBeCloseTo(0.05, 12)
  })

  it('moves nothing when the layer above is as wet or wetter', () => {
    expect(capillaryRiseMm(0.4, 0.42, 0.4, 0.42, 100, 0.01)).toBe(0)
    expect(capillaryRiseMm(0.45, 0.42, 0.4, 0.42, 100, 0.01)).toBe(0)
  })

  it('rests when two different soils are equally wet for what they hold', () => {
    expect(capillaryRiseMm(0.378, 0.42, 0.27, 0.3, 200, 0.01)).toBeCloseTo(0, 12)
  })
})
