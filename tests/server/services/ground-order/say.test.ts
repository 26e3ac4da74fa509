import { describe, expect, it } from 'vitest'
import { sayFor } from '../../../../server/services/ground-order/say'

const STARTS_AT = Date.parse('2025-05-06T10:00:00Z') / 1000

describe('sayFor', () => {
  const us = sayFor({ zone: 'America/Chicago', units: 'us' }, STARTS_AT)
  const metric = sayFor({ zone: 'America/Regina', units: 'metric' }, STARTS_AT)

  it.each([
    [5.5, '10:30 am'],
    [6.7, '11:45 am'],
    [7, 'noon'],
    [9, '2 pm'],
    [19, 'Tue/Wed midnight'],
    [29, 'Wed 10 am'],
    [58, 'Thu 3 pm'],
  ])('writes hour %d as %s', (hour, words) => {
    expect(us.time(hour)).toBe(words)
  })

  it('goes by the farm’s own zone', () => {
    expect(metric.time(5)).toBe('9 am')
  })

  it('writes temperatures and areas in the farm’s units, from published conversions', () => {
    expect([us.temperature(10), metric.temperature(10)]).toEqual(['50°F', '10°C'])
    expect([us.area(160), metric.area(160)]).toEqual(['160 ac', '65 ha'])
    expect(us.money(1234.4)).toBe('$1,234')
  })
})
