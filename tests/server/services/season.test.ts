import { describe, expect, it } from 'vitest'
import { seasonStart } from '../../../server/services/season'

describe('seasonStart', () => {
  it('is the first of January at the farm', () => {
    expect(seasonStart(new Date('2025-05-06T10:00:00Z'), 'America/Chicago')).toEqual(new Date('2025-01-01T06:00:00Z'))
    expect(seasonStart(new Date('2026-01-01T03:00:00Z'), 'America/Chicago')).toEqual(new Date('2025-01-01T06:00:00Z'))
  })
})
