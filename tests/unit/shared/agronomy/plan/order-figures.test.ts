import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { orderFigures, worthWhenLastUsd } from '../../../../../shared/agronomy/plan/order-figures'
import { randomFarm } from './random-farm'
import { fitIn, planProblem, type SmallFarm } from './small-farm'

/** Two fields of 100 ac, ten hours of planting each; rain after 12 hours in one run, after 40 in the other. */
const farm: SmallFarm = {
  hours: 96,
  moveHours: 0,
  fields: [{ areaAc: 100, needed: [0, 0, 1, 0, 0], usdPerAc: 700 }, { areaAc: 100, needed: [0, 0, 1, 0, 0], usdPerAc: 700 }],
  machines: [{ pass: 2, rateAcPerHour: 10, fromHour: 0, toHour: 24 }],
  runs: [12, 40].map(rainAt => [{ rainAt, flags: fitIn(96, [0, rainAt]) }]),
  shareAfter: 0.9,
}

describe('orderFigures', () => {
  it('counts the runs in which a field is done, and pays what is planted before rain, mean over the runs', () => {
    const { worthUsd, doneRuns } = orderFigures(planProblem(farm), [0, 1])
    expect([...doneRuns]).toEqual([2, 1])
    expect(worthUsd[0]).toBeCloseTo(100 * 0.1 * 700, 6)
    expect(worthUsd[1]).toBeCloseTo((20 + 100) / 2 * 0.1 * 700, 6)
  })
})

describe('worthWhenLastUsd', () => {
  it('is the worth of a field when all others go first', () => {
    const last = worthWhenLastUsd(planProblem(farm), [0, 1])
    expect(last[0]).toBeCloseTo((20 + 100) / 2 * 0.1 * 700, 6)
    expect(last[1]).toBeCloseTo((20 + 100) / 2 * 0.1 * 700, 6)
  })

  it('is never more than in its place, when each day keeps less and there is one machine a pass', () => {
    fc.assert(fc.property(randomFarm, (random) => {
      const falling: SmallFarm = { ...random, machines: [0, 2, 3, 5].map(index => random.machines[index]!), shareByHour: hour => 1 - Math.floor(hour / 24) / 50, shareAfter: 0.5 }
      const problem = planProblem(falling)
      const list = falling.fields.map((_, field) => field)
      const inPlace = orderFigures(problem, list).worthUsd
      const last = worthWhenLastUsd(problem, list)
      // What is equal on paper differs by rounding, and by the acre tolerance at each start.
      for (const field of list) expect(last[field]).toBeLessThanOrEqual(inPlace[field]! + 0.01)
    }))
  })
})
