import { describe, expect, it } from 'vitest'
import { hourlyRain, middleRun, rainLine } from '../../../../../shared/agronomy/plan/rain-line'
import { rainOnset } from '../../../../../shared/agronomy/plan/rain-onset'
import { TEN_RUNS } from './ten-runs'

const onsets = TEN_RUNS.map(run => rainOnset(run, 6))

describe('rainLine', () => {
  it('has the percentiles of the ten runs by rank: hour 3, hour 5, none', () => {
    expect(rainLine(TEN_RUNS, onsets)).toMatchObject({ earlyHour: 3 - 1, medianHour: 5 - 1, lateHour: null, share: 0.8 })
  })

  it('takes the likely amount from the runs that rain, each from its own onset', () => {
    // From the onset on: 2.5, 1.5, 3.5, 2, 3, 5, 1.2, 4 mm; the fourth smallest of eight is 2.5.
    expect(rainLine(TEN_RUNS, onsets).likelyMm).toBeCloseTo(2.5, 12)
  })

  it('adds up 48 hours and no more', () => {
    const steady = Float64Array.from({ length: 120 }, () => 2.54)
    expect(rainLine([steady], [0]).likelyMm).toBeCloseTo(48 * 2.54, 9)
  })

  it('knows no hour when no run rains', () => {
    const dry = [new Float64Array(120), new Float64Array(120)]
    expect(rainLine(dry, [Infinity, Infinity])).toEqual({ medianHour: null, earlyHour: null, lateHour: null, share: 0, likelyMm: null })
  })

  it('refuses no runs', () => {
    expect(() => rainLine([], [])).toThrow(RangeError)
  })
})

describe('middleRun', () => {
  it('is one that starts at the median hour with rain nearest the likely amount', () => {
    expect(middleRun(TEN_RUNS, onsets)).toBe(0)
  })

  it('is a dry run when half of the runs are dry', () => {
    expect(middleRun(TEN_RUNS.slice(0, 3), [Infinity, 5, Infinity])).toBe(0)
  })
})

describe('hourlyRain', () => {
  it('is the mean over the runs and the share of runs wetter than 0.1 mm', () => {
    const { meanMm, wetShare } = hourlyRain(TEN_RUNS, 6)
    expect(meanMm[2]).toBeCloseTo((0.2 + 2.5 + 1 + 0.8 + 1.5) / 10, 12)
    expect(wetShare[2]).toBeCloseTo(0.5, 12)
    expect(wetShare[0]).toBe(0)
  })
})
