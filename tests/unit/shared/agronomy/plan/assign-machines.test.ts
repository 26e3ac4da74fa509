import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { assignField, assignMachines, unassignField } from '../../../../../shared/agronomy/plan/assign-machines'
import { hasWorkLeft } from '../../../../../shared/agronomy/plan/problem'
import { randomFarm } from './random-farm'
import { fitIn, planProblem } from './small-farm'

describe('assignMachines', () => {
  it('shares fields by who would be through first, the faster machine taking more', () => {
    const problem = planProblem({
      hours: 96,
      fields: Array.from({ length: 6 }, () => ({ areaAc: 60, needed: [0, 0, 1, 0, 0] })),
      machines: [{ pass: 2, rateAcPerHour: 30 }, { pass: 2, rateAcPerHour: 15 }],
      runs: [[{ rainAt: Infinity, flags: fitIn(96, [0, 96]) }]],
    })
    // Booked after each: 2.25, then 4.25 against 4.5 for the second machine's first, 4.5, 6.75, 8.5 against 9, 9.
    expect(assignMachines(problem, [0, 1, 2, 3, 4, 5]).sequences).toEqual([[0, 2, 3, 5], [1, 4]])
  })

  it('gives a machine that is down less', () => {
    const problem = planProblem({
      hours: 96,
      fields: Array.from({ length: 3 }, () => ({ areaAc: 60, needed: [0, 0, 1, 0, 0] })),
      machines: [{ pass: 2, rateAcPerHour: 20, downUntil: 50 }, { pass: 2, rateAcPerHour: 20 }],
      runs: [[{ rainAt: Infinity, flags: fitIn(96, [0, 96]) }]],
    })
    expect(assignMachines(problem, [0, 1, 2]).sequences).toEqual([[], [0, 1, 2]])
  })

  it('gives every pass that is left to one machine for it, and nothing else', () => {
    fc.assert(fc.property(randomFarm, (farm) => {
      const problem = planProblem(farm)
      const { sequences, machineOf } = assignMachines(problem, farm.fields.map((_, field) => field))
      for (const [field, planned] of problem.fields.entries()) {
        for (let pass = 0; pass < 5; pass++) {
          const visits = sequences.flatMap((fields, machine) => problem.machines[machine]!.pass === pass && fields.includes(field) ? [machine] : [])
          const wanted = hasWorkLeft(planned, pass) && pass < 4
          expect(visits).toEqual(wanted ? [machineOf[field * 5 + pass]] : [])
        }
      }
    }))
  })
})

describe('unassignField', () => {
  it('undoes assignField', () => {
    fc.assert(fc.property(randomFarm, (farm) => {
      const problem = planProblem(farm)
      const assignment = assignMachines(problem, [0])
      const before = structuredClone(assignment)
      const last = farm.fields.length - 1
      if (last === 0) return
      assignField(problem, last, assignment)
      unassignField(problem, last, assignment, before.bookedHours)
      expect(assignment).toEqual(before)
    }))
  })
})
