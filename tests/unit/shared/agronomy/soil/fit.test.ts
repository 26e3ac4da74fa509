import { beforeEach, describe, expect, it } from 'vitest'
import { fieldSoil } from '../../../../../shared/agronomy/soil/field-soil'
import { createTrace, type FieldTrace } from '../../../../../shared/agronomy/soil/field-trace'
import { createFitMarks, groundAt, markFitHours, type FitMarks } from '../../../../../shared/agronomy/soil/fit'

const HOURS = 60
const clay = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 0)
const localHour = Uint8Array.from({ length: HOURS }, (_, hour) => hour % 24)
let trace: FieldTrace
let marks: FitMarks

beforeEach(() => {
  trace = createTrace(HOURS)
  trace.seedMeanC.fill(10)
  trace.temperature5C.fill(10)
  marks = createFitMarks(HOURS)
})

describe('markFitHours', () => {
  it('gives each pass the condition that it needs', () => {
    trace.tillageFit[1] = trace.seedZoneFit[2] = trace.surfaceDry[3] = trace.carries[4] = trace.frozen[5] = 1
    markFitHours(clay, trace, localHour, 5, marks)
    const hoursOf = (flags: Uint8Array) => [...flags.keys()].filter(hour => flags[hour])
    expect(hoursOf(marks.dig)).toEqual([1])
    expect(hoursOf(marks.rocks)).toEqual([2])
    expect(hoursOf(marks.plant)).toEqual([2])
    expect(hoursOf(marks.roll)).toEqual([3])
    expect(hoursOf(marks.spray)).toEqual([4])
    expect(hoursOf(marks.frozen)).toEqual([5])
    expect(hoursOf(marks.cold)).toEqual([])
  })

  // Corn 50 °F, wheat 40 °F (NDSU); soil with means of 48 °F and 41 °F.
  it('calls dry ground cold under the crop’s minimum', () => {
    trace.seedZoneFit.fill(1)
    trace.seedMeanC.fill((48 - 32) / 1.8)
    markFitHours(clay, trace, localHour, 10, marks)
    expect([marks.plant[0], marks.cold[0], marks.rocks[0]]).toEqual([0, 1, 1])
    trace.seedMeanC.fill((41 - 32) / 1.8)
    markFitHours(clay, trace, localHour, (40 - 32) / 1.8, marks)
    expect([marks.plant[0], marks.cold[0]]).toEqual([1, 0])
  })

  it('holds planting for cold rain ahead when the crop has the rule', () => {
    trace.seedZoneFit.fill(1)
    trace.temperature5C[20] = 4
    trace.rainMm[18] = 8
    markFitHours(clay, trace, localHour, 5, marks)
    expect(marks.plant[0]).toBe(1)
    markFitHours(clay, trace, localHour, 5, marks, 48)
    expect([marks.plant[0], marks.cold[0], marks.plant[21]]).toEqual([0, 1, 1])
  })

  it('writes every hour anew', () => {
    for (const flags of [marks.dig, marks.rocks, marks.plant, marks.roll, marks.spray, marks.frozen, marks.cold]) flags.fill(1)
    markFitHours(clay, trace, localHour, 5, marks)
    for (const flags of [marks.dig, marks.rocks, marks.plant, marks.roll, marks.spray, marks.frozen, marks.cold]) expect(flags.some(Boolean)).toBe(false)
  })

  it('refuses arrays that are too short and rules that are none', () => {
    expect(() => markFitHours(clay, trace, localHour.slice(1), 5, marks)).toThrow(RangeError)
    expect(() => markFitHours(clay, trace, localHour, 5, createFitMarks(HOURS - 1))).toThrow(RangeError)
    expect(() => markFitHours(clay, trace, localHour, Number.NaN, marks)).toThrow(RangeError)
    expect(() => markFitHours(clay, trace, localHour, 5, marks, -1)).toThrow(RangeError)
    expect(() => createFitMarks(2.5)).toThrow(RangeError)
  })
})

describe('groundAt', () => {
  it('says fit, frozen, cold, close or wet, in that order', () => {
    marks.plant[40] = 1
    expect(groundAt(marks, 40)).toBe('fit')
    expect(groundAt(marks, 16)).toBe('close')
    expect(groundAt(marks, 15)).toBe('wet')
    expect(groundAt(marks, 41)).toBe('wet')
    marks.cold[20] = 1
    expect(groundAt(marks, 20)).toBe('cold')
    marks.frozen[20] = 1
    expect(groundAt(marks, 20)).toBe('frozen')
  })

  it('speaks of the pass that is next: cold ground may be dug', () => {
    marks.dig[20] = 1
    marks.cold[20] = 1
    expect(groundAt(marks, 20, 'dig')).toBe('fit')
    expect(groundAt(marks, 20, 'plant')).toBe('cold')
    expect(groundAt(marks, 19, 'dig')).toBe('close')
    expect(groundAt(marks, 20, 'spray')).toBe('wet')
  })

  it('refuses an hour that is not marked', () => {
    expect(() => groundAt(marks, HOURS)).toThrow(RangeError)
    expect(() => groundAt(marks, -1)).toThrow(RangeError)
    expect(() => groundAt(marks, Number.NaN)).toThrow(RangeError)
  })
})
