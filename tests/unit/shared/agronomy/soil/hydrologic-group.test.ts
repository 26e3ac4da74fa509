import { describe, expect, it } from 'vitest'
import { hydrologicGroup } from '../../../../../shared/agronomy/soil/hydrologic-group'

describe('hydrologicGroup', () => {
  // NEH-630 ch. 7 Table 7-1 (metric, impermeable layer below 100 cm), in µm/s.
  it.each([[0.3, 'D'], [0.4, 'C'], [1.2, 'C'], [4, 'B'], [4.3, 'B'], [10, 'B'], [10.1, 'A']])('%s µm/s is %s', (micrometresPerSecond, group) => {
    expect(hydrologicGroup(micrometresPerSecond * 3.6, false)).toBe(group)
  })

  // The same with the conductivities of Saxton & Rawls (2006) Table 3, mm/h.
  it.each([['clay', 1.14, 'D'], ['clay loam', 4.32, 'C'], ['silty clay', 3.67, 'C'], ['loam', 15.48, 'B']])('%s at %s mm/h is %s', (_, conductivity, group) => {
    expect(hydrologicGroup(conductivity, false)).toBe(group)
  })

  it('is D while water stands shallow, whatever the conductivity (dual classes)', () => {
    expect(hydrologicGroup(100, true)).toBe('D')
  })

  it('refuses a conductivity that is none', () => {
    expect(() => hydrologicGroup(0, false)).toThrow(RangeError)
    expect(() => hydrologicGroup(Number.NaN, false)).toThrow(RangeError)
  })
})
