import { describe, expect, it } from 'vitest'
import { assignMachines } from '../../../../../shared/agronomy/plan/assign-machines'
import { acresBy, fieldsToLeaveUndug, holdBack } from '../../../../../shared/agronomy/plan/leave-undug'
import { simulate } from '../../../../../shared/agronomy/plan/simulate'
import { createTimeline } from '../../../../../shared/agronomy/plan/timeline'
import { fitIn, planProblem, type SmallFarm } from './small-farm'

const DIG = 0
/** Rain at hour 10; digging is quick and planting slow, so the digger gets to fields that the planter can't. */
const farm = (fields: SmallFarm['fields']): SmallFarm => ({
  hours: 96,
  moveHours: 0,
  fields,
  machines: [{ pass: 0, rateAcPerHour: 60, at: 0 }, { pass: 2, rateAcPerHour: 10, at: 0 }],
  runs: [[{ rainAt: 10, flags: fitIn(96, [0, 10], [50, 96]) }]],
})

describe('fieldsToLeaveUndug', () => {
  it('names unlikely fields that would be opened and not planted', () => {
    const problem = planProblem(farm([{ areaAc: 80 }, { areaAc: 80 }, { areaAc: 400 }]))
    // The planter is in the first field until 9.33; of the second it would plant some 7 ac before rain, of the third none.
    expect(fieldsToLeaveUndug(problem, [0, 1, 2], [1, 2], 0)).toEqual([1, 2])
  })

  it('keeps a field that is mostly planted by the rain, though it can’t be finished', () => {
    const problem = planProblem(farm([{ areaAc: 100, needed: [1, 0, 1, 0, 0] }]))
    // Planted from 1.33 to 10: 87 of the 100 ac that are dug.
    expect(fieldsToLeaveUndug(problem, [0], [0], 0)).toEqual([])
  })

  it('judges the fields behind a held one by the time that it leaves', () => {
    // Held, the big second field frees the planter for the third, which is then planted whole.
    const problem = planProblem(farm([{ areaAc: 30 }, { areaAc: 400, doneAc: [0, 0, 0, 0, 0], ground: 0 }, { areaAc: 40 }]))
    expect(fieldsToLeaveUndug(problem, [0, 1, 2], [1, 2], 0)).toEqual([1])
  })

  it('leaves out what is begun already', () => {
    const problem = planProblem(farm([{ areaAc: 80 }, { areaAc: 80, doneAc: [10, 0, 0, 0, 0] }]))
    expect(fieldsToLeaveUndug(problem, [0, 1], [1], 0)).toEqual([])
  })

  it('names none in a run without rain', () => {
    const dry = { ...farm([{ areaAc: 80 }, { areaAc: 80 }]), runs: [[{ rainAt: Infinity, flags: fitIn(96, [0, 96]) }]] }
    expect(fieldsToLeaveUndug(planProblem(dry), [0, 1], [1], 0)).toEqual([])
  })
})

describe('holdBack', () => {
  it('keeps held fields untouched until the rain and works the others on', () => {
    const written = farm([{ areaAc: 80 }, { areaAc: 80 }, { areaAc: 80 }])
    const { problem, list } = holdBack(planProblem(written), [0, 1, 2], [1], 0)
    const timeline = createTimeline(3)
    simulate(problem, assignMachines(problem, list).sequences, 0, 4, timeline)
    expect(list).toEqual([0, 2, 1])
    expect(timeline.from[timeline.first[1 * 5 + DIG]!]).toBeGreaterThanOrEqual(50)
    expect(timeline.finishedAt[2 * 5 + DIG]).toBeLessThan(10)
  })
})

describe('acresBy', () => {
  it('counts the part of a piece that is done by the hour', () => {
    const problem = planProblem(farm([{ areaAc: 120 }]))
    const timeline = createTimeline(1)
    simulate(problem, [[0], [0]], 0, 4, timeline)
    expect(acresBy(timeline, DIG, 0)).toBe(0)
    expect(acresBy(timeline, DIG, 2)).toBeCloseTo(60, 9)
    expect(acresBy(timeline, DIG, 90)).toBeCloseTo(120, 9)
  })
})
