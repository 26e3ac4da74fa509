import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { calendarDay } from '../../../../../shared/agronomy/crop/calendar-day'
import { PLANTING_TABLES, SMALL_GRAIN_LOSS_PCT, SMALL_GRAIN_ZONES } from '../../../../../shared/agronomy/crop/planting-tables'
import { yieldShare } from '../../../../../shared/agronomy/crop/yield-share'

const share = (key: string, month: number, day: number) => yieldShare(PLANTING_TABLES.get(key)!, calendarDay(month, day))
const percent = (key: string, month: number, day: number) => share(key, month, day)! * 100

describe('yieldShare', () => {
  // University of Minnesota Extension, 'Planting date considerations for corn': the printed rows, whole percents.
  it.each([
    ['corn-minnesota-1', [99, 100, 100, 99, 98, 95, 92, 87, 82, 76, 69]],
    ['corn-minnesota-2', [98, 99, 100, 100, 99, 98, 95, 92, 89, 84, 79]],
  ])('gives the printed row of %s', (key, row) => {
    const days = [[4, 20], [4, 25], [4, 30], [5, 5], [5, 10], [5, 15], [5, 20], [5, 25], [5, 30], [6, 4], [6, 9]] as const
    expect(days.map(([month, day]) => percent(key, month, day))).toEqual(row.map(value => expect.closeTo(value, 9)))
  })

  // Severson (UMN Extension), Soybean planting date; Crookston 2007 and 2008 from the same page.
  it.each([
    ['soybean-minnesota', [[5, 10, 100], [5, 20, 97], [5, 30, 91], [6, 10, 82], [6, 20, 70], [6, 30, 57]]],
    ['soybean-crookston-2007', [[4, 25, 100], [5, 2, 100], [5, 9, 100], [5, 26, 98], [5, 30, 90], [6, 5, 75]]],
    ['soybean-crookston-2008', [[4, 25, 100], [5, 2, 98], [5, 9, 96], [5, 26, 92], [5, 30, 87], [6, 5, 81]]],
  ])('gives the printed row of %s', (key, row) => {
    for (const [month, day, value] of row) expect(percent(key, month!, day!)).toBeCloseTo(value!, 9)
  })

  // Straight lines between the printed points, worked by hand; tolerance half of the last digit.
  it.each([
    ['corn-minnesota-1', 5, 12, 96.8, 0.05],
    ['corn-minnesota-2', 5, 12, 98.6, 0.05],
    ['corn-minnesota-1', 6, 1, 79.6, 0.05],
    ['corn-minnesota-2', 6, 1, 87.0, 0.05],
    ['soybean-minnesota', 5, 17, 97.9, 0.05],
    ['soybean-minnesota', 6, 1, 89.36, 0.005],
  ])('goes in a straight line: %s on %i/%i keeps %d %%', (key, month, day, value, tolerance) => {
    expect(Math.abs(percent(key, month, day) - value)).toBeLessThanOrEqual(tolerance)
  })

  // NDSU loss per day: wheat 1.5, barley 1.7, oats 1.2 %.
  it.each([['wheat', 15], ['barley', 17], ['oats', 12]] as const)('charges %s %d %% for ten days after the best week', (crop, lost) => {
    expect(percent(`${crop}-us-2`, 4, 28)).toBeCloseTo(100, 9)
    expect(percent(`${crop}-us-2`, 5, 8)).toBeCloseTo(100 - lost, 9)
  })

  it('knows nothing past the last printed date, nor before the first unless the source says so', () => {
    expect(share('corn-minnesota-1', 6, 10)).toBeNull()
    expect(share('corn-minnesota-1', 4, 19)).toBeNull()
    expect(share('soybean-minnesota', 4, 30)).toBeNull()
    expect(share('wheat-us-2', 5, 29)).toBeNull()
    expect(share('wheat-us-2', 4, 1)).toBe(1)
  })

  it('stays between the printed values and never rises after the best date', () => {
    fc.assert(fc.property(fc.constantFrom(...PLANTING_TABLES.values()), fc.integer({ min: 1, max: 364 }), (table, day) => {
      const today = yieldShare(table, day)
      const tomorrow = yieldShare(table, day + 1)
      if (today === null) return
      expect(today).toBeGreaterThan(0)
      expect(today).toBeLessThanOrEqual(1)
      if (tomorrow !== null && day >= calendarDay(5, 5)) expect(tomorrow).toBeLessThanOrEqual(today)
    }))
  })

  it.each([0, 366, Number.NaN])('refuses day %d', (day) => {
    expect(() => yieldShare(PLANTING_TABLES.get('corn-minnesota-1')!, day)).toThrow(RangeError)
  })
})

describe('the small-grain zones', () => {
  it('give a month from the best to the last week; one web copy misprints April for May south of Minnesota 210', () => {
    expect(SMALL_GRAIN_ZONES['mn-210'].last.month).toBe(5)
    for (const { optimum, last } of Object.values(SMALL_GRAIN_ZONES)) {
      expect(last).toEqual({ month: optimum.month + 1, week: optimum.week })
    }
  })

  it('are a table for each crop', () => {
    for (const crop of Object.keys(SMALL_GRAIN_LOSS_PCT)) {
      for (const zone of Object.keys(SMALL_GRAIN_ZONES)) expect(PLANTING_TABLES.get(`${crop}-${zone}`)?.key).toBe(`${crop}-${zone}`)
    }
  })
})
