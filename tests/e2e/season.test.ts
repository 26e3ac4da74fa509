import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Ground, GroundOrder, GroundRow } from '../../shared/types/ground-order'
import { startDemoServer, type DemoServer } from './demo-server'

/** The API as the owner sees it, without a browser. */
class Owner {
  private constructor(private readonly server: DemoServer, private readonly cookie: string) {}

  static async signIn(server: DemoServer): Promise<Owner> {
    const answer = await fetch(`${server.address}/api/auth/sign-in`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'origin': server.address },
      body: JSON.stringify({ email: 'owner@brindlemarsh.example', password: server.password }),
    })
    expect(answer.status).toBe(200)
    return new Owner(server, answer.headers.getSetCookie().map(cookie => cookie.split(';')[0]).join('; '))
  }

  async order(): Promise<GroundOrder> {
    const answer = await fetch(`${this.server.address}/api/farms/brindle-marsh/ground-order`, { headers: { cookie: this.cookie } })
    expect(answer.status).toBe(200)
    return await answer.json() as GroundOrder
  }

  async moveClock(hours: 1 | 6 | 24): Promise<void> {
    const answer = await fetch(`${this.server.address}/api/farms/brindle-marsh/demo-clock/moves`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'origin': this.server.address, 'cookie': this.cookie },
      body: JSON.stringify({ hours }),
    })
    expect(answer.status).toBe(200)
  }
}

const rowNamed = (order: GroundOrder, name: string): GroundRow | undefined => order.rows.find(row => row.name === name)
const hoursBetween = (from: string, to: string) => (Date.parse(to) - Date.parse(from)) / 3_600_000

describe('the demo season, through the API', () => {
  let server: DemoServer
  let owner: Owner
  let morning: GroundOrder

  beforeAll(async () => {
    server = await startDemoServer()
    owner = await Owner.signIn(server)
    morning = await owner.order()
  })
  afterAll(() => server?.stop())

  it('opens on Tuesday 6 May at five in the morning with heavy rain about 58 hours off', () => {
    expect(Math.abs(hoursBetween('2025-05-06T10:00:00Z', morning.now))).toBeLessThan(0.1)
    expect(morning.rainLine.status).toBe('known')
    const away = hoursBetween(morning.now, morning.rainLine.medianAt!)
    expect(away).toBeGreaterThan(52)
    expect(away).toBeLessThan(64)
    expect(morning.rainLine.earlyAt! <= morning.rainLine.medianAt!).toBe(true)
    expect(morning.rainLine.medianAt! <= morning.rainLine.lateAt!).toBe(true)
  })

  it('ranks about ten fields, each with a reason, and never says 0 or 1 for a chance', () => {
    const ranked = morning.rows.filter(row => row.rank !== null)
    expect(ranked.length).toBeGreaterThanOrEqual(8)
    expect(ranked.map(row => row.rank)).toEqual(ranked.map((_, index) => index + 1))
    for (const row of ranked) {
      expect(row.reason.length).toBeGreaterThan(5)
      expect(row.doneBeforeRain!.share).toBeGreaterThan(0)
      expect(row.doneBeforeRain!.share).toBeLessThan(1)
    }
    expect(morning.rows.length + morning.planted.length).toBe(31)
  })

  it('says where the weather comes from, how old it is and that it is invented', () => {
    expect(morning.forecast).toMatchObject({ status: 'fresh', invented: true, runs: 51 })
    expect(morning.forecast.attribution.href).toBe('https://open-meteo.com/')
    expect(morning.forecast.issuedAt).not.toBeNull()
  })

  it('turns fields Wet in the rain, and lets light ground dry before heavy ground', async () => {
    const firstFit = new Map<string, number>()
    let rained = false
    let sawWet: Ground[] = []
    for (let moved = 0; moved < 24 * 7; moved += 6) {
      await owner.moveClock(6)
      const order = await owner.order()
      const rainSoFar = hoursBetween(morning.rainLine.medianAt!, order.now)
      if (rainSoFar < 6) continue
      if (!rained) sawWet = order.rows.map(row => row.ground).filter(ground => ground !== null)
      rained = true
      for (const row of order.rows) if (row.ground === 'fit' && !firstFit.has(row.soil!)) firstFit.set(row.soil!, rainSoFar)
    }
    expect(sawWet.length).toBeGreaterThan(3)
    expect(sawWet.filter(ground => ground === 'wet').length).toBeGreaterThan(sawWet.length / 2)
    const dried = (soil: string) => firstFit.get(soil) ?? Infinity
    expect(dried('Clay loam')).toBeLessThanOrEqual(dried('Black clay'))
    expect(dried('Clay loam')).toBeLessThan(Infinity)
  }, 600_000)

  it('has taken the fields that were planted meanwhile off the list', async () => {
    const later = await owner.order()
    expect(later.planted.length).toBeGreaterThan(morning.planted.length)
    expect(rowNamed(later, 'Schoolhouse')).toBeUndefined()
    expect(later.planted.map(field => field.name)).toContain('Schoolhouse')
  })
})
