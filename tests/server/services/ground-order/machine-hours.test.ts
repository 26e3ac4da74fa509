import { describe, expect, it } from 'vitest'
import { passesWithoutMachine, planMachine, rateOf, whatMachineMisses } from '../../../../server/services/ground-order/machine-hours'
import { roadKm } from '../../../../shared/agronomy/machine/road'
import { madeField, madeMachine, STARTS_AT } from './made-farm'

const localHour = Uint8Array.from({ length: 48 }, (_, hour) => (hour + 5) % 24)

describe('planMachine', () => {
  const north = madeField('North')
  const south = madeField('South', { latitude: 46.85 })

  it('drives 1.3 times the straight line at its road speed, and folds once a move', () => {
    const planned = planMachine(madeMachine('Jay', 'plant', { atFieldId: north.id, foldMinutes: 15, roadMph: 15 }), [north, south], [north, south], localHour, STARTS_AT)
    const move = 0.25 + roadKm(north, south) / 1.609344 / 15
    expect([...planned.firstMoveHours]).toEqual([0, expect.closeTo(move, 12)])
    expect([...planned.moveHours]).toEqual([0, expect.closeTo(move, 12), expect.closeTo(move, 12), 0])
  })

  it('counts the folding only when nobody said where it stands', () => {
    expect([...planMachine(madeMachine('Jay', 'plant', { foldMinutes: 12 }), [north], [north], localHour, STARTS_AT).firstMoveHours]).toEqual([0.2])
  })

  it('starts when it is up again', () => {
    const down = madeMachine('Jay', 'plant', { downUntil: new Date((STARTS_AT + 9.5 * 3600) * 1000) })
    expect(planMachine(down, [north], [north], localHour, STARTS_AT).working[0]).toBe(9.5)
  })
})

describe('whatMachineMisses', () => {
  it('is nothing for a whole machine', () => {
    expect(whatMachineMisses(madeMachine('Jay', 'plant'))).toBeNull()
  })

  it.each([
    [{ widthFt: null }, 'width'],
    [{ fieldEfficiency: 0 }, 'width'],
    [{ fromHour: 20, toHour: 6 }, 'working hours'],
    [{ roadMph: 0 }, 'road speed'],
  ])('says in a sentence what %o lacks', (over, word) => {
    const machine = madeMachine('Jay', 'plant', over)
    expect(whatMachineMisses(machine)).toMatch(new RegExp(`^Jay .*${word}.*Farm page.*\\.$`))
  })
})

describe('rateOf', () => {
  it('isn’t known without all three figures', () => {
    expect(rateOf(madeMachine('Jay', 'plant'))).toBeCloseTo(60 * 5.5 * 0.7 / 8.25, 12)
    expect(rateOf(madeMachine('Jay', 'plant', { speedMph: null }))).toBeNull()
  })
})

describe('passesWithoutMachine', () => {
  it('names the passes that are wanted and that no whole machine does', () => {
    const missing = passesWithoutMachine([madeMachine('Badger', 'dig'), madeMachine('Jay', 'plant', { widthFt: null })], new Set(['dig', 'plant']))
    expect([...missing]).toEqual([['plant', 'No planter is set: add one on the Farm page so its work can be planned']])
  })
})
