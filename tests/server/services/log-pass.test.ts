import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { NewPassRecord } from '../../../shared/schemas/passes'
import type { FarmId, MachineId, PersonId } from '../../../shared/types/ids'
import { findMachine } from '../../../server/db/queries/machines'
import { sumPassAcres } from '../../../server/db/queries/pass-records'
import { machines } from '../../../server/db/schema'
import { logPass } from '../../../server/services/log-pass'
import { NOW, seedFarm, seedPerson, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

describe('logPass', () => {
  let temporary: TemporaryDatabase
  let farmId: FarmId
  let person: PersonId
  beforeEach(async () => {
    temporary = temporaryDatabase()
    farmId = seedFarm(temporary.db, 'a')
    person = await seedPerson(temporary.db, 'owner@a.example', farmId, 'owner')
    temporary.db.insert(machines).values({ id: 'a-jay' as MachineId, farmId, name: 'Jay', pass: 'plant', fromHour: 6, toHour: 21 }).run()
  })
  afterEach(() => temporary.close())

  const entry = (over: object = {}) => NewPassRecord.parse({ pass: 'plant', areaAc: 40, machineId: 'a-jay', startedAt: '2025-05-06T08:00:00Z', endedAt: '2025-05-06T09:30:00Z', ...over })
  const log = (over: object = {}, fieldId = 'a-0', farm = farmId) => logPass(temporary.db, { id: farm, zone: 'America/Chicago' }, fieldId, person, NOW, entry(over))
  const done = (fieldId = 'a-0') => sumPassAcres(temporary.db, farmId, fieldId as never, 'plant', { from: new Date('2025-01-01T06:00:00Z'), to: new Date('2026-01-01T06:00:00Z') })

  it('keeps acres, machine, times and who wrote them down', () => {
    expect(log()).toMatchObject({ outcome: 'logged', doneBeforeAc: 0, record: { areaAc: 40, machineId: 'a-jay', enteredBy: person, startedAt: new Date('2025-05-06T08:00:00Z') } })
    expect(log()).toMatchObject({ outcome: 'logged', doneBeforeAc: 40 })
    expect(done()).toBe(80)
  })

  it('takes a time in any offset', () => {
    expect(log({ endedAt: '2025-05-06T04:30:00-05:00' })).toMatchObject({ outcome: 'logged', record: { endedAt: new Date('2025-05-06T09:30:00Z') } })
  })

  it('leaves the machine where it worked last, whatever order the news comes in', () => {
    const at = () => findMachine(temporary.db, farmId, 'a-jay' as MachineId)!.atFieldId
    log({}, 'a-1')
    expect(at()).toBe('a-1')
    log({ startedAt: '2025-05-06T06:00:00Z', endedAt: '2025-05-06T07:00:00Z' }, 'a-0')
    expect(at()).toBe('a-1')
    log({ startedAt: '2025-05-06T09:30:00Z', endedAt: '2025-05-06T09:50:00Z' }, 'a-0')
    expect(at()).toBe('a-0')
  })

  it('counts the acres of the season at the farm, not of the year in Greenwich', () => {
    const newYear = new Date('2026-01-01T03:00:00Z') // still 2025 at the farm
    const logAt = (over: object) => logPass(temporary.db, { id: farmId, zone: 'America/Chicago' }, 'a-0', person, newYear, entry(over))
    expect(logAt({ areaAc: 60 })).toMatchObject({ outcome: 'logged', doneBeforeAc: 0 })
    expect(logAt({ areaAc: 60 })).toMatchObject({ outcome: 'too-many-acres', leftAc: 40 })
  })

  it('counts a late entry to its own season', () => {
    const lastYear = { startedAt: '2024-05-06T08:00:00Z', endedAt: '2024-05-06T09:30:00Z' }
    expect(log({ areaAc: 100 })).toMatchObject({ outcome: 'logged', doneBeforeAc: 0 })
    expect(log({ ...lastYear, areaAc: 80 })).toMatchObject({ outcome: 'logged', doneBeforeAc: 0 })
    expect(log({ ...lastYear, areaAc: 80 })).toMatchObject({ outcome: 'too-many-acres', leftAc: 20 })
  })

  it.each([
    ['a field that isn’t there', {}, 'z-9', 'no-field'],
    ['a machine that isn’t there', { machineId: 'b-jay' }, 'a-0', 'no-machine'],
    ['a pass that the field doesn’t get', { pass: 'roll' }, 'a-0', 'not-in-chain'],
    ['a time that is still to come', { endedAt: '2025-05-06T12:00:00Z' }, 'a-0', 'in-the-future'],
    ['a time of another decade', { startedAt: '2015-05-06T08:00:00Z', endedAt: '2015-05-06T09:30:00Z' }, 'a-0', 'too-long-ago'],
    ['a machine that does another pass', { pass: 'dig' }, 'a-0', 'wrong-machine'],
    ['more acres than are left', { areaAc: 106 }, 'a-0', 'too-many-acres'],
  ])('keeps nothing for %s', (_, over, fieldId, outcome) => {
    expect(log(over, fieldId).outcome).toBe(outcome)
    expect(done()).toBe(0)
  })

  it('can’t write into another farm’s field', () => {
    const other = seedFarm(temporary.db, 'b')
    expect(log({ machineId: null }, 'a-0', other).outcome).toBe('no-field')
    expect(done()).toBe(0)
  })
})

describe('NewPassRecord', () => {
  it.each([
    [{ areaAc: 0 }, 'Acres must be more than 0.'],
    [{ areaAc: '40' }, 'Enter the acres as a number.'],
    [{ pass: 'plough' }, 'The pass is dig, rocks, plant, roll or spray.'],
    [{ endedAt: '2025-05-06T07:00:00Z' }, 'The end is not after the start.'],
    [{ endedAt: '2025-05-06T08:00:00Z' }, 'The end is not after the start.'],
    [{ startedAt: '2025-05-03T08:00:00Z' }, 'The start is more than two days before the end. Check the date.'],
    [{ areaAc: 5e-324 }, 'Acres must be at least 0.01.'],
    [{ note: 'a\u0000b' }, 'The note holds characters that can\'t be shown.'],
    [{ startedAt: 'yesterday' }, 'The start must be a date and time.'],
  ])('refuses %o in plain words', (over, words) => {
    const parsed = NewPassRecord.safeParse({ pass: 'plant', areaAc: 40, startedAt: '2025-05-06T08:00:00Z', endedAt: '2025-05-06T09:30:00Z', ...over })
    expect(parsed.error?.issues[0]?.message).toBe(words)
  })

  it('refuses what it doesn’t know', () => {
    expect(NewPassRecord.safeParse({ pass: 'plant', areaAc: 40, startedAt: '2025-05-06T08:00:00Z', endedAt: '2025-05-06T09:30:00Z', farmId: 'b' }).success).toBe(false)
  })
})
