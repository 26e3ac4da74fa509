import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { celsiusFromF, fahrenheitFromC, hectaresFromAc, inchesFromMm, mmFromInches, mphFromMs, msFromMph, sayArea, sayDollars, sayRain, sayTemperature, windNumber } from '../../../../shared/utils/units'

describe('units', () => {
  it('convert exactly (international inch, mile and acre)', () => {
    expect(inchesFromMm(25.4)).toBe(1)
    expect(mphFromMs(0.44704)).toBe(1)
    expect(fahrenheitFromC(100)).toBe(212)
    expect(hectaresFromAc(1)).toBeCloseTo(0.40468564224, 11)
  })

  it('come back to where they started', () => {
    fc.assert(fc.property(fc.double({ min: -500, max: 500, noNaN: true }), (value) => {
      expect(mmFromInches(inchesFromMm(value))).toBeCloseTo(value, 9)
      expect(celsiusFromF(fahrenheitFromC(value))).toBeCloseTo(value, 9)
      expect(msFromMph(mphFromMs(value))).toBeCloseTo(value, 9)
    }))
  })

  it('are said as the farm reads them', () => {
    expect([sayRain(18.288, 'us'), sayRain(18.3, 'metric'), sayRain(2.54, 'metric')]).toEqual(['0.72 in', '18 mm', '2.5 mm'])
    expect([sayTemperature(7.2, 'us'), sayTemperature(7.2, 'metric'), sayTemperature(-0.2, 'metric')]).toEqual(['45°F', '7°C', '0°C'])
    expect([sayArea(1948, 'us'), sayArea(236, 'metric')]).toEqual(['1,948 ac', '95.5 ha'])
    expect([sayDollars(21_441), sayDollars(-340), sayDollars(576, 1)]).toEqual(['$21,400', '−$300', '$576'])
    expect(windNumber(5, 'us')).toBe(11)
  })
})
