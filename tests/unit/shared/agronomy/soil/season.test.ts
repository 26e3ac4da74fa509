import { describe, expect, it } from 'vitest'
import { fieldSoil } from '../../../../../shared/agronomy/soil/field-soil'
import { daysFit, runSeason } from '../../../../../shared/agronomy/soil/season'
import { evenWeather } from './even-weather'

const soil = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 20)

describe('runSeason', () => {
  it('counts a dry spell as fit and the day of a downpour as lost', () => {
    const season = runSeason(soil, evenWeather(24 * 40, 0, hour => hour >= 24 * 30 && hour < 24 * 30 + 6 ? 8 : 0, () => 15, 4))
    expect(season.fitShare.length).toBe(40)
    expect(season.fitShare[29]).toBe(1)
    expect(season.fitShare[30]).toBe(0)
    expect(season.fitShare[31]).toBe(0)
    expect(season.fitShare[39]).toBe(1)
  })

  it('closes its balance over the record', () => {
    const input = evenWeather(24 * 60, 0, hour => hour % 50 < 5 ? 3 : 0, hour => 4 + 9 * Math.sin(hour / 60), 2)
    const season = runSeason(soil, input)
    expect(Math.abs(season.balanceErrorMm)).toBeLessThan(1e-6)
    expect(season.total.inMm).toBeCloseTo(input.weather.rainMm.reduce((sum, mm) => sum + mm, 0), 6)
  })

  it('refuses parts of days', () => {
    expect(() => runSeason(soil, evenWeather(25, 0, () => 0, () => 5, 1))).toThrow(RangeError)
    expect(() => runSeason(soil, evenWeather(24, 6, () => 0, () => 5, 1))).toThrow(RangeError)
  })
})

describe('daysFit', () => {
  const season = { fitShare: Float64Array.of(0, 0.5, 1, 0.25), total: { inMm: 0, runoffMm: 0, drainedMm: 0, evaporatedMm: 0 }, balanceErrorMm: 0 }

  it('adds up shares of days', () => {
    expect(daysFit(season, 0, 4)).toBe(1.75)
    expect(daysFit(season, 1, 3)).toBe(1.5)
    expect(daysFit(season, 2, 2)).toBe(0)
  })

  it('refuses days outside the record and reversed ranges', () => {
    expect(() => daysFit(season, 0, 5)).toThrow(RangeError)
    expect(() => daysFit(season, 3, 2)).toThrow(RangeError)
    expect(() => daysFit(season, Number.NaN, 2)).toThrow(RangeError)
  })
})
