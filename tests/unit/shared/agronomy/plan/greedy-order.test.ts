import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { byStakePerHour, greedyOrder } from '../../../../../shared/agronomy/plan/greedy-order'
import { randomFarm } from './random-farm'
import { fitIn, planProblem, type SmallFarm } from './small-farm'

const planted = { needed: [0, 0, 1, 0, 0] }
const farm = (fields: SmallFarm['fields'], over: Partial<SmallFarm> = {}): SmallFarm => ({
  hours: 96,
  moveHours: 0,
  fields,
  machines: [{ pass: 0, rateAcPerHour: 20, fromHour: 0, toHour: 24 }, { pass: 2, rateAcPerHour: 10, fromHour: 0, toHour: 24 }],
  runs: [[{ rainAt: 30, flags: fitIn(96, [0, 30]) }]],
  shareAfter: 0.9,
  ...over,
})

describe('greedyOrder', () => {
  it('goes first where an hour of the planter saves most', () => {
    const fields = [{ areaAc: 200, usdPerAc: 400, ...planted }, { areaAc: 150, usdPerAc: 900, ...planted }, { areaAc: 100, usdPerAc: 600, ...planted }]
    expect(greedyOrder(planProblem(farm(fields)), 'planter')).toEqual([1, 2, 0])
  })

  it('plants what is fit while the richer ground is still wet', () => {
    const wetUntil12 = { rainAt: 40, flags: fitIn(96, [12, 40]) }
    const ranked = greedyOrder(planProblem(farm(
      [{ areaAc: 150, usdPerAc: 900, ground: 1, ...planted }, { areaAc: 100, usdPerAc: 300, ...planted }],
      { runs: [[{ rainAt: 40, flags: fitIn(96, [0, 40]) }, wetUntil12]] },
    )), 'planter')
    expect(ranked).toEqual([1, 0])
  })

  it('waits an hour for the richer ground rather than start a long field just before', () => {
    const wetUntil1 = { rainAt: 20, flags: fitIn(96, [1, 20]) }
    const ranked = greedyOrder(planProblem(farm(
      [{ areaAc: 150, usdPerAc: 900, ground: 1, ...planted }, { areaAc: 150, usdPerAc: 300, ...planted }],
      { runs: [[{ rainAt: 20, flags: fitIn(96, [0, 20]) }, wetUntil1]] },
    )), 'planter')
    expect(ranked).toEqual([0, 1])
  })

  it('lets the digger wait for rich ground while the planter is busy, unless every machine must be kept busy', () => {
    // The first field is dug. Digging the second can't start before hour 6; the third could be dug by then.
    const wetUntil6 = { rainAt: 24, flags: fitIn(96, [6, 24]) }
    const problem = planProblem(farm(
      [{ areaAc: 100, doneAc: [100, 0, 0, 0, 0], usdPerAc: 900 }, { areaAc: 100, usdPerAc: 700, ground: 1 }, { areaAc: 100, usdPerAc: 300 }],
      { runs: [[{ rainAt: 24, flags: fitIn(96, [0, 24]) }, wetUntil6]] },
    ))
    expect(greedyOrder(problem, 'planter')).toEqual([0, 1, 2])
    expect(greedyOrder(problem, 'every machine')).toEqual([0, 2, 1])
  })

  it('goes by what is at stake when every field is done before rain either way', () => {
    const fields = [{ areaAc: 50, usdPerAc: 300, ...planted }, { areaAc: 50, usdPerAc: 800, ...planted }]
    expect(greedyOrder(planProblem(farm(fields)), 'planter')).toEqual([1, 0])
  })

  it('takes every field once', () => {
    fc.assert(fc.property(randomFarm, fc.constantFrom('planter' as const, 'every machine' as const), (random, keepBusy) => {
      expect([...greedyOrder(planProblem(random), keepBusy)].sort((a, b) => a - b)).toEqual(random.fields.map((_, field) => field))
    }), { numRuns: 60 })
  })
})

describe('byStakePerHour', () => {
  it('sorts by dollars at stake an hour of the planter, what isn’t known last', () => {
    const fields = [{ areaAc: 50, usdPerAc: Number.NaN, ...planted }, { areaAc: 200, usdPerAc: 500, ...planted }, { areaAc: 100, usdPerAc: 600, ...planted }]
    expect(byStakePerHour(planProblem(farm(fields)))).toEqual([2, 1, 0])
  })
})
