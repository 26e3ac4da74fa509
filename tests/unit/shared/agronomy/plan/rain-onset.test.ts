import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { RAIN_THRESHOLD_MM, rainOnset, shareStarted } from '../../../../../shared/agronomy/plan/rain-onset'
import { TEN_ONSETS, TEN_RUNS } from './ten-runs'

/** Our hours count from 0 at the start of the hour, the table's from 1 at its end. */
const fromTable = (hour: number | null) => hour === null ? Infinity : hour - 1

describe('rainOnset', () => {
  it('starts in the hour in which the sum reaches a tenth of an inch', () => {
    expect(RAIN_THRESHOLD_MM).toBeCloseTo(0.1 * 25.4, 12)
    expect(TEN_RUNS.map(run => rainOnset(run, 6))).toEqual(TEN_ONSETS.map(fromTable))
  })

  it('counts a sum that equals the threshold on paper, whatever its rounding', () => {
    expect(rainOnset(Float64Array.from({ length: 20 }, () => 0.254), 20)).toBe(9)
  })

  it('looks no further than the horizon', () => {
    expect(rainOnset(TEN_RUNS[0]!, 4)).toBe(Infinity)
    expect(rainOnset(TEN_RUNS[2]!, 600)).toBe(Infinity)
  })

  it('never comes later when every hour is wetter', () => {
    fc.assert(fc.property(fc.array(fc.double({ min: 0, max: 4, noNaN: true }), { maxLength: 48 }), fc.double({ min: 1, max: 3, noNaN: true }), (hours, factor) => {
      const run = Float64Array.from(hours)
      expect(rainOnset(run.map(mm => mm * factor), 48)).toBeLessThanOrEqual(rainOnset(run, 48))
    }))
  })

  it.each([Number.NaN, -0.1])('refuses %d mm', (mm) => {
    expect(() => rainOnset(Float64Array.of(0, mm), 2)).toThrow(RangeError)
  })
})

describe('shareStarted', () => {
  it('gives the table of the ten runs: 0, 0, .1, .3, .7, .8', () => {
    const started = shareStarted(TEN_ONSETS.map(fromTable), 6)
    expect([...started]).toEqual([0, 0, 0.1, 0.3, 0.7, 0.8].map(share => expect.closeTo(share, 12)))
  })

  it('never falls and never exceeds 1', () => {
    fc.assert(fc.property(fc.array(fc.oneof(fc.nat(30), fc.constant(Infinity)), { minLength: 1 }), (onsets) => {
      const started = shareStarted(onsets, 24)
      for (let hour = 1; hour < 24; hour++) expect(started[hour]).toBeGreaterThanOrEqual(started[hour - 1]!)
      expect(started[23]).toBeLessThanOrEqual(1)
    }))
  })
})
