import { Body, Equator, Horizon, Observer, SearchRiseSet } from 'astronomy-engine'
import { describe, expect, it } from 'vitest'
import { sunAltitudeDeg, sunDay } from '../../../../../shared/agronomy/weather/sun'

// astronomy-engine works from VSOP87, suncalc from Meeus' short series.
describe('against astronomy-engine', () => {
  it('heights agree over 1,200 points of a year', () => {
    let worst = 0
    for (let i = 0; i < 1200; i++) {
      const at = new Date(Date.UTC(2026, 0, 1) + i * 7.3 * 3_600_000)
      const [lat, lon] = [40 + i % 15, -120 + i % 60]
      const observer = new Observer(lat, lon, 0)
      const { ra, dec } = Equator(Body.Sun, at, observer, true, true)
      const { altitude } = Horizon(at, observer, ra, dec, 'normal')
      // Nearer to the horizon the two lift the sun by other formulas of refraction.
      if (altitude > 5) worst = Math.max(worst, Math.abs(sunAltitudeDeg(at, lat, lon) - altitude))
    }
    console.log(`sun: worst difference of height to astronomy-engine ${worst.toFixed(4)}°`)
    expect(worst).toBeLessThan(0.02)
  })

  it('sunrise and sunset agree within half a minute on every day of a year at 47° N', () => {
    let worst = 0
    for (let day = 0; day < 365; day++) {
      const midnight = new Date(Date.UTC(2026, 0, 1 + day, 6))
      const observer = new Observer(46.8772, -96.7898, 0)
      const { sunrise, sunset } = sunDay(new Date(midnight.getTime() + 12 * 3_600_000), 46.8772, -96.7898)
      for (const [ours, direction] of [[sunrise, 1], [sunset, -1]] as const) worst = Math.max(worst, Math.abs(ours!.getTime() - SearchRiseSet(Body.Sun, observer, direction, midnight, 1)!.date.getTime()) / 1000)
    }
    console.log(`sun: worst difference of rise and set to astronomy-engine ${worst.toFixed(1)} s`)
    expect(worst).toBeLessThan(30)
  })
})

describe('sunDay', () => {
  it('has neither sunrise nor sunset in the polar day', () => {
    expect(sunDay(new Date('2026-06-21T12:00Z'), 75, 20)).toMatchObject({ sunrise: null, sunset: null })
  })

  it('refuses a place that is none and no date', () => {
    for (const wrong of [() => sunDay(new Date(), 91, 0), () => sunDay(new Date(), 0, 181), () => sunDay(new Date(Number.NaN), 0, 0), () => sunAltitudeDeg(new Date(Number.NaN), 0, 0), () => sunAltitudeDeg(new Date(), Number.NaN, 0)]) expect(wrong).toThrow(RangeError)
  })
})
