import { describe, expect, it } from 'vitest'
import { backlogDays, sprayBy } from '../../../../../shared/agronomy/crop/spray-by'

// Published figures: shared/agronomy/figures. Here is what no table prints.

describe('sprayBy', () => {
  it('is set by the shoots when they come first, and not known when nothing is', () => {
    expect(sprayBy('2025-05-04', 21, '2025-05-14')).toEqual({ day: '2025-05-13', by: 'emergence' })
    expect(sprayBy('2025-05-04', null, '2025-05-14')).toEqual({ day: '2025-05-13', by: 'emergence' })
    expect(sprayBy('2025-05-04', null, null)).toBeNull()
  })

  it('refuses days that are none', () => {
    for (const wrong of [() => sprayBy('2025-05-04', 2.5, null), () => sprayBy('2025-05-04', -1, null), () => sprayBy('4 May', 3, null), () => backlogDays(100, 0, 8, 0.5), () => backlogDays(100, 40, 25, 0.5), () => backlogDays(-1, 40, 8, 0.5), () => backlogDays(100, 40, 8, 0)]) expect(wrong).toThrow(RangeError)
  })
})
