import { describe, expect, it } from 'vitest'
import { fitAgainAt, STOPPING_RAIN_MM, StretchListBuilder } from '../../../../../shared/agronomy/plan/workable'

const flags = (text: string) => Uint8Array.from(text, letter => letter === '1' ? 1 : 0)
const dry = (hours: number) => new Float64Array(hours)

describe('StretchListBuilder', () => {
  it('turns flags into stretches, from the plan’s first hour on', () => {
    const builder = new StretchListBuilder()
    builder.add(flags('110111001'), dry(9), Infinity, 1, 8)
    builder.add(flags('000000000'), dry(9), Infinity, 1, 8)
    expect([...builder.build().bounds]).toEqual([0, 1, 2, 5, 7, 8])
    expect([...builder.build().starts]).toEqual([0, 6, 6])
  })

  it('leaves out hours with measurable rain and the hour in which rain starts', () => {
    expect(STOPPING_RAIN_MM).toBeCloseTo(0.01 * 25.4, 12)
    const builder = new StretchListBuilder()
    builder.add(flags('11111111'), Float64Array.of(0, 0.2, 0.3, 0, 0, 0, 0, 0), 5, 0, 8)
    expect([...builder.build().bounds]).toEqual([0, 2, 3, 5, 6, 8])
  })
})

describe('fitAgainAt', () => {
  it('is the start of the first six hours on end after the rain has started', () => {
    expect(fitAgainAt(flags('1100111000111111'), dry(16), 2, 0, 16)).toBe(10)
  })

  it('counts from the plan’s first hour', () => {
    expect(fitAgainAt(flags('1100111000111111'), dry(16), 0, 2, 16)).toBe(8)
  })

  it('isn’t fit while it rains on', () => {
    const rain = dry(16)
    rain[6] = 1
    expect(fitAgainAt(flags('1111111111111111'), rain, 2, 0, 16)).toBe(7)
  })

  it('is not within the hours looked at when they end too soon', () => {
    expect(fitAgainAt(flags('1100111000111110'), dry(16), 2, 0, 16)).toBe(Infinity)
  })
})
