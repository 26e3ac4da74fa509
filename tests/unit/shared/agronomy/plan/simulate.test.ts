import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { assignMachines } from '../../../../../shared/agronomy/plan/assign-machines'
import { afterWorking, ROLL_CLOSES_HOURS, simulate, SPRAY_CLOSES_HOURS } from '../../../../../shared/agronomy/plan/simulate'
import { createTimeline, type Timeline } from '../../../../../shared/agronomy/plan/timeline'
import { isDoneBeforeRain } from '../../../../../shared/agronomy/plan/worth'
import { randomFarm } from './random-farm'
import { fitIn, planProblem, type SmallFarm } from './small-farm'
import { whatIsWrong } from './timeline-checker'

const [DIG, PLANT, ROLL, SPRAY] = [0, 2, 3, 4] as const

/** The farm's fields in their own order, in one run. */
function timelineOf(farm: SmallFarm, run = 0): Timeline {
  const problem = planProblem(farm)
  const timeline = createTimeline(farm.fields.length)
  simulate(problem, assignMachines(problem, farm.fields.map((_, field) => field)).sequences, run, SPRAY, timeline)
  return timeline
}

const startOf = (timeline: Timeline, field: number, pass: number) => timeline.from[timeline.first[field * 5 + pass]!]!
const endOf = (timeline: Timeline, field: number, pass: number) => timeline.finishedAt[field * 5 + pass]!
const always = fitIn(96, [0, 96])

describe('simulate', () => {
  it('works one field: the planter waits for 20 ac of lead, catches up and follows at the digger’s pace', () => {
    const timeline = timelineOf({
      hours: 96,
      fields: [{ areaAc: 120 }],
      machines: [{ pass: DIG, rateAcPerHour: 20, at: 0 }, { pass: PLANT, rateAcPerHour: 40, at: 0 }],
      runs: [[{ rainAt: Infinity, flags: always }]],
    })
    // Shift starts an hour in. Digging 1 to 7; planting starts at 2, catches up at 3 (lead ÷ (40 − 20)), then follows.
    expect(startOf(timeline, 0, DIG)).toBe(1)
    expect(endOf(timeline, 0, DIG)).toBeCloseTo(7, 9)
    expect(startOf(timeline, 0, PLANT)).toBeCloseTo(2, 6)
    expect(timeline.to[timeline.first[PLANT]!]).toBeCloseTo(3, 5)
    expect(endOf(timeline, 0, PLANT)).toBeCloseTo(7, 5)
  })

  it('takes a quarter of the field as lead when that is less than 20 ac', () => {
    const timeline = timelineOf({
      hours: 96,
      fields: [{ areaAc: 40 }],
      machines: [{ pass: DIG, rateAcPerHour: 10, at: 0 }, { pass: PLANT, rateAcPerHour: 10, at: 0 }],
      runs: [[{ rainAt: Infinity, flags: always }]],
    })
    expect(startOf(timeline, 0, PLANT)).toBeCloseTo(2, 6)
    expect(endOf(timeline, 0, PLANT)).toBeCloseTo(6, 6)
  })

  it('stops at rain, keeps the acres done, and goes on when the ground is fit again', () => {
    const timeline = timelineOf({
      hours: 96,
      fields: [{ areaAc: 100, needed: [0, 0, 1, 0, 0] }],
      machines: [{ pass: PLANT, rateAcPerHour: 20, at: 0 }],
      runs: [[{ rainAt: 3, flags: fitIn(96, [0, 3], [50, 96]) }]],
    })
    const first = timeline.first[PLANT]!
    expect([timeline.from[first], timeline.to[first], timeline.acTo[first]]).toEqual([1, 3, 40])
    expect([timeline.from[first + 1], timeline.acFrom[first + 1]]).toEqual([50, 40])
    expect(endOf(timeline, 0, PLANT)).toBeCloseTo(53, 9)
  })

  it('stops in the hour in which rain starts even where the ground would stay fit', () => {
    const timeline = timelineOf({
      hours: 96,
      fields: [{ areaAc: 100, needed: [0, 0, 1, 0, 0] }],
      machines: [{ pass: PLANT, rateAcPerHour: 20, at: 0 }],
      runs: [[{ rainAt: 3, flags: always }]],
    })
    expect(endOf(timeline, 0, PLANT)).toBeCloseTo(7, 9)
  })

  it('spends working hours on the road and stays where it is over night', () => {
    const timeline = timelineOf({
      hours: 96,
      moveHours: 1,
      fields: [{ areaAc: 145, needed: [0, 0, 1, 0, 0] }, { areaAc: 10, needed: [0, 0, 1, 0, 0] }],
      machines: [{ pass: PLANT, rateAcPerHour: 10, at: 0 }],
      runs: [[{ rainAt: Infinity, flags: always }]],
    })
    // Done at 15.5; half an hour on the road before the shift ends at 16, the other half from 25 on.
    expect(endOf(timeline, 0, PLANT)).toBeCloseTo(15.5, 9)
    expect(startOf(timeline, 1, PLANT)).toBeCloseTo(25.5, 9)
  })

  it('keeps a machine home while it is down', () => {
    const timeline = timelineOf({
      hours: 96,
      fields: [{ areaAc: 10, needed: [0, 0, 1, 0, 0] }],
      machines: [{ pass: PLANT, rateAcPerHour: 10, at: 0, downUntil: 30 }],
      runs: [[{ rainAt: Infinity, flags: always }]],
    })
    expect(startOf(timeline, 0, PLANT)).toBe(30)
  })

  it('starts from the acres that are done, and leaves a finished pass alone', () => {
    const timeline = timelineOf({
      hours: 96,
      fields: [{ areaAc: 236, doneAc: [236, 0, 90, 0, 0] }],
      machines: [{ pass: DIG, rateAcPerHour: 30, at: 0 }, { pass: PLANT, rateAcPerHour: 26, at: 0 }],
      runs: [[{ rainAt: Infinity, flags: always }]],
    })
    expect(timeline.count[DIG]).toBe(0)
    expect(endOf(timeline, 0, DIG)).toBe(0)
    expect(endOf(timeline, 0, PLANT)).toBeCloseTo(1 + 146 / 26, 9)
  })

  it('begins nothing in a field that is held back', () => {
    const timeline = timelineOf({
      hours: 96,
      fields: [{ areaAc: 20, heldUntil: 33 }],
      machines: [{ pass: DIG, rateAcPerHour: 20, at: 0 }, { pass: PLANT, rateAcPerHour: 20, at: 0 }],
      runs: [[{ rainAt: Infinity, flags: always }]],
    })
    expect(startOf(timeline, 0, DIG)).toBe(33)
    expect(startOf(timeline, 0, PLANT)).toBeGreaterThan(33)
  })

  it('sends two machines of one pass to different fields', () => {
    const timeline = timelineOf({
      hours: 96,
      fields: [{ areaAc: 100, needed: [0, 0, 1, 0, 0] }, { areaAc: 100, needed: [0, 0, 1, 0, 0] }],
      machines: [{ pass: PLANT, rateAcPerHour: 20, at: 0 }, { pass: PLANT, rateAcPerHour: 20, at: 1 }],
      runs: [[{ rainAt: Infinity, flags: always }]],
    })
    expect([endOf(timeline, 0, PLANT), endOf(timeline, 1, PLANT)]).toEqual([6, 6])
    expect([timeline.machine[PLANT], timeline.machine[5 + PLANT]]).toEqual([0, 1])
  })

  it('doesn’t roll once the seed has been in the ground too long, and then sprays behind the planter', () => {
    const farm = {
      hours: 96,
      fields: [{ areaAc: 40, needed: [0, 0, 1, 1, 1] }],
      machines: [{ pass: PLANT, rateAcPerHour: 40, at: 0 }, { pass: ROLL, rateAcPerHour: 40, at: 0, downUntil: 60 }, { pass: SPRAY, rateAcPerHour: 40, at: 0 }],
      runs: [[{ rainAt: Infinity, flags: always }]],
    }
    const timeline = timelineOf(farm)
    expect(endOf(timeline, 0, PLANT)).toBeCloseTo(2, 9)
    expect(timeline.count[ROLL]).toBe(0)
    expect(startOf(timeline, 0, SPRAY)).toBeGreaterThanOrEqual(2 + ROLL_CLOSES_HOURS)
    expect(endOf(timeline, 0, SPRAY)).toBeLessThanOrEqual(2 + SPRAY_CLOSES_HOURS)
  })

  it('tells nothing impossible, in any run of any farm', () => {
    fc.assert(fc.property(randomFarm, (farm) => {
      for (const run of farm.runs.keys()) expect(whatIsWrong(farm, run, timelineOf(farm, run))).toEqual([])
    }), { numRuns: 400 })
  })

  it('never does less by any hour, nor finishes later, with a faster machine', () => {
    fc.assert(fc.property(randomFarm, fc.nat(5), fc.double({ min: 1, max: 3, noNaN: true }), (farm, machine, factor) => {
      const faster = structuredClone(farm)
      const problem = planProblem(farm)
      const { sequences } = assignMachines(problem, farm.fields.map((_, field) => field))
      faster.machines[machine]!.rateAcPerHour *= factor
      const [before, after] = [createTimeline(farm.fields.length), createTimeline(farm.fields.length)]
      for (const run of farm.runs.keys()) {
        simulate(problem, sequences, run, PLANT, before)
        simulate(planProblem(faster), sequences, run, PLANT, after)
        for (let node = 0; node < farm.fields.length * 5; node++) {
          if (node % 5 > PLANT) continue
          if (before.finishedAt[node]! < Infinity) expect(after.finishedAt[node]).toBeLessThanOrEqual(before.finishedAt[node]! + 1e-4)
        }
      }
    }), { numRuns: 200 })
  })

  it('never loses a field that was done before rain when the rain comes later', () => {
    fc.assert(fc.property(randomFarm, fc.nat(95), fc.integer({ min: 1, max: 40 }), (farm, rainAt, delay) => {
      // The same ground until the rain, drawn anew after it: all that the order can know by then is the same.
      const withRain = (at: number, other: boolean): SmallFarm => ({
        ...farm,
        runs: farm.runs.map(places => places.map(({ flags }) => ({ rainAt: at, flags: flags.map(pass => pass.map((flag, hour) => hour < at ? flag : other ? 1 - flag : 0)) }))),
      })
      const [early, late] = [withRain(rainAt, false), withRain(rainAt + delay, true)]
      for (const run of farm.runs.keys()) {
        const [before, after] = [timelineOf(early, run), timelineOf(late, run)]
        for (const field of farm.fields.keys()) {
          if (isDoneBeforeRain(planProblem(early), before, run, field)) expect(isDoneBeforeRain(planProblem(late), after, run, field)).toBe(true)
        }
      }
    }), { numRuns: 200 })
  })

  it('gives the same timeline to the byte when asked again', () => {
    fc.assert(fc.property(randomFarm, (farm) => {
      const problem = planProblem(farm)
      const { sequences } = assignMachines(problem, farm.fields.map((_, field) => field))
      const timeline = createTimeline(farm.fields.length)
      const read = () => [...timeline.to.slice(0, timeline.used), ...timeline.acTo.slice(0, timeline.used), ...timeline.finishedAt]
      simulate(problem, sequences, 0, SPRAY, timeline)
      const once = read()
      simulate(problem, sequences, farm.runs.length - 1, SPRAY, timeline)
      simulate(problem, sequences, 0, SPRAY, timeline)
      expect(read()).toEqual(once)
    }), { numRuns: 50 })
  })
})

describe('afterWorking', () => {
  const shifts = Float64Array.of(1, 16, 25, 40)

  it.each([
    [0, 0, 0],
    [0, 2, 3],
    [15.5, 1, 25.5],
    [20, 1, 26],
    [1, 15, 16],
    [1, 30, 40],
    [39, 2, Infinity],
  ])('from hour %d on, %d working hours are over at %d', (since, hours, over) => {
    expect(afterWorking(shifts, since, hours)).toBe(over)
  })
})
