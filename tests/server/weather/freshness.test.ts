import { describe, expect, it } from 'vitest'
import { freshness, freshUntil } from '../../../server/services/weather/freshness'

const HOUR = 3_600_000
const NOW = new Date('2025-05-06T10:00:00Z')
const ago = (hours: number) => new Date(NOW.getTime() - hours * HOUR)
const age = (fetchedH: number, issuedH: number | null) => ({ fetchedAt: ago(fetchedH), issuedAt: issuedH === null ? null : ago(issuedH) })

describe('freshness', () => {
  it.each([
    ['fresh, as it is in an ordinary hour', age(0.3, 9), age(5.5, 9.6), 'fresh'],
    ['late, when the last two pulls brought nothing', age(2.1, 5), age(4, 5), 'late'],
    ['late, when the runs of two cycles did not come', age(0.3, 5), age(12.5, 17), 'late'],
    ['late, when a service that answers is stuck on an old cycle', age(0.3, 19), age(5, 19), 'late'],
    ['expired, when nothing came for a day', age(25, 30), age(25, 30), 'expired'],
    ['expired, when the runs alone did not', age(0.3, 5), age(25, 28), 'expired'],
    ['expired, when what keeps coming was made two days ago', age(0.3, 48), age(0.3, 48), 'expired'],
    ['fresh, when the service doesn’t say when it was made', age(0.3, null), age(5, null), 'fresh'],
    ['none, when one of the two is missing', age(0.3, 5), undefined, 'none'],
  ])('is %s', (_, forecast, runs, status) => {
    expect(freshness(forecast, runs, NOW)).toBe(status)
  })

  it('tells when it will say something else', () => {
    const [forecast, runs] = [age(0.5, 4), age(3, 4)]
    const until = freshUntil(forecast, runs, NOW)!
    expect(until).toEqual(new Date(NOW.getTime() + 1.5 * HOUR))
    expect([freshness(forecast, runs, until), freshness(forecast, runs, new Date(until.getTime() + 1))]).toEqual(['fresh', 'late'])
    expect(freshUntil(age(60, 60), age(60, 60), NOW)).toBeNull()
  })
})
