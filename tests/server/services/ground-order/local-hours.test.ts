import { describe, expect, it } from 'vitest'
import { localHours } from '../../../../server/services/ground-order/local-hours'

const from = (instant: string) => Date.parse(instant) / 1000

describe('localHours', () => {
  it('tells the farm’s hour, day and calendar day', () => {
    const { hourOfDay, localDay, calendarDay } = localHours(from('2025-05-06T03:00:00Z'), 4, 'America/Chicago')
    expect([...hourOfDay]).toEqual([22, 23, 0, 1])
    expect(localDay).toEqual(['2025-05-05', '2025-05-05', '2025-05-06', '2025-05-06'])
    expect([...calendarDay]).toEqual([125, 125, 126, 126])
  })

  it('leaves out two o’clock when clocks go forward and tells one o’clock twice when they go back', () => {
    expect([...localHours(from('2026-03-08T06:00:00Z'), 5, 'America/Chicago').hourOfDay]).toEqual([0, 1, 3, 4, 5])
    expect([...localHours(from('2026-11-01T05:00:00Z'), 4, 'America/Chicago').hourOfDay]).toEqual([0, 1, 1, 2])
  })

  it('gives each local day its 23, 24 or 25 hours over a whole year', () => {
    const { localDay, hourOfDay } = localHours(from('2026-01-01T06:00:00Z'), 365 * 24, 'America/Chicago')
    const lengths = new Map<string, number>()
    for (const day of localDay) lengths.set(day, (lengths.get(day) ?? 0) + 1)
    expect(lengths.size).toBe(365)
    expect([...lengths].filter(([, hours]) => hours !== 24)).toEqual([['2026-03-08', 23], ['2026-11-01', 25]])
    expect(hourOfDay[0]).toBe(0)
  })

  it('keeps to one clock where the zone has no summer time', () => {
    expect(new Set([...localHours(from('2026-01-01T06:00:00Z'), 365 * 24, 'America/Regina').hourOfDay].map((hour, i) => (i - hour) % 24))).toEqual(new Set([0]))
  })
})
