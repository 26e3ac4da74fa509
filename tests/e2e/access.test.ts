import { readdirSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { mayDo, ROLES, type Permission, type Role } from '../../shared/utils/permissions'
import { startDemoServer, type DemoServer } from './demo-server'

/**
 * Who may call what. Every route file under server/api must stand here: a route that doesn't fails the test.
 * `anyone` needs no sign-in, `signed in` nothing more than one; a permission needs a role that has it.
 */
const POLICY: Record<string, 'anyone' | 'signed in' | Permission> = {
  'GET /api/farms': 'signed in',
  'GET /api/auth/me': 'anyone',
  'POST /api/auth/sign-in': 'anyone',
  'POST /api/auth/sign-out': 'anyone',
  'GET /api/health/live': 'anyone',
  'GET /api/health/ready': 'anyone',
  'ALL /api/**': 'anyone',
  'GET /api/farms/[farm]/changes': 'farm:see',
  'GET /api/farms/[farm]/ground-order': 'farm:see',
  'GET /api/farms/[farm]/demo-clock': 'demo-clock:move',
  'POST /api/farms/[farm]/demo-clock/moves': 'demo-clock:move',
  'POST /api/farms/[farm]/fields/[field]/passes': 'passes:log',
}

function routesUnder(folder: string, path = '/api'): string[] {
  return readdirSync(folder).flatMap((name) => {
    const inside = join(folder, name)
    if (statSync(inside).isDirectory()) return routesUnder(inside, `${path}/${name}`)
    const [stem, method] = name.replace(/\.ts$/, '').split(/\.(?=get$|post$|put$|patch$|delete$)/)
    if (stem === '[...path]') return [`ALL ${path}/**`]
    return [`${(method ?? 'all').toUpperCase()} ${stem === 'index' ? path : `${path}/${stem}`}`]
  })
}

const PEOPLE: Record<Role, string> = {
  owner: 'owner@brindlemarsh.example', agronomist: 'agronomist@brindlemarsh.example', operator: 'operator@brindlemarsh.example', crew: 'crew@brindlemarsh.example',
}

describe('access', () => {
  let server: DemoServer
  const cookies: Partial<Record<Role | 'stranger', string>> = {}
  beforeAll(async () => {
    server = await startDemoServer()
    for (const [who, email] of [...Object.entries(PEOPLE), ['stranger', 'owner@secondfarm.example'] as const]) {
      const answer = await send('POST', '/api/auth/sign-in', undefined, { email, password: server.password })
      expect(answer.status).toBe(200)
      cookies[who as Role] = answer.headers.getSetCookie().map(cookie => cookie.split(';')[0]).join('; ')
    }
  })
  afterAll(() => server?.stop())

  async function send(method: string, path: string, cookie?: string, body?: unknown, headers: Record<string, string> = {}) {
    const stop = new AbortController()
    const answer = await fetch(`${server.address}${path}`, {
      method,
      signal: stop.signal,
      redirect: 'manual',
      headers: { 'content-type': 'application/json', 'origin': server.address, ...(cookie ? { cookie } : {}), ...headers },
      body: method === 'GET' ? undefined : JSON.stringify(body ?? {}),
    })
    const streams = answer.headers.get('content-type')?.includes('event-stream')
    const text = streams ? '' : await answer.text()
    if (streams) stop.abort()
    return { status: answer.status, headers: answer.headers, text }
  }
  const onFarm = (path: string, farm: string) => path.replace('[farm]', farm).replace('[field]', farm === 'brindle-marsh' ? 'brindle-marsh-big-kettle' : 'cairn-flats-cairn')

  it('has a policy for every route, and a route for every policy', () => {
    expect(routesUnder('server/api').sort()).toEqual(Object.keys(POLICY).sort())
  })

  const guarded = Object.entries(POLICY).filter((entry): entry is [string, Permission] => entry[1] !== 'anyone' && entry[1] !== 'signed in')
  describe.each(guarded)('%s', (route, permission) => {
    const [method, path] = route.split(' ') as [string, string]

    it('answers 401 to nobody', async () => {
      expect((await send(method, onFarm(path, 'brindle-marsh'))).status).toBe(401)
    })

    it.each(ROLES)('answers the %s by their role', async (role) => {
      const { status } = await send(method, onFarm(path, 'brindle-marsh'), cookies[role])
      // An empty body is refused after the permission was given: 400.
      expect(status).toBe(mayDo(role, permission) ? (method === 'GET' ? 200 : 400) : 403)
    })

    it('tells a stranger and a seeker of nothing the same', async () => {
      const foreign = await send(method, onFarm(path, 'brindle-marsh'), cookies.stranger)
      const absent = await send(method, onFarm(path, 'no-such-farm'), cookies.stranger)
      expect([foreign.status, absent.status]).toEqual([404, 404])
      const plain = (text: string) => text.replace(/"requestId":"[^"]+"/, '')
      expect(plain(foreign.text)).toBe(plain(absent.text))
      expect(foreign.text).not.toContain('Brindle')
    })

    it('lets nobody of the first farm but the agronomist into the second', async () => {
      for (const role of ['owner', 'operator', 'crew'] as const) expect((await send(method, onFarm(path, 'cairn-flats'), cookies[role])).status).toBe(404)
    })
  })

  it('lists to each person their own farms, and to nobody any', async () => {
    expect((await send('GET', '/api/farms')).status).toBe(401)
    const farms = async (who: Role | 'stranger') => (JSON.parse((await send('GET', '/api/farms', cookies[who])).text) as { farms: { slug: string, role: Role }[] }).farms.map(({ slug, role }) => [slug, role])
    expect(await farms('owner')).toEqual([['brindle-marsh', 'owner']])
    expect(await farms('agronomist')).toEqual([['brindle-marsh', 'agronomist'], ['cairn-flats', 'agronomist']])
    expect(await farms('stranger')).toEqual([['cairn-flats', 'owner']])
  })

  const pass = { pass: 'dig', areaAc: 10, startedAt: '2025-05-06T08:00:00Z', endedAt: '2025-05-06T09:00:00Z' }
  const key = () => ({ 'idempotency-key': crypto.randomUUID() })

  it('finds no field of another farm under one’s own', async () => {
    const { status } = await send('POST', '/api/farms/brindle-marsh/fields/cairn-flats-cairn/passes', cookies.owner, pass, key())
    expect(status).toBe(404)
  })

  it('logs a pass once, however often it is sent', async () => {
    const once = key()
    const path = '/api/farms/brindle-marsh/fields/brindle-marsh-big-kettle/passes'
    const answers = await Promise.all(Array.from({ length: 10 }, () => send('POST', path, cookies.operator, pass, once)))
    expect(new Set(answers.map(answer => answer.text)).size).toBe(1)
    expect(answers.every(answer => answer.status === 201)).toBe(true)
    expect(answers.filter(answer => answer.headers.get('idempotent-replayed') === 'true')).toHaveLength(9)
    expect((await send('POST', path, cookies.operator, { ...pass, areaAc: 11 }, once)).status).toBe(422)
  })

  it.each([
    ['no JSON', { 'content-type': 'text/plain' }, '{}', 415],
    ['broken JSON', {}, '{"email":', 400],
    ['a reach into prototypes', {}, '{"__proto__":{"admin":1},"email":"a","password":"b"}', 400],
    ['a key too many', {}, '{"email":"a@b","password":"b","role":"owner"}', 400],
    ['far too much', {}, JSON.stringify({ email: 'a@b', password: 'x'.repeat(100_000) }), 413],
    ['another site', { 'sec-fetch-site': 'cross-site' }, '{}', 403],
    ['a foreign origin', { origin: 'https://elsewhere.example' }, '{}', 403],
  ])('refuses %s', async (_, headers, body, status) => {
    const answer = await fetch(`${server.address}/api/auth/sign-in`, { method: 'POST', headers: { 'content-type': 'application/json', 'origin': server.address, ...headers }, body })
    expect(answer.status).toBe(status)
    const { error } = await answer.json() as { error: { message: string, requestId: string } }
    expect(error.message).toMatch(/\w+ \w+/)
    expect(error.requestId).toMatch(/^[0-9a-f-]{36}$/)
    expect(JSON.stringify(error)).not.toMatch(/sqlite|node_modules|\.ts|at .*\(/i)
  })

  it('takes no planted, forged or ended cookie', async () => {
    const path = '/api/farms/brindle-marsh/ground-order'
    expect((await send('GET', path, 'sillion=planted')).status).toBe(401)
    expect((await send('GET', path, `${cookies.crew!.slice(0, -3)}abc`)).status).toBe(401)
    const { headers } = await send('POST', '/api/auth/sign-in', undefined, { email: PEOPLE.crew, password: server.password })
    const own = headers.getSetCookie()[0]!.split(';')[0]!
    expect((await send('GET', path, own)).status).toBe(200)
    await send('POST', '/api/auth/sign-out', own)
    expect((await send('GET', path, own)).status).toBe(401)
  })

  it('limits tries by where they come from, whatever the header says', async () => {
    const statuses: number[] = []
    for (let i = 0; i < 12; i++) statuses.push((await send('POST', '/api/auth/sign-in', undefined, { email: 'nobody@farm.example', password: 'wrong' }, { 'x-forwarded-for': `10.0.0.${i}` })).status)
    expect(statuses.slice(0, 10).every(status => status === 401)).toBe(true)
    expect(statuses.slice(10)).toEqual([429, 429])
  })

  it('gives the headers that keep others out', async () => {
    const { headers } = await send('GET', '/sign-in')
    expect(headers.get('content-security-policy')).toMatch(/default-src 'none'.*frame-ancestors 'none'/)
    expect(headers.get('x-content-type-options')).toBe('nosniff')
    expect(headers.get('cache-control')).toBe('no-store')
    expect(headers.get('x-powered-by')).toBeNull()
    expect(headers.get('access-control-allow-origin')).toBeNull()
    expect((await fetch(`${server.address}/`, { method: 'OPTIONS' })).status).toBe(405)
    expect((await send('GET', '/api/_auth/session')).status).toBe(404)
  })
})
