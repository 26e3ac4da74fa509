import { describe, expect, it } from 'vitest'
import { groundWord, groundWords, stretchesOf } from '../../../../server/services/ground-order/ground-track'
import { createFitMarks } from '../../../../shared/agronomy/soil/fit'

describe('groundWord', () => {
  it('calls ground that could be tilled Cold while it is too cold to plant', () => {
    const marks = createFitMarks(2)
    marks.dig.fill(1)
    marks.plant[1] = 1
    marks.cold[0] = 1
    expect(groundWords(marks, 'dig')).toEqual(['cold', 'fit'])
  })

  it('goes by the next pass', () => {
    const marks = createFitMarks(1)
    marks.spray[0] = 1
    expect([groundWord(marks, 0, 'spray'), groundWord(marks, 0, 'dig')]).toEqual(['fit', 'wet'])
  })
})

describe('stretchesOf', () => {
  it('joins hours alike and leaves no gap', () => {
    expect(stretchesOf(['wet', 'wet', 'close', 'fit'], String)).toEqual([
      { from: '0', to: '2', ground: 'wet' },
      { from: '2', to: '3', ground: 'close' },
      { from: '3', to: '4', ground: 'fit' },
    ])
    expect(stretchesOf([], String)).toEqual([])
  })
})
