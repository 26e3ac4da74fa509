import { describe, expect, it } from 'vitest'
import { compareReplant, CORN_REPLANT, cornYieldPct } from '../../../../../shared/agronomy/crop/replant'

// Published figures: shared/agronomy/figures. Here is what no table prints.

describe('cornYieldPct', () => {
  it('is separable: stand factor times date factor, within a point (crop.md 6.3)', () => {
    for (const [i, row] of CORN_REPLANT.pct.entries()) for (const [j, pct] of row.entries()) expect(Math.abs(row[0] * CORN_REPLANT.pct[0][j]! / 100 - pct), `${CORN_REPLANT.stands[i]}`).toBeLessThanOrEqual(1)
  })

  it('is never the 96 of the miscopied table', () => {
    expect(cornYieldPct(30_000, '05-16')).toBe(99)
  })

  it('is not carried beyond the table', () => {
    expect([cornYieldPct(30_000, '04-19'), cornYieldPct(30_000, '06-29'), cornYieldPct(11_000, '05-01'), cornYieldPct(33_000, '05-01')]).toEqual([null, null, null, null])
    expect(compareReplant({ plantsPerAc: 8000, plantedOn: '05-01' }, { plantsPerAc: 30_000, plantedOn: '05-28' })).toBeNull()
  })

  it('falls with the date and rises with the stand', () => {
    const dates = ['04-25', '05-09', '05-20', '06-01', '06-12', '06-26']
    for (let i = 1; i < dates.length; i++) expect(cornYieldPct(25_000, dates[i]!)).toBeLessThan(cornYieldPct(25_000, dates[i - 1]!)!)
    for (let stand = 13; stand <= 28; stand++) expect(cornYieldPct(stand * 1000, '05-22')).toBeGreaterThan(cornYieldPct((stand - 1) * 1000, '05-22')!)
  })

  it('refuses what is no stand and no day', () => {
    for (const wrong of [() => cornYieldPct(-1, '05-01'), () => cornYieldPct(30_000, 'May 1'), () => cornYieldPct(Number.NaN, '05-01')]) expect(wrong).toThrow(RangeError)
  })
})
