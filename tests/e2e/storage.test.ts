import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startDemoServer, type DemoServer } from './demo-server'

const FARM = '/api/farms/brindle-marsh'

describe('a disk without room', () => {
  let server: DemoServer
  let cookie: string
  beforeAll(async () => {
    server = await startDemoServer()
    const answer = await send('POST', '/api/auth/sign-in', { email: 'owner@brindlemarsh.example', password: server.password })
    cookie = answer.headers.getSetCookie()[0]!.split(';')[0]!
  })
  afterAll(() => server?.stop())
  const send = (method: string, path: string, body?: object, key?: string) => fetch(server.address + path, {
    method,
    headers: { origin: server.address, ...(cookie && { cookie }), ...(body && { 'content-type': 'application/json' }), ...(key && { 'idempotency-key': key }) },
    body: body && JSON.stringify(body),
  })
  const planted = async () => {
    const { rows } = await (await send('GET', `${FARM}/ground-order`)).json() as { rows: { id: string, chain: { pass: string, doneAc: number }[] }[] }
    return rows.find(row => row.id === 'brindle-marsh-big-kettle')!.chain.find(item => item.pass === 'dig')!.doneAc
  }

  it('is told to whoever saves, keeps nothing by halves, stops no reading, and takes the same save once there is room', async () => {
    const pass = { pass: 'dig', areaAc: 20, startedAt: '2025-05-06T08:00:00Z', endedAt: '2025-05-06T09:00:00Z' }
    const key = randomUUID()
    const before = await planted()
    server.refuseWrites(true)
    try {
      const refused = await send('POST', `${FARM}/fields/brindle-marsh-big-kettle/passes`, pass, key)
      expect([refused.status, (await refused.json() as { error: { message: string } }).error.message]).toEqual([503, 'The database can\'t be written, so nothing was saved. Try again later.'])
      expect(refused.headers.get('retry-after')).toBeTruthy()
      expect(await planted()).toBe(before)
      expect((await send('GET', '/sign-in')).status).toBe(200)
    }
    finally {
      server.refuseWrites(false)
    }
    const saved = await send('POST', `${FARM}/fields/brindle-marsh-big-kettle/passes`, pass, key)
    expect(saved.status).toBe(201)
    expect((await send('POST', `${FARM}/fields/brindle-marsh-big-kettle/passes`, pass, key)).status).toBe(201)
    expect(await planted()).toBe(before + 20)
  })

  it('makes a pull fail whole, and the next one brings what it missed', async () => {
    server.refuseWrites(true)
    const moved = await send('POST', `${FARM}/demo-clock/moves`, { hours: 1 })
    server.refuseWrites(false)
    expect(moved.status).toBe(503)
    expect((await send('GET', '/api/health/live')).status).toBe(200)
    expect((await send('POST', `${FARM}/demo-clock/moves`, { hours: 1 })).status).toBe(200)
    const { forecast } = await (await send('GET', `${FARM}/ground-order`)).json() as { forecast: { status: string, trouble: string | null } }
    expect(forecast).toMatchObject({ status: 'fresh', trouble: null })
  })
})
