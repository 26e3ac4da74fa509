import { describe, expect, it } from 'vitest'
import { boundsOfLocalDay, localDayOf } from '../../../../shared/utils/time'
import type { LocalDay } from '../../../../shared/types/ids'

const hoursOf = (day: string, zone: string) => {
  const { from, to } = boundsOfLocalDay(day as LocalDay, zone)
  return (to.getTime() - from.getTime()) / 3_600_000
}

describe('local days', () => {
  // Days on which clocks change: IANA time zone database.
  it.each([
    ['2026-03-08', 'America/Chicago', 23], ['2026-11-01', 'America/Chicago', 25], ['2026-05-06', 'America/Chicago', 24],
    ['2026-03-08', 'America/Regina', 24], ['2026-03-08', 'America/Phoenix', 24], ['2026-04-05', 'Australia/Lord_Howe', 24.5], ['2026-10-04', 'Australia/Lord_Howe', 23.5],
  ])('%s in %s has %d hours', (day, zone, hours) => {
    expect(hoursOf(day, zone)).toBe(hours)
  })

  it('are told by the farm’s clock, not by UTC', () => {
    expect(localDayOf(new Date('2025-05-06T04:59:00Z'), 'America/Chicago')).toBe('2025-05-05')
    expect(localDayOf(new Date('2025-05-06T05:00:00Z'), 'America/Chicago')).toBe('2025-05-06')
  })

  it('end where the next begins, also over a change of clocks and of the year', () => {
    expect(boundsOfLocalDay('2025-12-31' as LocalDay, 'America/Chicago').to).toEqual(boundsOfLocalDay('2026-01-01' as LocalDay, 'America/Chicago').from)
    expect(localDayOf(boundsOfLocalDay('2026-03-08' as LocalDay, 'America/Chicago').from, 'America/Chicago')).toBe('2026-03-08')
  })
})
