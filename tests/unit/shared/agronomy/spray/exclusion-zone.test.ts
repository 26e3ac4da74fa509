import { describe, expect, it } from 'vitest'
import { DROP_CLASSES, exclusionZoneFt } from '../../../../../shared/agronomy/spray/exclusion-zone'

// Published figures: shared/agronomy/figures. Here is what no table prints.

describe('exclusionZoneFt', () => {
  it('never grows with coarser drops', () => {
    for (const height of [6, 12, 20]) for (let i = 1; i < DROP_CLASSES.length; i++) expect(exclusionZoneFt(height, DROP_CLASSES[i]!)).toBeLessThanOrEqual(exclusionZoneFt(height, DROP_CLASSES[i - 1]!))
  })

  it('counts more than 12 in, not 12', () => {
    expect([exclusionZoneFt(12, 'coarse'), exclusionZoneFt(12.1, 'coarse')]).toEqual([0, 25])
  })

  it('refuses a height that is none', () => {
    expect(() => exclusionZoneFt(-1, 'coarse')).toThrow(RangeError)
    expect(() => exclusionZoneFt(Number.NaN, 'coarse')).toThrow(RangeError)
  })
})
