import { describe, expect, it } from 'vitest'
import { safeNext } from '../../../../app/utils/safe-next'
import { sayChance, shortChance } from '../../../../app/utils/say-chance'
import { roomAfter, round, widthOf, xOf, xWithin } from '../../../../app/utils/time-axis'

describe('chances', () => {
  it('are said to the tenth, and never as 0 or 100', () => {
    expect([0.006, 0.12, 0.46, 0.94, 0.994].map(sayChance)).toEqual(['under 5%', '10%', '50%', '90%', 'over 95%'])
    expect([0.006, 0.994].map(shortChance)).toEqual(['<5%', '>95%'])
  })
})

describe('the time axis', () => {
  const axis = { startsAt: '2025-05-06T10:00:00Z', hours: 120, pxPerHour: 6.8 }
  it('is linear, 6.8 px an hour', () => {
    expect(widthOf(axis)).toBe(816)
    expect(xOf(axis, '2025-05-08T20:00:00Z')).toBe(round(58 * 6.8))
    expect(roomAfter(axis, '2025-05-06T20:00:00Z', null, null)).toBe(816 - 68)
    expect(roomAfter(axis, '2025-05-06T20:00:00Z', '2025-05-07T06:00:00Z', '2025-05-07T01:00:00Z')).toBe(34)
    expect(roomAfter(axis, '2025-05-07T02:00:00Z', '2025-05-07T06:00:00Z', '2025-05-07T01:00:00Z')).toBe(27.2)
    expect([xWithin(axis, '2025-05-01T00:00:00Z'), xWithin(axis, '2025-06-01T00:00:00Z')]).toEqual([0, 816])
  })
})

describe('safeNext', () => {
  it.each([['/brindle-marsh/today', '/brindle-marsh/today'], ['/brindle-marsh/figures', '/brindle-marsh/figures'], ['//elsewhere.example/today', '/'], ['https://elsewhere.example', '/'], ['javascript:alert(1)', '/'], ['/\\elsewhere.example/today', '/'], [undefined, '/'], [['/a/today'], '/']])('%s leads to %s', (next, expected) => {
    expect(safeNext(next)).toBe(expected)
  })
})
