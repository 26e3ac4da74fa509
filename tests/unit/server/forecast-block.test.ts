import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { packBlock, RESOLUTION, unpackBlock } from '../../../server/db/forecast-block'
import { RUN_VARIABLES } from '../../../server/gateways/weather/weather-gateway'

describe('forecast blocks', () => {
  it('come back within half of the declared step', () => {
    fc.assert(fc.property(fc.array(fc.double({ min: 0, max: 55, noNaN: true }), { minLength: 1, maxLength: 60 }), fc.integer({ min: 1, max: 4 }), (values, runs) => {
      const run = Object.fromEntries(RUN_VARIABLES.map(variable => [variable, Float64Array.from(values)]))
      const back = unpackBlock(packBlock(RUN_VARIABLES, Array.from({ length: runs }, () => run), values.length), RUN_VARIABLES, runs, values.length)
      expect(back).toHaveLength(runs)
      for (const variable of RUN_VARIABLES) for (const [i, value] of values.entries()) expect(Math.abs(back[runs - 1]![variable][i]! - value)).toBeLessThanOrEqual(RESOLUTION[variable] / 2 + 1e-9)
    }))
  })

  it('refuse a gap and a value that no step reaches', () => {
    expect(() => packBlock(['rainMm'], [{ rainMm: Float64Array.of(Number.NaN) }], 1)).toThrow(RangeError)
    expect(() => packBlock(['rainMm'], [{ rainMm: Float64Array.of(1e6) }], 1)).toThrow(RangeError)
    expect(() => packBlock(['rainMm'], [{}], 1)).toThrow(RangeError)
  })
})
