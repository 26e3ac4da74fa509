import { describe, expect, it } from 'vitest'
import { addPiece, createTimeline, hourWhenDone, openNode } from '../../../../../shared/agronomy/plan/timeline'

describe('hourWhenDone', () => {
  const timeline = createTimeline(1)
  openNode(timeline, 2, 0)
  addPiece(timeline, 2, 4, 6, 10, 50)
  addPiece(timeline, 2, 20, 22, 50, 70)

  it.each([
    [10, 0],
    [30, 5],
    [50, 6],
    [60, 21],
    [70, 22],
    [71, Infinity],
  ])('has %d ac by hour %d', (acres, hour) => {
    expect(hourWhenDone(timeline, 2, acres, 10)).toBe(hour)
  })
})

describe('addPiece', () => {
  it('makes room when a run needs more than was made, and loses nothing', () => {
    const timeline = createTimeline(1)
    openNode(timeline, 0, 3)
    for (let piece = 0; piece < 500; piece++) addPiece(timeline, 0, piece, piece + 1, piece, piece + 1)
    expect(timeline.count[0]).toBe(500)
    expect(timeline.machine[0]).toBe(3)
    expect([...timeline.acTo.slice(0, 500)]).toEqual(Array.from({ length: 500 }, (_, piece) => piece + 1))
  })
})
