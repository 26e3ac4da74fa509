import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { createTimeline } from '../../../../../shared/agronomy/plan/timeline'
import { workPass } from '../../../../../shared/agronomy/plan/work-pass'
import { fitIn, planProblem, type SmallFarm } from './small-farm'

const PLANT = 2
const farm = (flags: Uint8Array[], rateAcPerHour: number): SmallFarm => ({
  hours: 48,
  fields: [{ areaAc: 100, needed: [0, 0, 1, 0, 0] }],
  machines: [{ pass: PLANT, rateAcPerHour, fromHour: 0, toHour: 24 }],
  runs: [[{ rainAt: Infinity, flags }]],
})
const visit = { machine: 0, field: 0, leader: -1, arriveAt: 0, notBefore: 0, notAfter: Infinity }

describe('workPass', () => {
  it('leaves when the last acre is done', () => {
    expect(workPass(planProblem(farm(fitIn(48, [0, 48]), 20)), 0, visit, createTimeline(1))).toBe(5)
  })

  it('is kept to the end by a field that isn’t finished, and until closing time where there is one', () => {
    const problem = planProblem(farm(fitIn(48, [0, 2]), 20))
    expect(workPass(problem, 0, visit, createTimeline(1))).toBe(Infinity)
    expect(workPass(problem, 0, { ...visit, notAfter: 30 }, createTimeline(1))).toBe(30)
  })

  it('starts no sooner than it may', () => {
    const timeline = createTimeline(1)
    workPass(planProblem(farm(fitIn(48, [0, 48]), 20)), 0, { ...visit, notBefore: 7.5 }, timeline)
    expect(timeline.from[timeline.first[PLANT]!]).toBe(7.5)
  })

  it('takes acres ÷ rate of fit hours, however they are cut up', () => {
    fc.assert(fc.property(fc.array(fc.boolean(), { minLength: 48, maxLength: 48 }), fc.integer({ min: 3, max: 30 }), (fit, rate) => {
      const flags = Array.from({ length: 5 }, () => Uint8Array.from(fit, Number))
      const timeline = createTimeline(1)
      workPass(planProblem(farm(flags, rate)), 0, visit, timeline)
      let worked = 0
      for (let piece = 0; piece < timeline.used; piece++) worked += timeline.to[piece]! - timeline.from[piece]!
      const fitHours = fit.filter(Boolean).length
      expect(worked).toBeCloseTo(Math.min(fitHours, 100 / rate), 6)
    }))
  })
})
