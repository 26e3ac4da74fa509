import { describe, expect, it } from 'vitest'
import { calendarDay } from '../../../../../shared/agronomy/crop/calendar-day'

describe('calendarDay', () => {
  it.each([
    [1, 1, 1],
    [3, 1, 60],
    [5, 6, 126],
    [12, 31, 365],
  ])('numbers %i/%i as %i, as day-of-year tables for a common year do', (month, day, number) => {
    expect(calendarDay(month, day)).toBe(number)
  })

  it('counts 29 February as 1 March, so that May has the same numbers in every year', () => {
    expect(calendarDay(2, 29)).toBe(calendarDay(3, 1))
  })

  it.each([[0, 1], [13, 1], [4, 31], [2, 30], [5, 0], [5, 1.5], [5, Number.NaN]])('refuses %s/%s', (month, day) => {
    expect(() => calendarDay(month, day)).toThrow(RangeError)
  })
})
