import { scrypt } from 'node:crypto'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { openDatabase } from '../../../server/db/client'
import { readMigrations } from '../../../server/db/migrations-module'
import { people } from '../../../server/db/schema'
import { hashPassword, isPassword, isWeakHash, NOBODYS_HASH, passwordProblem } from '../../../server/services/passwords'
import { personOfSession, signIn, signOut } from '../../../server/services/sign-in'
import { NOW, PASSWORD, seedFarm, seedPerson, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

const weakHash = async (password: string) => {
  const salt = Buffer.alloc(16, 1)
  const key = await new Promise<Buffer>((resolve, reject) => scrypt(password, salt, 32, { N: 1024, r: 8, p: 1 }, (error, found) => error ? reject(error) : resolve(found)))
  return `scrypt$1024$8$1$${salt.toString('base64url')}$${key.toString('base64url')}`
}
const later = (minutes: number) => new Date(NOW.getTime() + minutes * 60_000)

describe('signIn', () => {
  let temporary: TemporaryDatabase
  beforeEach(async () => {
    temporary = temporaryDatabase()
    await seedPerson(temporary.db, 'owner@farm.example', seedFarm(temporary.db, 'a'), 'owner')
  })
  afterEach(() => temporary.close())
  const attempt = (password: string, address = '10.0.0.1', now = NOW, email = 'owner@farm.example') => signIn(temporary.db, now, { email, password, address })
  const session = async () => {
    const result = await attempt(PASSWORD)
    if (result.outcome !== 'signed-in') throw new Error(result.outcome)
    return result.sessionId
  }

  it('opens a session that is known until signed out', async () => {
    const id = await session()
    expect(personOfSession(temporary.db, NOW, id)?.email).toBe('owner@farm.example')
    signOut(temporary.db, NOW, id)
    expect(personOfSession(temporary.db, NOW, id)).toBeUndefined()
  })

  it('takes the e-mail in any case and with spaces around', async () => {
    expect((await attempt(PASSWORD, '10.0.0.1', NOW, ' Owner@Farm.Example ')).outcome).toBe('signed-in')
  })

  it('keeps only a hash of the session’s id, and a new one each time', async () => {
    const [one, two] = [await session(), await session()]
    expect(one).not.toBe(two)
    const stored = temporary.sqlite.prepare('select id_hash from sessions').pluck().all()
    expect(stored).not.toContain(one)
  })

  it('lets a disabled person nowhere, also with an open session', async () => {
    const id = await session()
    temporary.db.update(people).set({ disabledAt: NOW }).run()
    expect(personOfSession(temporary.db, NOW, id)).toBeUndefined()
    expect((await attempt(PASSWORD)).outcome).toBe('refused')
  })

  it('ends a session that is idle for two weeks, and any after ninety days', async () => {
    const id = await session()
    expect(personOfSession(temporary.db, later(13 * 1440), id)).toBeDefined()
    expect(personOfSession(temporary.db, later(28 * 1440), id)).toBeUndefined()
    const busy = await session()
    for (let day = 10; day < 90; day += 10) expect(personOfSession(temporary.db, later(day * 1440), busy)).toBeDefined()
    expect(personOfSession(temporary.db, later(91 * 1440), busy)).toBeUndefined()
  })

  it('gives a known and an unknown e-mail the same answer', async () => {
    expect(await attempt('wrong')).toEqual(await attempt('wrong', '10.0.0.1', NOW, 'nobody@farm.example'))
    expect(NOBODYS_HASH.split('$').slice(0, 4)).toEqual((await hashPassword('x')).split('$').slice(0, 4))
  })

  it('stops after ten wrong tries from one address, right password or not; the owner still gets in from elsewhere', async () => {
    for (let i = 0; i < 10; i++) expect((await attempt('wrong')).outcome).toBe('refused')
    expect(await attempt(PASSWORD)).toMatchObject({ outcome: 'too-many-tries' })
    expect((await attempt(PASSWORD, '10.0.0.2')).outcome).toBe('signed-in')
    expect((await attempt(PASSWORD, '10.0.0.1', later(16))).outcome).toBe('signed-in')
  })

  it('counts tries made at the same time', async () => {
    const results = await Promise.all(Array.from({ length: 15 }, () => attempt('wrong')))
    expect(results.filter(result => result.outcome === 'too-many-tries')).toHaveLength(5)
  })

  it('stops an address after fifty tries on any accounts', async () => {
    for (let i = 0; i < 50; i++) temporary.sqlite.prepare('insert into sign_in_tries (account_hash, address, at) values (?, \'10.0.0.9\', ?)').run(`account ${i}`, NOW.getTime())
    expect((await attempt(PASSWORD, '10.0.0.9')).outcome).toBe('too-many-tries')
  })

  it('remembers the tries through a restart', async () => {
    for (let i = 0; i < 10; i++) await attempt('wrong')
    const again = openDatabase(temporary.file, readMigrations())
    expect(await signIn(again.db, later(1), { email: 'owner@farm.example', password: PASSWORD, address: '10.0.0.1' })).toEqual({ outcome: 'too-many-tries', retryAfterSeconds: 840 })
    again.close()
  })

  it('makes a weak hash strong when the password was right', async () => {
    const strong = temporary.sqlite.prepare('select password_hash from people').pluck().get() as string
    const weak = await weakHash(PASSWORD)
    temporary.db.update(people).set({ passwordHash: weak }).run()
    expect((await attempt('wrong')).outcome).toBe('refused')
    expect(temporary.sqlite.prepare('select password_hash from people').pluck().get()).toBe(weak)
    expect((await attempt(PASSWORD)).outcome).toBe('signed-in')
    const now = temporary.sqlite.prepare('select password_hash from people').pluck().get() as string
    expect(now.split('$').slice(0, 4)).toEqual(strong.split('$').slice(0, 4))
    expect((await attempt(PASSWORD)).outcome).toBe('signed-in')
  })

  it('turns people away before they would wait for long, and counts no try against them', async () => {
    const email = (i: number) => `person-${i}@farm.example`
    const results = await Promise.all(Array.from({ length: 25 }, (_, i) => attempt('wrong', `10.3.0.${i}`, NOW, email(i))))
    const outcomes = results.map(result => result.outcome)
    expect(outcomes.filter(outcome => outcome === 'refused')).toHaveLength(20)
    expect(outcomes.slice(20)).toEqual(['busy', 'busy', 'busy', 'busy', 'busy'])
    expect(temporary.sqlite.prepare('select count(*) from sign_in_tries').pluck().get()).toBe(20)
    expect((await attempt(PASSWORD)).outcome).toBe('signed-in')
  })

  it('forgets sessions that are over', async () => {
    await session()
    await attempt(PASSWORD, '10.0.0.1', later(91 * 1440))
    expect(temporary.sqlite.prepare('select count(*) from sessions').pluck().get()).toBe(1)
  })

  it('stops guesses from a hundred addresses, but not the person’s own', async () => {
    await attempt(PASSWORD, '10.0.0.1')
    const hash = (await import('node:crypto')).createHash('sha256').update('owner@farm.example').digest('base64url')
    for (let i = 0; i < 100; i++) temporary.sqlite.prepare('insert into sign_in_tries (account_hash, address, at) values (?, ?, ?)').run(hash, `10.1.0.${i}`, NOW.getTime())
    expect((await attempt(PASSWORD, '10.2.0.1')).outcome).toBe('too-many-tries')
    expect((await attempt(PASSWORD, '10.0.0.1')).outcome).toBe('signed-in')
  })
})

describe('passwords', () => {
  it('are hashed with scrypt at OWASP’s cost, salted, and told apart to the last character', async () => {
    const long = `${'ø ground '.repeat(12)}end`
    const hash = await hashPassword(long)
    expect(hash).toMatch(/^scrypt\$16384\$8\$5\$/)
    expect(await isPassword(long, hash)).toBe(true)
    expect(await isPassword(`${long.slice(0, -1)}D`, hash)).toBe(false)
    expect(await hashPassword(long)).not.toBe(hash)
    expect(isWeakHash(hash)).toBe(false)
    expect(isWeakHash(hash.replace('$5$', '$1$'))).toBe(true)
  })

  it.each([
    ['fourteen-chars', /15 characters/], ['aaaaaaaaaaaaaaaaaaaa', /first that anybody tries/], ['brindle marsh 2026 secure!', /brindle marsh/], ['sillionsillionsillion', /sillion|first/],
  ])('refuse %s', (password, message) => {
    expect(passwordProblem(password, ['Brindle Marsh'])).toMatch(message)
  })

  it('take any sentence of fifteen characters', () => {
    expect(passwordProblem('wet ground shines at dawn', ['Brindle Marsh Farm', 'Runa', 'owner'])).toBeNull()
  })
})
