import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { eq } from 'drizzle-orm'
import type { Db } from '../../../server/db/client'
import { findFarm } from '../../../server/db/queries/farms'
import { listHours } from '../../../server/db/queries/hourly-weather'
import { crops, fields, machines, passRecords, soils } from '../../../server/db/schema'
import type { App } from '../../../server/services/app'
import { demoWorkJob } from '../../../server/services/demo-work'
import { groundOrder } from '../../../server/services/ground-order/ground-order'
import { pullWeather } from '../../../server/services/weather/pull-weather'
import type { CropId, FarmId, MachineId, SoilId } from '../../../shared/types/ids'
import { NOW, seedFarm, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'
import { fakeService } from '../weather/fake-service'

const service = fakeService()
const HOUR = 3_600_000
const RATE = 50 * 5.5 * 0.7 / 8.25
beforeAll(() => service.start())
afterAll(() => service.stop())

describe('demoWorkJob', () => {
  let temporary: TemporaryDatabase
  let farmId: FarmId
  beforeEach(async () => {
    temporary = temporaryDatabase()
    farmId = seedWorkedFarm(temporary.db)
    await pull(NOW)
  })
  afterEach(() => temporary.close())

  function pull(now: Date) {
    service.at(now)
    return pullWeather({ db: temporary.db, now, gateway: service.gateway(), model: service.model })
  }
  async function work(until: number, from = 0) {
    for (let hour = from + 1; hour <= until; hour++) {
      const now = new Date(NOW.getTime() + hour * HOUR)
      if (hour % 6 === 0) await pull(now)
      await demoWorkJob.run({ db: temporary.db, clock: { now: () => now } } as App, now)
    }
  }
  const records = () => temporary.db.select().from(passRecords).all()

  it('falls due at each full hour', () => {
    expect(demoWorkJob.dueAt({} as App, new Date('2025-05-06T10:41:00Z'))).toEqual(new Date('2025-05-06T11:00:00Z'))
  })

  it('works the order in its machines’ hours, no faster than they can, and says that it is invented', async () => {
    await work(20)
    expect(records().length).toBeGreaterThan(4)
    for (const record of records()) {
      const hours = (record.endedAt.getTime() - record.startedAt.getTime()) / HOUR
      expect(hours).toBeGreaterThan(0)
      expect(record.areaAc).toBeLessThanOrEqual(RATE * hours + 1e-6)
      // Six in the morning to nine in the evening at the farm is 11:00 to 2:00 UTC.
      expect([...Array(9).keys()].map(hour => hour + 2)).not.toContain(record.startedAt.getUTCHours())
      expect(record.enteredBy).toBeNull()
      expect(record.note).toMatch(/^Invented/)
    }
  })

  it('never plants what isn’t dug, nor more than the field has', async () => {
    await work(30)
    for (const field of temporary.db.select().from(fields).all()) {
      const acres = (pass: 'dig' | 'plant') => records().filter(record => record.fieldId === field.id && record.pass === pass).reduce((sum, record) => sum + record.areaAc, 0)
      expect(acres('plant')).toBeLessThanOrEqual(acres('dig') + 0.02)
      expect(acres('dig')).toBeLessThanOrEqual(field.areaAc + 0.01)
    }
  })

  it('stays off ground that it has just rained on', async () => {
    await pull(new Date(NOW.getTime() + 54 * HOUR))
    await work(72, 54)
    await pull(new Date(NOW.getTime() + 73 * HOUR))
    const place = temporary.db.select().from(fields).get()!.placeId!
    const wet = listHours(temporary.db, place, NOW, new Date(NOW.getTime() + 72 * HOUR)).filter(hour => hour.rainMm >= 1)
    expect(wet.length).toBeGreaterThan(3)
    expect(records().length).toBeGreaterThan(0)
    const after = records().filter(record => wet.some(hour => record.startedAt.getTime() >= hour.startsAt.getTime() + HOUR && record.startedAt.getTime() < hour.startsAt.getTime() + 2 * HOUR))
    expect(after).toEqual([])
  })

  it('does the same work when the same hours pass again', async () => {
    await work(12)
    const once = records()
    const again = temporaryDatabase()
    const first = temporary
    temporary = again
    seedWorkedFarm(again.db)
    await pull(NOW)
    await work(12)
    expect(records()).toEqual(once)
    first.close()
  })

  it('takes finished fields off the list', async () => {
    await work(30)
    const order = groundOrder(temporary.db, findFarm(temporary.db, farmId)!, new Date(NOW.getTime() + 30 * HOUR))
    expect(order.planted.length).toBeGreaterThan(0)
  })
})

function seedWorkedFarm(db: Db): FarmId {
  const farmId = seedFarm(db, 'a')
  db.insert(soils).values({ id: 'a-loam' as SoilId, farmId, name: 'Loam', sandPct: 40, clayPct: 20, organicMatterPct: 3 }).run()
  db.insert(crops).values({ id: 'a-wheat' as CropId, farmId, name: 'Wheat', kind: 'wheat', goalYieldBuPerAc: 60, priceUsdPerBu: 6, minimumSoilC: 4.4, plantingTable: 'wheat-us-2' }).run()
  for (const pass of ['dig', 'plant'] as const) {
    db.insert(machines).values({ id: `a-${pass}` as MachineId, farmId, name: pass, pass, widthFt: 50, speedMph: 5.5, fieldEfficiency: 0.7, fromHour: 6, toHour: 21 }).run()
  }
  db.update(fields).set({ soilId: 'a-loam' as SoilId, cropId: 'a-wheat' as CropId, areaAc: 250 }).where(eq(fields.farmId, farmId)).run()
  return farmId
}
