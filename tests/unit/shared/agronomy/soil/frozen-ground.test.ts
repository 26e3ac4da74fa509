import { describe, expect, it } from 'vitest'
import { frozenGroundIndex, frozenShare, snowDepthCm } from '../../../../../shared/agronomy/soil/frozen-ground'

describe('frozenGroundIndex', () => {
  // Recomputed from SWB2 report eq. 1-9 (Molnau & Bissell 1983), bare ground.
  it.each([[0, -10, 10], [80, 5, 72.6], [10, 12, 0]])('from %s at %s °C goes to %s', (before, meanC, after) => {
    expect(frozenGroundIndex(before, meanC, 0)).toBeCloseTo(after, 2)
  })

  it('reaches 159.73 after 30 days at −8 °C, falls under 56 on day 15 at +4 °C, to 0 on day 26 (recomputed)', () => {
    let index = 0
    for (let day = 0; day < 30; day++) index = frozenGroundIndex(index, -8, 0)
    expect(index).toBeCloseTo(159.73, 2)
    const thaw: number[] = []
    while (index > 0) thaw.push(index = frozenGroundIndex(index, 4, 0))
    expect(thaw.findIndex(value => value < 56) + 1).toBe(15)
    expect(thaw.length).toBe(26)
  })

  it('shields with 0.5/cm in thaw and 0.08/cm in frost, not the other way round', () => {
    expect(frozenGroundIndex(0, -10, 10)).toBeCloseTo(10 * Math.exp(-0.4 * 0.08 * 10), 10)
    expect(97 - frozenGroundIndex(100, 10, 10)).toBeCloseTo(10 * Math.exp(-0.4 * 0.5 * 10), 10)
  })

  it('is the published step in one day or in two halves, to 1.5 % of the day', () => {
    const halves = frozenGroundIndex(frozenGroundIndex(50, -6, 0, 12), -6, 0, 12)
    expect(Math.abs(halves - frozenGroundIndex(50, -6, 0))).toBeLessThan(0.09)
  })

  it('refuses NaN and negative snow', () => {
    expect(() => frozenGroundIndex(Number.NaN, 1, 0)).toThrow(RangeError)
    expect(() => frozenGroundIndex(0, Number.NaN, 0)).toThrow(RangeError)
    expect(() => frozenGroundIndex(0, 1, -1)).toThrow(RangeError)
  })
})

describe('frozenShare', () => {
  // SWB2: frozen above 83, not below 56; recomputed at 70.
  it.each([[0, 0], [56, 0], [70, 0.519], [83, 1], [200, 1]])('index %s is %s frozen', (index, share) => {
    expect(frozenShare(index)).toBeCloseTo(share, 3)
  })
})

describe('snowDepthCm', () => {
  it('is ten times the water (SWB2)', () => {
    expect(snowDepthCm(25)).toBe(25) // 25 mm of water are 250 mm of snow
  })
})
