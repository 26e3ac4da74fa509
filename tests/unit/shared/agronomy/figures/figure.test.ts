import { describe, expect, it } from 'vitest'
import { check, run } from '../../../../../shared/agronomy/figures/figure'

describe('a row', () => {
  it('holds within its tolerance and not beyond', () => {
    expect(run(check('a', 10, () => 10.05, 'a table', 0.05)).ok).toBe(true)
    expect(run(check('a', 10, () => 10.06, 'a table', 0.05)).ok).toBe(false)
    expect(run(check('a', 10, () => Number.NaN, 'a table', 0.05)).ok).toBe(false)
  })

  it('compares words exactly, and never a word with a number', () => {
    expect(run(check('a', 'D', () => 'D', 'a table')).ok).toBe(true)
    expect(run(check('a', 'D', () => 'E', 'a table')).ok).toBe(false)
    expect(run(check('a', 'none', () => 0, 'a table')).ok).toBe(false)
  })
})
