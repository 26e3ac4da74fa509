import { describe, expect, it } from 'vitest'
import { barsOf } from '../../../../server/services/ground-order/bars'
import { addPiece, createTimeline, openNode } from '../../../../shared/agronomy/plan/timeline'
import { madeMachine } from './made-farm'

describe('barsOf', () => {
  const timeline = createTimeline(1)
  for (let node = 0; node < 5; node++) openNode(timeline, node, -1)
  openNode(timeline, 0, 0)
  addPiece(timeline, 0, 1, 3, 0, 40)
  addPiece(timeline, 0, 3, 4, 40, 50)
  addPiece(timeline, 0, 20, 21, 50, 60)

  it('makes one bar of pieces that touch, and marks what starts after the early hour', () => {
    expect(barsOf(0, timeline, [madeMachine('Badger', 'dig')], String, 15)).toMatchObject([
      { pass: 'dig', machine: 'Badger', from: '1', to: '4', afterRain: false },
      { from: '20', to: '21', afterRain: true },
    ])
  })

  it('marks none when no rain is in sight', () => {
    expect(barsOf(0, timeline, [madeMachine('Badger', 'dig')], String, null).some(bar => bar.afterRain)).toBe(false)
  })
})
