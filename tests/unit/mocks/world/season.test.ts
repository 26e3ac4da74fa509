import { describe, expect, it } from 'vitest'
import { FRONTS } from '../../../../mocks/world/fronts'
import { momentAt, radiationAt, rainBetween, TRUTH } from '../../../../mocks/world/season'
import { column, newestCycle, RUNS } from '../../../../mocks/world/service'

const farm = { latitude: 46.9, longitude: -96.8 }
const hours = (iso: string) => Date.parse(iso) / 3_600_000
const start = hours('2025-05-06T10:00Z')

/** Unix hour at which 2.54 mm have fallen since `from`. */
function onset(from: number, scenario: { madeAt: number, run: number }): number {
  let mm = 0
  for (let hour = from; hour < from + 120; hour++) if ((mm += rainBetween(hour, hour + 1, farm, scenario)) >= 2.54) return hour + 1
  return Infinity
}

describe('the invented season', () => {
  it('is weather: no damp above 100 %, no dew above the air, no sun at night, rain only under cloud', () => {
    for (let time = hours('2025-03-01T00:00Z'); time < hours('2025-07-10T00:00Z'); time += 1) {
      const moment = momentAt(time, farm, TRUTH)
      expect(moment.humidityPct).toBeLessThanOrEqual(100)
      expect(moment.dewPointC).toBeLessThanOrEqual(moment.temperatureC)
      expect(radiationAt(time, farm, TRUTH)).toBeLessThan(1100)
      if (time % 24 === 6) expect(radiationAt(time, farm, TRUTH)).toBe(0)
      if (rainBetween(time - 0.5, time + 0.5, farm, TRUTH) > 0.3) expect(moment.cloudPct).toBeGreaterThan(60)
    }
  })

  it('has snow in April, and the wind turns from south-east to north-west with a front', () => {
    const april = hours('2025-04-09T06:00Z')
    expect(rainBetween(april, april + 3, farm, TRUTH)).toBeGreaterThan(0.5)
    expect(momentAt(april + 1, farm, TRUTH).temperatureC).toBeLessThan(3)
    const front = FRONTS.find(each => each.startsAt === hours('2025-05-08T17:30Z'))!
    expect(Math.abs(momentAt(front.startsAt, farm, TRUTH).windFromDeg - 150)).toBeLessThan(50)
    expect(Math.abs(momentAt(front.startsAt + front.hours, farm, TRUTH).windFromDeg - 300)).toBeLessThan(50)
  })

  it('rains heavily about 58 hours after the demo starts, which half of the runs expect between 55 and 61 hours', () => {
    const truth = onset(start, TRUTH) - start
    expect(truth).toBeGreaterThan(56)
    expect(truth).toBeLessThan(62)
    const onsets = Array.from({ length: RUNS }, (_, run) => onset(start, { madeAt: newestCycle(start), run }) - start).sort((a, b) => a - b)
    expect(onsets[25]).toBeGreaterThanOrEqual(55)
    expect(onsets[25]).toBeLessThanOrEqual(61)
    expect(onsets[45]! - onsets[5]!).toBeGreaterThan(8)
  })

  it('is honest: the truth is as likely to lie anywhere among the runs, and the spread grows with the lead', () => {
    const ranks: number[] = []
    const spreads: Record<number, number[]> = { 12: [], 72: [] }
    for (const front of FRONTS.filter(each => each.scriptedError === undefined && each.mm >= 4)) {
      for (const lead of [12, 36, 72]) {
        const madeAt = Math.floor((front.startsAt - lead) / 6) * 6
        const from = front.startsAt - Math.min(lead, 30)
        const truth = onset(from, TRUTH)
        const runs = Array.from({ length: RUNS }, (_, run) => onset(from, { madeAt, run })).sort((a, b) => a - b)
        ranks.push(runs.filter(run => run < truth).length / RUNS)
        spreads[lead]?.push(runs[40]! - runs[10]!)
      }
    }
    const share = (low: number, high: number) => ranks.filter(rank => rank >= low && rank < high).length / ranks.length
    // Flat within what about eighty draws leave: each third holds a third, give or take 0.17 (three standard errors).
    for (const [low, high] of [[0, 1 / 3], [1 / 3, 2 / 3], [2 / 3, 1.01]] as const) expect(Math.abs(share(low, high) - 1 / 3)).toBeLessThan(0.17)
    const mean = (values: number[]) => values.filter(Number.isFinite).reduce((sum, value) => sum + value, 0) / values.length
    expect(mean(spreads[72]!)).toBeGreaterThan(2 * mean(spreads[12]!))
  })

  it('gives the same answer to the same question, and tells nothing of hours to come', () => {
    const ask = (now: number) => column('precipitation', farm, start - 240, 480, now, 7)
    expect(ask(start)).toEqual(ask(start))
    const truth = column('temperature_2m', farm, start, 120, start + 200, -1)
    expect(column('temperature_2m', farm, start, 120, start, -1).slice(24)).not.toEqual(truth.slice(24))
  })

  it('differs a little a few kilometres away', () => {
    const there = { latitude: 46.95, longitude: -96.7 }
    const sum = (place: typeof farm) => rainBetween(hours('2025-04-01T00:00Z'), hours('2025-05-06T00:00Z'), place, TRUTH)
    const rain = (place: typeof farm) => Array.from({ length: 800 }, (_, i) => rainBetween(start - 800 + i, start - 799 + i, place, TRUTH)).reduce((a, b) => a + b)
    expect(rain(there)).not.toBe(rain(farm))
    expect(Math.abs(rain(there) / rain(farm) - 1)).toBeLessThan(0.3)
    expect(sum(farm)).toBeGreaterThanOrEqual(0)
  })
})
