import { beforeAll, describe, expect, it } from 'vitest'
import { dayIndex, readSeattle } from '../../../../../mocks/real/seattle-record'
import { activation } from '../../../../../shared/agronomy/crop/activation'
import { degreeDaysClipped, sumDegreeDays } from '../../../../../shared/agronomy/crop/degree-days'
import { dayAfter } from '../../../../../shared/agronomy/crop/late-planting'
import type { DailyWeather } from '../../../../../shared/agronomy/soil/daily-weather'

// Seattle 2012–2015, a US government record in vega-datasets; sums and verdicts of spray.md 11.
describe('on a measured record', () => {
  let record: DailyWeather
  beforeAll(async () => void (record = await readSeattle()))

  it.each([
    ['2012-04-20', 19.6, 'activated'], ['2012-05-10', 0, 'not-activated'], ['2012-06-01', 35.6, 'activated'], ['2013-04-20', 3.3, 'not-activated'], ['2013-05-10', 11.4, 'partial'], ['2013-05-20', 43, 'activated'],
  ])('a pre-emerge of %s gets %d mm: %s', (appliedOn, mm, status) => {
    const first = dayIndex(record, appliedOn) + 1
    const found = activation([...record.rainMm.subarray(first, first + 7)])
    expect(found.sumMm).toBeCloseTo(mm, 6)
    expect(found.status).toBe(status)
  })

  it('degree days of four springs lie in the order of the years’ warmth, in one unit or the other', () => {
    const spring = (year: number) => {
      const from = dayIndex(record, `${year}-05-05`)
      const days = Array.from({ length: 60 }, (_, i) => ({ day: dayAfter(`${year}-05-05`, i), min: record.minC[from + i]!, max: record.maxC[from + i]! }))
      const celsius = sumDegreeDays(days, { method: 'clip-then-average', base: 10, cap: 30, unit: 'C' }).sum
      const fahrenheit = days.reduce((sum, { min, max }) => sum + degreeDaysClipped(min * 1.8 + 32, max * 1.8 + 32, 50, 86), 0)
      expect(fahrenheit).toBeCloseTo(celsius * 1.8, 6)
      return { celsius, mean: days.reduce((sum, { min, max }) => sum + min + max, 0) / 120 }
    }
    const years = [2012, 2013, 2014, 2015].map(spring)
    const order = (key: 'celsius' | 'mean') => years.map((_, i) => i).sort((a, b) => years[a]![key] - years[b]![key])
    expect(order('celsius')).toEqual(order('mean'))
  })
})

describe('activation', () => {
  it('warns of two inches in a day', () => {
    expect(activation([0, 51]).status).toBe('leaching-risk')
  })

  it('refuses an eighth day and negative rain', () => {
    expect(() => activation(Array<number>(8).fill(1))).toThrow(RangeError)
    expect(() => activation([-1])).toThrow(RangeError)
  })
})
