import { describe, expect, it } from 'vitest'
import { rollingVerdict } from '../../../../../shared/agronomy/crop/rolling'

// Published figures: shared/agronomy/figures. Here is what no table prints.

describe('rollingVerdict', () => {
  it('never lets a roller on ground with seed in it that is neither fresh nor half up', () => {
    for (let hours = 25; hours < 300; hours += 5) for (const emerged of [0, 0.1, 0.49]) expect(rollingVerdict({ sincePlantingH: hours, emerged, leafStage: 0, soilWet: false })).toBe('do-not')
  })

  it('refuses what is out of range', () => {
    for (const wrong of [{ sincePlantingH: -1 }, { emerged: 1.2 }, { leafStage: Number.NaN }]) expect(() => rollingVerdict({ sincePlantingH: 1, emerged: 0, leafStage: 0, soilWet: false, ...wrong })).toThrow(RangeError)
  })
})
