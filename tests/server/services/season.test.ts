import { describe, expect, it } from 'vitest'
import { seasonOf } from '../../../server/services/season'

describe('seasonOf', () => {
  it('is a calendar year at the farm', () => {
    const of2025 = { from: new Date('2025-01-01T06:00:00Z'), to: new Date('2026-01-01T06:00:00Z') }
    expect(seasonOf(new Date('2025-05-06T10:00:00Z'), 'America/Chicago')).toEqual(of2025)
    expect(seasonOf(new Date('2026-01-01T03:00:00Z'), 'America/Chicago')).toEqual(of2025)
  })
})
