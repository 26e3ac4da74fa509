import type * as Crypto from 'node:crypto'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { people } from '../../../server/db/schema'
import { signIn } from '../../../server/services/sign-in'
import { NOW, seedFarm, seedPerson, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

const hashes = vi.hoisted(() => [] as { N?: number, r?: number, p?: number, keyBytes: number }[])
vi.mock('node:crypto', async (original) => {
  const crypto = await original<typeof Crypto>()
  const scrypt = (password: string, salt: Buffer, keyBytes: number, options: Crypto.ScryptOptions, done: (error: Error | null, key: Buffer) => void) => {
    hashes.push({ N: options.N, r: options.r, p: options.p, keyBytes })
    crypto.scrypt(password, salt, keyBytes, options, done)
  }
  return { ...crypto, scrypt }
})

describe('the time of a sign-in', () => {
  let temporary: TemporaryDatabase
  beforeEach(async () => {
    temporary = temporaryDatabase()
    const farm = seedFarm(temporary.db, 'a')
    await seedPerson(temporary.db, 'owner@farm.example', farm, 'owner')
    hashes.length = 0
  })
  afterEach(() => temporary.close())
  const refused = (email: string) => signIn(temporary.db, NOW, { email, password: 'not the right sentence', address: '10.0.0.1' })

  it('is that of one hash at full cost, whether the e-mail is known, unknown, or of somebody disabled', async () => {
    const one = [{ N: 16_384, r: 8, p: 5, keyBytes: 32 }]
    expect(await refused('owner@farm.example')).toEqual({ outcome: 'refused' })
    expect(hashes.splice(0)).toEqual(one)
    expect(await refused('nobody@farm.example')).toEqual({ outcome: 'refused' })
    expect(hashes.splice(0)).toEqual(one)
    temporary.db.update(people).set({ disabledAt: NOW }).run()
    expect(await refused('owner@farm.example')).toEqual({ outcome: 'refused' })
    expect(hashes.splice(0)).toEqual(one)
  })
})
