import fc from 'fast-check'
import geodesic from 'geographiclib-geodesic'
import { describe, expect, it } from 'vitest'
import { greatCircleKm, roadHours, roadKm } from '../../../../../shared/agronomy/machine/road'

const coordinate = fc.record({ latitude: fc.double({ min: -90, max: 90, noNaN: true }), longitude: fc.double({ min: -180, max: 180, noNaN: true }) })

describe('greatCircleKm', () => {
  it('gives the published haversine example, Nashville to Los Angeles, for its radius of 6,372.8 km', () => {
    // Rosetta Code, 'Haversine formula': 2887.2599506071 km with R = 6372.8; ours has the IUGG radius.
    const km = greatCircleKm({ latitude: 36.12, longitude: -86.67 }, { latitude: 33.94, longitude: -118.4 })
    expect(km * 6372.8 / 6371.0088).toBeCloseTo(2887.2599506071, 6)
  })

  it('makes a minute of latitude a nautical mile, 1.852 km by definition, within 0.1 %', () => {
    const km = greatCircleKm({ latitude: 47, longitude: -97 }, { latitude: 47 + 1 / 60, longitude: -97 })
    expect(Math.abs(km / 1.852 - 1)).toBeLessThan(0.0011)
  })

  it('is 0 at home, the same both ways, and never shorter by a detour', () => {
    fc.assert(fc.property(coordinate, coordinate, coordinate, (a, b, c) => {
      expect(greatCircleKm(a, a)).toBe(0)
      expect(greatCircleKm(a, b)).toBeCloseTo(greatCircleKm(b, a), 6)
      expect(greatCircleKm(a, c) + greatCircleKm(c, b)).toBeGreaterThanOrEqual(greatCircleKm(a, b) - 1e-3) // the haversine loses digits near the antipodes
    }))
  })

  it.each([{ latitude: 91, longitude: 0 }, { latitude: 0, longitude: Number.NaN }])('refuses $latitude, $longitude', (place) => {
    expect(() => greatCircleKm(place, { latitude: 0, longitude: 0 })).toThrow(RangeError)
  })
})

describe('roadKm', () => {
  it('is 1.3 times the straight line', () => {
    const [from, to] = [{ latitude: 46.9, longitude: -96.8 }, { latitude: 46.95, longitude: -96.7 }]
    expect(roadKm(from, to)).toBeCloseTo(1.3 * greatCircleKm(from, to), 12)
  })
})

describe('roadHours', () => {
  it('takes an hour for 15 miles (1.609344 km each, by definition) at 15 mph', () => {
    expect(roadHours(15 * 1.609344, 15)).toBeCloseTo(1, 12)
  })

  it.each([[-1, 15], [3, 0], [3, Number.NaN]])('refuses %d km at %d mph', (km, mph) => {
    expect(() => roadHours(km, mph)).toThrow(RangeError)
  })
})

// geographiclib-geodesic measures on the ellipsoid; a sphere is off by 0.56 % at most (Karney 2013).
describe('against geographiclib-geodesic', () => {
  it('distances agree within 0.56 % over 1,000 pairs of places', () => {
    let worst = 0
    for (let i = 0; i < 1000; i++) {
      const from = { latitude: 40 + (i * 7 % 150) / 10, longitude: -110 + (i * 13 % 300) / 10 }
      const to = { latitude: from.latitude + ((i * 31 % 41) - 20) / 100, longitude: from.longitude + ((i * 17 % 43) - 21) / 100 }
      const metres = geodesic.Geodesic.WGS84.Inverse(from.latitude, from.longitude, to.latitude, to.longitude).s12!
      if (metres > 0) worst = Math.max(worst, Math.abs(greatCircleKm(from, to) * 1000 / metres - 1))
    }
    console.log(`distance: worst difference to geographiclib-geodesic ${(100 * worst).toFixed(3)} %`)
    expect(worst).toBeLessThan(0.0056)
  })
})
