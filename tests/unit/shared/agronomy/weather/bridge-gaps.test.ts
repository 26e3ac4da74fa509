import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { bridgeGaps } from '../../../../../shared/agronomy/weather/bridge-gaps'
import type { HourlyWeather } from '../../../../../shared/agronomy/weather/hourly'

const NONE = Number.NaN
const weather = (over: Partial<Record<keyof HourlyWeather, number[]>> = {}, hours = 8): HourlyWeather => {
  const column = (name: keyof HourlyWeather, value: number) => Float64Array.from(over[name] ?? Array<number>(hours).fill(value))
  return { startsAt: 1_746_525_600, hours, rainMm: column('rainMm', 0), temperatureC: column('temperatureC', 10), humidityPct: column('humidityPct', 60), windMs: column('windMs', 3), radiationWm2: column('radiationWm2', 100) }
}

// Common practice, no source: short gaps are bridged, long ones stop the figure.
describe('bridgeGaps', () => {
  it('draws a straight line over up to three hours, and names them', () => {
    const { weather: whole, bridged } = bridgeGaps(weather({ temperatureC: [10, 11, NONE, NONE, NONE, 15, 16, 17] }))
    expect([...whole.temperatureC]).toEqual([10, 11, 12, 13, 14, 15, 16, 17])
    expect(bridged).toEqual([{ column: 'temperatureC', from: 2, hours: 3 }])
  })

  it('never takes unknown rain for none between two wet hours', () => {
    expect(bridgeGaps(weather({ rainMm: [0, 2, NONE, 4, 0, 0, 0, 0] })).weather.rainMm[2]).toBe(3)
  })

  it('holds the nearest value at an end', () => {
    const { weather: whole } = bridgeGaps(weather({ windMs: [NONE, NONE, 4, 5, 6, 7, 8, NONE] }))
    expect([...whole.windMs]).toEqual([4, 4, 4, 5, 6, 7, 8, 8])
  })

  it('gives weather without a gap back as it is', () => {
    const given = weather()
    expect(bridgeGaps(given)).toEqual({ weather: given, bridged: [] })
    expect(bridgeGaps(given).weather).toBe(given)
  })

  it.each([
    ['four hours', { temperatureC: [10, NONE, NONE, NONE, NONE, 15, 16, 17] }, 'The temperature is not known for 4 hours from 2025-05-06T11:00:00.000Z; up to 3 are bridged'],
    ['a humidity of 104 %', { humidityPct: [60, 60, 104, 60, 60, 60, 60, 60] }, 'The humidity of 2025-05-06T12:00:00.000Z is 104 %: it must be 0 to 100 %'],
    ['negative rain', { rainMm: [0, 0, 0, -1, 0, 0, 0, 0] }, 'The rain of 2025-05-06T13:00:00.000Z is -1 mm: it must be 0 to 200 mm'],
    ['a column of another length', { windMs: [1, 2] }, 'The wind has 2 hours, not 8'],
  ])('stops at %s, naming the hour', (_, over, words) => {
    expect(() => bridgeGaps(weather(over))).toThrow(words)
  })

  it('leaves no gap, changes no known value, and goes nowhere outside its neighbours', () => {
    const value = fc.oneof({ weight: 4, arbitrary: fc.double({ min: 0, max: 30, noNaN: true }) }, { weight: 1, arbitrary: fc.constant(NONE) })
    fc.assert(fc.property(fc.array(value, { minLength: 1, maxLength: 60 }), (windMs) => {
      let whole: HourlyWeather
      try {
        whole = bridgeGaps(weather({ windMs }, windMs.length)).weather
      }
      catch (error) {
        expect(error).toBeInstanceOf(RangeError)
        return
      }
      const known = windMs.filter(each => !Number.isNaN(each))
      for (const [hour, each] of whole.windMs.entries()) {
        if (!Number.isNaN(windMs[hour]!)) expect(each).toBe(windMs[hour])
        expect(each).toBeGreaterThanOrEqual(Math.min(...known) - 1e-9)
        expect(each).toBeLessThanOrEqual(Math.max(...known) + 1e-9)
      }
    }), { numRuns: 1000 })
  })
})
