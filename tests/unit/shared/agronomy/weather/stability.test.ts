import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { gradientStability, netRadiationIndex, pasquillStability, srdtDayStability, srdtNightStability, turnerStability } from '../../../../../shared/agronomy/weather/stability'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const wind = fc.double({ min: 0, max: 20, noNaN: true })

describe('stability', () => {
  it('nears D as the wind grows: no class at 6 m/s lies beyond C and D', () => {
    fc.assert(fc.property(fc.double({ min: 6.2, max: 30, noNaN: true }), fc.integer({ min: 0, max: 10 }), fc.double({ min: 0, max: 90, noNaN: true }), fc.boolean(), (speed, cloudTenths, sunDeg, night) => {
      expect('CD').toContain(turnerStability(speed, { night, sunDeg, cloudTenths, ceilingFt: null }))
    }), { numRuns: 1000 })
  })

  it('is never unstable at night nor very stable by day', () => {
    fc.assert(fc.property(wind, fc.integer({ min: 0, max: 10 }), fc.double({ min: 0, max: 90, noNaN: true }), (speed, cloudTenths, sunDeg) => {
      expect('DEFG').toContain(turnerStability(speed, { night: true, sunDeg, cloudTenths, ceilingFt: null }))
      expect('ABCD').toContain(turnerStability(speed, { night: false, sunDeg, cloudTenths, ceilingFt: null }))
    }), { numRuns: 1000 })
  })

  it('takes the lower bound of a class as its own', () => {
    expect([pasquillStability(2, 'strong'), pasquillStability(6, 'strong'), srdtDayStability(2, 175), srdtNightStability(2.5, -1)]).toEqual(['B', 'C', 'C', 'D'])
  })

  it('refuses what is out of range', () => {
    const sky = { night: false, sunDeg: 30, cloudTenths: 5, ceilingFt: null }
    for (const wrong of [() => pasquillStability(-1, 'strong'), () => turnerStability(Number.NaN, sky), () => netRadiationIndex({ ...sky, cloudTenths: 11 }), () => netRadiationIndex({ ...sky, sunDeg: 100 }), () => srdtDayStability(2, -5), () => srdtNightStability(2, Number.NaN), () => gradientStability({ heightM: 10, temperatureC: 1 }, { heightM: 2, temperatureC: 1 })]) expect(wrong).toThrow(RangeError)
  })
})
