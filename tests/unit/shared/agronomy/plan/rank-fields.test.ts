import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plottingPosition } from '../../../../../shared/agronomy/plan/chance'
import { byStakePerHour } from '../../../../../shared/agronomy/plan/greedy-order'
import { orderFigures } from '../../../../../shared/agronomy/plan/order-figures'
import { driestFirst, nearestFirst, rankFields, totalWorthUsd, unlikelyLast, UNLIKELY_BELOW } from '../../../../../shared/agronomy/plan/rank-fields'
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

  it('is never worth less than what a person would try, with the same fields put off', () => {
    fc.assert(fc.property(randomFarm, (random) => {
      const problem = planProblem({ ...random, shareByHour: hour => 1 - Math.floor(hour / 24) / 50, shareAfter: 0.5 })
      const worth = (list: number[]) => totalWorthUsd(orderFigures(problem, list))
      const ranked = worth(rankFields(problem))
      for (const made of [byStakePerHour(problem), nearestFirst(problem), driestFirst(problem)]) {
        expect(ranked).toBeGreaterThanOrEqual(worth(unlikelyLast(problem, made)) - 0.05)
      }
    }), { numRuns: 100 })
  })
})

describe('nearestFirst', () => {
  it('goes from field to field, always to the nearest', () => {
    const problem = planProblem(farm([{ areaAc: 10, ...planted }, { areaAc: 10, ...planted }, { areaAc: 10, ...planted }]))
    const planter = problem.machines[0]!
    planter.firstMoveHours.set([3, 1, 2])
    planter.moveHours.set([0, 5, 5, 4, 0, 9, 5, 5, 0])
    expect(nearestFirst(problem)).toEqual([1, 0, 2])
  })
})

describe('driestFirst', () => {
  it('goes by the hour in which a field may first be planted', () => {
    const grounds = [30, 2, Infinity].map(from => ({ rainAt: Infinity, flags: fitIn(96, [from, 96]) }))
    expect(driestFirst(planProblem(farm([2, 0, 1].map(ground => ({ areaAc: 10, ground, ...planted })), { runs: [grounds] })))).toEqual([2, 1, 0])
  })
})

describe('totalWorthUsd', () => {
  it('adds up what is known', () => {
    expect(totalWorthUsd({ worthUsd: Float64Array.of(100, Number.NaN, 20), doneRuns: new Int32Array(3) })).toBe(120)
  })
})
