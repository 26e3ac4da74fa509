import { describe, expect, it } from 'vitest'
import { sayNames } from '../../../../server/services/ground-order/words'

describe('sayNames', () => {
  it.each([
    [['North'], 'North'],
    [['North', 'South'], 'North and South'],
    [['North', 'South', 'East', 'West'], 'North, South and 2 more'],
  ])('joins %j', (names, words) => {
    expect(sayNames(names)).toBe(words)
  })
})
