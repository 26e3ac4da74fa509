import { describe, expect, it } from 'vitest'
import { retryAfterMs } from '../../../server/gateways/weather/fetch-json'

const NOW = new Date('2037-10-21T07:27:00Z')

// RFC 9110, 10.2.3: delay-seconds or an HTTP-date. The date is the example of 5.6.7, of another day.
describe('retryAfterMs', () => {
  it.each([['120', 120_000], ['0', 0], ['Wed, 21 Oct 2037 07:28:00 GMT', 60_000], ['Wed, 21 Oct 2015 07:28:00 GMT', 0], ['soon', 0], ['', 0], ['-5', 0]])('reads %j', (said, ms) => {
    expect(retryAfterMs(new Headers({ 'retry-after': said }), NOW)).toBe(ms)
  })
  it('takes silence for now', () => {
    expect(retryAfterMs(new Headers(), NOW)).toBe(0)
  })
})
