import { describe, expect, it } from 'vitest'
import { simulate } from '../../../../../shared/agronomy/plan/simulate'
import { createTimeline } from '../../../../../shared/agronomy/plan/timeline'
import { isDoneBeforeRain, planterHours, plantedWorthUsd, stakeUsd } from '../../../../../shared/agronomy/plan/worth'
import { fitIn, planProblem, type SmallFarm } from './small-farm'

/** 100 ac at 10 ac/h from hour 1; a day's share drops from 0.98 to 0.95 at midnight (hour 19); fit again at 0.90. */
const farm = (over: Partial<SmallFarm> = {}): SmallFarm => ({
  hours: 96,
  fields: [{ areaAc: 100, needed: [0, 0, 1, 0, 0], usdPerAc: 700 }],
  machines: [{ pass: 2, rateAcPerHour: 10, at: 0 }],
  runs: [[{ rainAt: 50, flags: fitIn(96, [0, 50]) }]],
  shareByHour: hour => hour < 19 ? 0.98 : 0.95,
  shareAfter: 0.9,
  ...over,
})

function worked(written: SmallFarm) {
  const problem = planProblem(written)
  const timeline = createTimeline(written.fields.length)
  simulate(problem, [[0]], 0, 2, timeline)
  return { problem, timeline, worth: plantedWorthUsd(problem, timeline, 0, 0), done: isDoneBeforeRain(problem, timeline, 0, 0) }
}

describe('plantedWorthUsd', () => {
  it('is acres × what their day keeps over waiting × $/ac', () => {
    const { worth, done } = worked(farm())
    expect(worth).toBeCloseTo(100 * (0.98 - 0.9) * 700, 6)
    expect(done).toBe(true)
  })

  it('pays each acre by its own day', () => {
    // The planter is up at hour 26: all of it falls on the second day.
    const { worth } = worked(farm({ machines: [{ pass: 2, rateAcPerHour: 10, at: 0, downUntil: 26 }] }))
    expect(worth).toBeCloseTo(100 * (0.95 - 0.9) * 700, 6)
  })

  it('pays part of a field for the part, and nothing after rain', () => {
    const { worth, done } = worked(farm({ runs: [[{ rainAt: 4.0, flags: fitIn(96, [0, 4], [60, 96]) }]] }))
    expect(worth).toBeCloseTo(30 * (0.98 - 0.9) * 700, 6)
    expect(done).toBe(false)
  })

  it('is 0 when nothing is planted before rain', () => {
    expect(worked(farm({ runs: [[{ rainAt: 0, flags: fitIn(96, [60, 96]) }]] })).worth).toBe(0)
  })

  it('is negative where waiting gains, as before the best date', () => {
    expect(worked(farm({ shareAfter: 1 })).worth).toBeCloseTo(100 * (0.98 - 1) * 700, 6)
  })

  it.each([
    ['the share after rain', { shareAfter: Number.NaN }],
    ['the share of the day', { shareByHour: () => Number.NaN }],
    ['yield or price', { fields: [{ areaAc: 100, needed: [0, 0, 1, 0, 0], usdPerAc: Number.NaN }] }],
  ])('is not known without %s', (_, over) => {
    expect(worked(farm(over)).worth).toBeNaN()
  })
})

describe('stakeUsd', () => {
  it('is all acres left, planted as soon as the ground may be, against waiting', () => {
    expect(stakeUsd(planProblem(farm()), 0, 0)).toBeCloseTo(100 * 0.08 * 700, 6)
    expect(stakeUsd(planProblem(farm({ fields: [{ areaAc: 100, doneAc: [0, 0, 40, 0, 0], needed: [0, 0, 1, 0, 0], usdPerAc: 700 }] })), 0, 0)).toBeCloseTo(60 * 0.08 * 700, 6)
    expect(stakeUsd(planProblem(farm({ runs: [[{ rainAt: 50, flags: fitIn(96, [20, 50]) }]] })), 0, 0)).toBeCloseTo(100 * 0.05 * 700, 6)
  })

  it('is nothing for ground that isn’t fit before the rain', () => {
    expect(stakeUsd(planProblem(farm({ runs: [[{ rainAt: 50, flags: fitIn(96, [60, 96]) }]] })), 0, 0)).toBe(0)
  })
})

describe('isDoneBeforeRain', () => {
  it('holds in a dry run when planting ends within the horizon', () => {
    expect(worked(farm({ runs: [[{ rainAt: Infinity, flags: fitIn(96, [0, 96]) }]] })).done).toBe(true)
    expect(worked(farm({ runs: [[{ rainAt: Infinity, flags: fitIn(96, [0, 4]) }]] })).done).toBe(false)
  })
})

describe('planterHours', () => {
  it('is acres left over the planter’s rate', () => {
    const problem = planProblem(farm({ fields: [{ areaAc: 236, doneAc: [236, 0, 90, 0, 0] }] }))
    expect(planterHours(problem.fields[0]!, 26)).toBeCloseTo(146 / 26, 12)
  })
})
