import { describe, expect, it } from 'vitest'
import { closeSprayHours, LEAST_SPRAY_WIND_MS, MOST_SPRAY_WIND_MS } from '../../../../../shared/agronomy/plan/spray-hours'
import type { HourlyWeather } from '../../../../../shared/agronomy/weather/hourly'

const MPH = 0.44704

function left(windMs: number[], radiationWm2: number[]): number[] {
  const hours = windMs.length
  const flags = new Uint8Array(hours).fill(1)
  const weather: HourlyWeather = {
    startsAt: 0, hours, windMs: Float64Array.from(windMs), radiationWm2: Float64Array.from(radiationWm2),
    rainMm: new Float64Array(hours), temperatureC: new Float64Array(hours), humidityPct: new Float64Array(hours),
  }
  closeSprayHours(flags, weather)
  return [...flags]
}

describe('the wind limits', () => {
  it('are 10 mph at 10 m, and at 10 m what makes 3 mph at 24 in by the neutral log law', () => {
    expect(MOST_SPRAY_WIND_MS).toBeCloseTo(10 * MPH, 6)
    // u(0.6096 m)/u(10 m) = ln(0.6096/0.03)/ln(10/0.03) = 0.5184.
    expect(LEAST_SPRAY_WIND_MS).toBeCloseTo(3 * MPH / 0.5184, 2)
  })
})

describe('closeSprayHours', () => {
  const day = [300, 300, 300, 300, 300]

  it('closes hours with too much wind or too little', () => {
    expect(left([2, 3, 4.4, 4.6, 9], day)).toEqual([0, 1, 1, 0, 0])
  })

  it('closes the night, an hour after sunrise and two before sunset', () => {
    expect(left(Array.from({ length: 10 }, () => 3), [0, 0, 50, 300, 400, 300, 100, 20, 0, 0])).toEqual([0, 0, 0, 1, 1, 1, 0, 0, 0, 0])
  })

  it('opens nothing', () => {
    const flags = new Uint8Array(1)
    closeSprayHours(flags, { startsAt: 0, hours: 1, windMs: Float64Array.of(3), radiationWm2: Float64Array.of(300), rainMm: new Float64Array(1), temperatureC: new Float64Array(1), humidityPct: new Float64Array(1) })
    expect(flags[0]).toBe(0)
  })
})
