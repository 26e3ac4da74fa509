import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plottingPosition } from '../../../../../shared/agronomy/plan/chance'
import { orderFigures } from '../../../../../shared/agronomy/plan/order-figures'
import { rankFields, UNLIKELY_BELOW } from '../../../../../shared/agronomy/plan/rank-fields'
import { randomFarm } from './random-farm'
import { fitIn, planProblem, type SmallFarm } from './small-farm'

const planted = { needed: [0, 0, 1, 0, 0] }
const farm = (fields: SmallFarm['fields'], over: Partial<SmallFarm> = {}): SmallFarm => ({
  hours: 96,
  moveHours: 0,
  fields,
  machines: [{ pass: 2, rateAcPerHour: 10, fromHour: 0, toHour: 24 }],
  runs: [[{ rainAt: 30, flags: fitIn(96, [0, 30]) }]],
  shareAfter: 0.9,
  ...over,
})

describe('rankFields', () => {
  it('goes first where an hour of the planter saves most', () => {
    const ranked = rankFields(planProblem(farm([
      { areaAc: 200, usdPerAc: 400, ...planted },
      { areaAc: 150, usdPerAc: 900, ...planted },
      { areaAc: 100, usdPerAc: 600, ...planted },
    ])))
    expect(ranked).toEqual([1, 2, 0])
  })

  it('plants what is fit while the richer ground is still wet', () => {
    const wetUntil12 = { rainAt: 40, flags: fitIn(96, [12, 40]) }
    const ranked = rankFields(planProblem(farm(
      [{ areaAc: 150, usdPerAc: 900, ground: 1, ...planted }, { areaAc: 100, usdPerAc: 300, ...planted }],
      { runs: [[{ rainAt: 40, flags: fitIn(96, [0, 40]) }, wetUntil12]] },
    )))
    expect(ranked).toEqual([1, 0])
  })

  it('waits an hour for the richer ground rather than start a long field just before', () => {
    const wetUntil1 = { rainAt: 20, flags: fitIn(96, [1, 20]) }
    const ranked = rankFields(planProblem(farm(
      [{ areaAc: 150, usdPerAc: 900, ground: 1, ...planted }, { areaAc: 150, usdPerAc: 300, ...planted }],
      { runs: [[{ rainAt: 20, flags: fitIn(96, [0, 20]) }, wetUntil1]] },
    )))
    expect(ranked).toEqual([0, 1])
  })

  it('puts fields whose figures aren’t known behind the others', () => {
    const ranked = rankFields(planProblem(farm([
      { areaAc: 100, usdPerAc: Number.NaN, ...planted },
      { areaAc: 100, usdPerAc: 500, ...planted },
    ])))
    expect(ranked).toEqual([1, 0])
  })

  it('lets ties fall to the field that comes first', () => {
    const alike = { areaAc: 100, usdPerAc: 500, ...planted }
    expect(rankFields(planProblem(farm([alike, alike, alike])))).toEqual([0, 1, 2])
  })

  it('ranks every field once, the likely ones before the unlikely, and the same way each time', () => {
    fc.assert(fc.property(randomFarm, (random) => {
      const problem = planProblem(random)
      const ranked = rankFields(problem)
      expect([...ranked].sort((a, b) => a - b)).toEqual(random.fields.map((_, field) => field))
      expect(rankFields(planProblem(random))).toEqual(ranked)
    }), { numRuns: 60 })
  })

  it('keeps fields that are unlikely before rain behind those that are likely, with one machine a pass', () => {
    fc.assert(fc.property(randomFarm, (random) => {
      const single = { ...random, machines: [0, 2, 3, 5].map(index => random.machines[index]!) }
      const problem = planProblem(single)
      const ranked = rankFields(problem)
      const { doneRuns } = orderFigures(problem, ranked)
      const likely = ranked.map(field => plottingPosition(doneRuns[field]!, problem.runs) >= UNLIKELY_BELOW)
      expect(likely).toEqual([...likely].sort((a, b) => Number(b) - Number(a)))
    }), { numRuns: 100 })
  })
})
