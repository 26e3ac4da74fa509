import { describe, expect, it } from 'vitest'
import { createTrace } from '../../../../../shared/agronomy/soil/field-trace'

describe('createTrace', () => {
  it('has room for each hour in every array', () => {
    const { hours, ...arrays } = createTrace(7)
    expect(hours).toBe(7)
    expect(Object.values(arrays).map(array => array.length)).toEqual(Object.values(arrays).map(() => 7))
  })

  it('refuses what is no number of hours', () => {
    expect(() => createTrace(-1)).toThrow(RangeError)
    expect(() => createTrace(1.5)).toThrow(RangeError)
    expect(() => createTrace(Number.NaN)).toThrow(RangeError)
  })
})
