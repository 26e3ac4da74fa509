import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { blockedBy, goRuns, type SprayConditions, type SprayLimits } from '../../../../../shared/agronomy/spray/spray-hour'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const label = (value: number) => ({ value, source: 'an invented label' })
const limits: SprayLimits = {
  leastWindMs: label(1.3), mostWindMs: label(4.5), gustOverMs: label(2.2), downwindHalfDeg: label(45), inversion: { closes: 'possible', source: 'an invented label' }, mostDeltaTC: label(10),
  leastTemperatureC: label(4), mostTemperatureC: label(29), mostRainChance: label(0.2), mostRainMm: label(0.5), mostRunoffChance: label(0.5), daylight: { source: 'an invented label' },
}
const good: SprayConditions = { wind: { forLeastMs: 2, forMostMs: 3 }, gustMs: 4, windFromDeg: 270, sensitiveDeg: [270], inversion: 'unlikely', deltaTC: 5, temperatureC: 18, rain: { largestChance: 0.1, sumMm: 0.2 }, runoffChance: 0.1, inDaylight: true }
const what = (over: Partial<SprayConditions>) => blockedBy({ ...good, ...over }, limits).map(reason => reason.what)

describe('blockedBy', () => {
  it('finds nothing against a good hour', () => {
    expect(what({})).toEqual([])
  })

  it.each([
    ['wind-low', { wind: { forLeastMs: 1, forMostMs: 2 } }], ['wind-high', { wind: { forLeastMs: 2, forMostMs: 5 } }], ['gust', { gustMs: 7 }], ['downwind', { sensitiveDeg: [270, 100] }], ['inversion', { inversion: 'possible' }], ['inversion', { inversion: 'likely' }],
    ['delta-t', { deltaTC: 11 }], ['too-cold', { temperatureC: 3 }], ['too-warm', { temperatureC: 30 }], ['rain-soon', { rain: { largestChance: 0.3, sumMm: 0 } }], ['rain-soon', { rain: { largestChance: 0.1, sumMm: 1 } }], ['runoff', { runoffChance: 0.6 }], ['night', { inDaylight: false }],
    ['not-known', { gustMs: null }], ['not-known', { rain: null }], ['not-known', { runoffChance: null }],
  ] as const)('closes the hour for %s', (reason, over) => {
    expect(what(over as Partial<SprayConditions>)).toEqual([reason])
  })

  it('names every reason, with figure, limit and source', () => {
    const reasons = blockedBy({ ...good, temperatureC: 31, inDaylight: false, gustMs: 9 }, limits)
    expect(reasons.map(reason => reason.what)).toEqual(['gust', 'too-warm', 'night'])
    expect(reasons[1]).toEqual({ what: 'too-warm', found: 31, limit: 29, source: 'an invented label' })
  })

  it('closes no hour by a limit that the product does not have', () => {
    const none = Object.fromEntries(Object.keys(limits).map(key => [key, null])) as unknown as SprayLimits
    expect(blockedBy({ ...good, wind: { forLeastMs: 0, forMostMs: 30 }, gustMs: null, rain: null, inversion: 'likely', inDaylight: false }, none)).toEqual([])
  })

  it('refuses an hour without wind or temperature', () => {
    expect(() => what({ temperatureC: Number.NaN })).toThrow(RangeError)
  })
})

describe('goRuns', () => {
  it('hold exactly the open hours', () => {
    fc.assert(fc.property(fc.array(fc.boolean(), { maxLength: 60 }), (open) => {
      const back = Array<boolean>(open.length).fill(false)
      for (const { from, hours } of goRuns(open)) for (let i = 0; i < hours; i++) back[from + i] = true
      expect(back).toEqual(open)
    }), { numRuns: 1000 })
  })

  it('leave out what is too short', () => {
    expect(goRuns([true, false, true, true], 2)).toEqual([{ from: 2, hours: 2 }])
    expect(() => goRuns([true], 0)).toThrow(RangeError)
  })
})
