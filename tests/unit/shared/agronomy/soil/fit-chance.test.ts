import { describe, expect, it } from 'vitest'
import { fieldSoil } from '../../../../../shared/agronomy/soil/field-soil'
import { fitChance, hourOfChance } from '../../../../../shared/agronomy/soil/fit-chance'
import { drawParticles, particleRoom } from '../../../../../shared/agronomy/soil/particles'
import { seededRandom } from '../../../../../shared/agronomy/soil/random'
import { evenWeather } from './even-weather'

const HOURS = 24 * 8
const soil = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 0)
const run = (rainAt: number) => {
  const { weather, etoMm } = evenWeather(HOURS, 6, hour => hour >= rainAt && hour < rainAt + 5 ? 4 : 0, () => 12, 3)
  return { weather, etoMm }
}
const { localHour } = evenWeather(HOURS, 6, () => 0, () => 12, 3)

describe('fitChance', () => {
  it('never falls with time, and is the mean of its runs', () => {
    const particles = drawParticles(soil, 40, seededRandom(1), 'grid', 12)
    const room = particleRoom(HOURS)
    const both = fitChance(particles, [run(0), run(60)], localHour, 'seedZoneFit', room).fitBy
    const [one, two] = [0, 60].map(rainAt => fitChance(particles, [run(rainAt)], localHour, 'seedZoneFit', room).fitBy)
    for (let hour = 0; hour < HOURS; hour++) {
      expect(both[hour]).toBeCloseTo((one![hour]! + two![hour]!) / 2, 9)
      expect(both[hour]).toBeGreaterThanOrEqual(both[hour - 1] ?? 0)
      expect(both[hour]).toBeLessThanOrEqual(1)
    }
  })

  it('leaves the versions as they were', () => {
    const particles = drawParticles(soil, 5, seededRandom(1), 'grid', 12)
    const before = JSON.stringify(particles)
    fitChance(particles, [run(0)], localHour, 'tillageFit', particleRoom(HOURS))
    expect(JSON.stringify(particles)).toBe(before)
  })

  it('says when a share is not reached', () => {
    expect(hourOfChance({ hours: 3, fitBy: Float64Array.of(0.1, 0.4, 0.6) }, 0.5)).toBe(2)
    expect(hourOfChance({ hours: 3, fitBy: Float64Array.of(0.1, 0.4, 0.6) }, 0.9)).toBeNull()
  })

  it('refuses nothing to run', () => {
    const particles = drawParticles(soil, 2, seededRandom(1), 'grid', 12)
    const shorter = evenWeather(24, 6, () => 0, () => 12, 3)
    for (const wrong of [() => fitChance([], [run(0)], localHour, 'carries', particleRoom(HOURS)), () => fitChance(particles, [], localHour, 'carries', particleRoom(HOURS)), () => fitChance(particles, [run(0), shorter], localHour, 'carries', particleRoom(HOURS)), () => hourOfChance({ hours: 1, fitBy: Float64Array.of(0) }, 0)]) expect(wrong).toThrow(RangeError)
  })
})
