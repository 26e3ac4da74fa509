import { describe, expect, it } from 'vitest'
import { hoursBetween, sayAge, sayClock, sayDay, sayDayClock, sayNow, sayShortDayClock } from '../../../../shared/utils/local-time'

describe('times', () => {
  it('are the farm’s own, in words', () => {
    expect(sayDayClock('2025-05-08T20:00:00Z', 'America/Chicago')).toBe('Thursday 3 pm')
    expect([sayClock('2025-05-06T15:30:00Z', 'America/Chicago'), sayClock('2025-05-06T17:00:00Z', 'America/Chicago'), sayClock('2025-05-06T05:00:00Z', 'America/Chicago')]).toEqual(['10:30 am', 'noon', 'midnight'])
    expect([sayShortDayClock('2025-05-08T20:30:00Z', 'America/Chicago'), sayShortDayClock('2025-05-09T05:00:00Z', 'America/Chicago'), sayDayClock('2025-05-11T05:00:00Z', 'America/Chicago')]).toEqual(['Thu 3:30 pm', 'Thu/Fri midnight', 'Saturday/Sunday midnight'])
    expect(sayNow('2025-05-06T10:00:00Z', 'America/Chicago')).toBe('Tue 6 May, 5:00 am')
    expect(sayDay('2025-05-06T04:00:00Z', 'America/Chicago')).toBe('Mon 5')
  })

  it('tell ages in words', () => {
    expect(['2025-05-06T09:59:50Z', '2025-05-06T09:40:00Z', '2025-05-06T06:40:00Z', '2025-05-03T06:00:00Z'].map(from => sayAge(from, '2025-05-06T10:00:00Z'))).toEqual(['just now', '20 min ago', '3 h 20 min ago', '3 days ago'])
    expect(hoursBetween('2025-05-06T10:00:00Z', '2025-05-08T20:00:00Z')).toBe(58)
  })
})
