import { describe, expect, it } from 'vitest'
import { workingStretches } from '../../../../../shared/agronomy/machine/working-hours'

/** Two days from 5 in the morning. */
const fromFive = Uint8Array.from({ length: 48 }, (_, hour) => (hour + 5) % 24)

describe('workingStretches', () => {
  it('gives one stretch a day, to the fraction of an hour', () => {
    expect([...workingStretches({ fromHour: 6.5, toHour: 21 }, fromFive, 0)]).toEqual([1.5, 16, 25.5, 40])
  })

  it('starts at once when the plan starts within the working day', () => {
    expect([...workingStretches({ fromHour: 4, toHour: 6 }, fromFive, 0)]).toEqual([0, 1, 23, 25, 47, 48])
  })

  it('waits until a machine is up again, also within a working day', () => {
    expect([...workingStretches({ fromHour: 6, toHour: 21 }, fromFive, 27.25)]).toEqual([27.25, 40])
    expect([...workingStretches({ fromHour: 6, toHour: 21 }, fromFive, 60)]).toEqual([])
  })

  it('loses an hour of the night when clocks go forward, and none of the shift', () => {
    const spring = Uint8Array.from([0, 1, 3, 4, 5, 6, 7, 8])
    expect([...workingStretches({ fromHour: 6, toHour: 8 }, spring, 0)]).toEqual([5, 7])
  })

  it('works the repeated hour twice when clocks go back', () => {
    const autumn = Uint8Array.from([0, 1, 1, 2, 3])
    expect([...workingStretches({ fromHour: 1, toHour: 2 }, autumn, 0)]).toEqual([1, 3])
  })

  it('has no stretch for a day that ends before it starts', () => {
    expect([...workingStretches({ fromHour: 20, toHour: 6 }, fromFive, 0)]).toEqual([])
    expect([...workingStretches({ fromHour: 6, toHour: 6 }, fromFive, 0)]).toEqual([])
  })

  it('runs on through midnight when it works round the clock', () => {
    expect([...workingStretches({ fromHour: 0, toHour: 24 }, fromFive, 0)]).toEqual([0, 48])
  })

  it.each([[-1, 20, 0], [6, 25, 0], [Number.NaN, 20, 0], [6, 20, Number.NaN]])('refuses %d to %d, down until %d', (fromHour, toHour, availableFrom) => {
    expect(() => workingStretches({ fromHour, toHour }, fromFive, availableFrom)).toThrow(RangeError)
  })
})
