import fc from 'fast-check'
import psychrolib from 'psychrolib'
import { describe, expect, it } from 'vitest'
import { airPressureKpa, saturationVapourPressure } from '../../../../../shared/agronomy/weather/humidity'
import { deltaT, dewPoint, wetBulb, wetBulbStull } from '../../../../../shared/agronomy/weather/wet-bulb'

psychrolib.SetUnitSystem(psychrolib.SI)

// psychrolib is ASHRAE's equations (Handbook of Fundamentals 2017), of which FAO-56's are a shorter form.
describe('against psychrolib', () => {
  const grid = Array.from({ length: 46 }, (_, t) => t).flatMap(t => Array.from({ length: 25 }, (_, i) => [t, 3 + i * 4] as const))

  it('dew point and wet bulb agree over 1,000 points and more, where nothing freezes', () => {
    // Under freezing ASHRAE takes vapour over ice; FAO-56 does not.
    const wet = grid.filter(([t, rh]) => wetBulb(t, rh, 101.325) > 0.5)
    const dew = grid.filter(([t, rh]) => dewPoint(t, rh) > 0.5)
    const worst = (points: typeof grid, of: (t: number, rh: number) => number) => Math.max(...points.map(([t, rh]) => Math.abs(of(t, rh))))
    const worstWet = worst(wet, (t, rh) => wetBulb(t, rh, 101.325) - psychrolib.GetTWetBulbFromRelHum(t, rh / 100, 101_325))
    const worstDew = worst(dew, (t, rh) => dewPoint(t, rh) - psychrolib.GetTDewPointFromRelHum(t, rh / 100))
    console.log(`wet bulb: worst difference to psychrolib ${worstWet.toFixed(3)} °C over ${wet.length} points; dew point ${worstDew.toFixed(3)} °C over ${dew.length}`)
    expect(wet.length).toBeGreaterThan(1000)
    // A ventilated psychrometer (0.000662) reads a little above ASHRAE's thermodynamic wet bulb in hot, dry air.
    expect(worstWet).toBeLessThan(0.25)
    expect(worstDew).toBeLessThan(0.06)
  })

  it('saturation pressure agrees from 0 to 50 °C within 0.2 %', () => {
    for (let t = 0.5; t <= 50; t += 0.05) expect(Math.abs(saturationVapourPressure(t) * 1000 / psychrolib.GetSatVapPres(t) - 1)).toBeLessThan(0.002)
  })
})

describe('Stull’s short form', () => {
  it('differs from the psychrometer by 0.80 °C at most from 0 to 40 °C and 10 to 99 %, at 22 °C and 10 % (spray.md 3.4)', () => {
    let [worst, where] = [0, '']
    for (let t = 0; t <= 40; t++) {
      for (let rh = 10; rh <= 99; rh++) {
        const off = Math.abs(wetBulbStull(t, rh) - wetBulb(t, rh, 101.325))
        if (off > worst) [worst, where] = [off, `${t}/${rh}`]
      }
    }
    expect(worst).toBeCloseTo(0.8, 2)
    expect(where).toBe('22/10')
  })
})

describe('wet bulb', () => {
  it('lies between dew point and air, and rises with humidity', () => {
    fc.assert(fc.property(fc.double({ min: -20, max: 50, noNaN: true }), fc.double({ min: 1, max: 99, noNaN: true }), fc.double({ min: 60, max: 105, noNaN: true }), (t, rh, pressure) => {
      const wet = wetBulb(t, rh, pressure)
      expect(wet).toBeLessThanOrEqual(t + 1e-9)
      expect(wet).toBeGreaterThanOrEqual(dewPoint(t, rh) - 1e-9)
      expect(wetBulb(t, rh + 1, pressure)).toBeGreaterThan(wet)
    }), { numRuns: 1000 })
  })

  it('is the air itself when the air is full', () => {
    expect(wetBulb(18, 100, 101.325)).toBeCloseTo(18, 6)
    expect(deltaT(18, 100, 250)).toBeCloseTo(0, 6)
  })

  it('falls further in the thin air of a high place', () => {
    expect(deltaT(30, 20, 1500)).toBeGreaterThan(deltaT(30, 20, 0))
    expect(airPressureKpa(1500)).toBeLessThan(90)
  })

  it.each([[20, 104], [20, 0], [20, Number.NaN], [70, 50], [Number.NaN, 50]])('refuses %d °C at %d %%, naming what is wrong', (t, rh) => {
    expect(() => wetBulb(t, rh, 101.325)).toThrow(/The (temperature|humidity) .* must be/)
    expect(() => dewPoint(t, rh)).toThrow(RangeError)
    expect(() => wetBulbStull(t, rh)).toThrow(RangeError)
  })

  it('refuses a pressure that no farm has', () => {
    expect(() => wetBulb(20, 50, 10)).toThrow(RangeError)
  })
})
