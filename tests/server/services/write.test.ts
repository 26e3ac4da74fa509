import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { findFarm } from '../../../server/db/queries/farms'
import { onChange } from '../../../server/services/changes'
import { writeOnce, type WriteRequest } from '../../../server/services/write'
import type { FarmId, PersonId } from '../../../shared/types/ids'
import { NOW, seedFarm, seedPerson, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

describe('writeOnce', () => {
  let temporary: TemporaryDatabase
  let farmId: FarmId
  let personId: PersonId
  beforeEach(async () => {
    temporary = temporaryDatabase()
    farmId = seedFarm(temporary.db, 'a')
    personId = await seedPerson(temporary.db, 'owner@farm.example', farmId, 'owner')
  })
  afterEach(() => temporary.close())
  const request = (change: Partial<WriteRequest> = {}): WriteRequest => ({ db: temporary.db, farmId, personId, now: NOW, key: 'k1', method: 'POST', path: '/x', body: { acres: 5 }, ...change })
  const effect = () => ({ status: 201, answer: { id: 'new' }, audit: { action: 'logged', subject: 'pass', subjectId: 'new', before: null, after: { acres: 5 } } })
  const count = (table: string) => temporary.sqlite.prepare(`select count(*) from ${table}`).pluck().get()

  it('has one effect and one answer, however often it is repeated', () => {
    const first = writeOnce(request(), effect)
    expect(first).toEqual({ outcome: 'written', status: 201, body: '{"id":"new"}' })
    for (let i = 0; i < 20; i++) expect(writeOnce(request(), effect)).toEqual({ ...first, outcome: 'repeated' })
    expect(count('audit_log')).toBe(1)
    expect(findFarm(temporary.db, farmId)!.revision).toBe(1)
  })

  it('refuses the same key with other data', () => {
    writeOnce(request(), effect)
    expect(writeOnce(request({ body: { acres: 6 } }), effect)).toEqual({ outcome: 'key-reused' })
  })

  it('keeps the keys of farms apart', async () => {
    const other = seedFarm(temporary.db, 'b')
    writeOnce(request(), effect)
    expect(writeOnce(request({ farmId: other, body: { acres: 9 } }), effect).outcome).toBe('written')
  })

  it('leaves nothing of an effect that throws', () => {
    expect(() => writeOnce(request(), (tx) => {
      tx.run('delete from fields')
      throw new Error('half-way')
    })).toThrow('half-way')
    expect([count('fields'), count('audit_log'), count('idempotency_keys')]).toEqual([3, 0, 0])
    expect(writeOnce(request(), effect).outcome).toBe('written')
  })

  it('tells the farm’s open pages, once', () => {
    let heard = 0
    const stop = onChange(farmId, () => heard++)
    writeOnce(request(), effect)
    writeOnce(request(), effect)
    stop()
    expect(heard).toBe(1)
  })
})
