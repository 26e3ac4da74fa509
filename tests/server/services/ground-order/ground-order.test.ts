import { eq } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { setTrouble } from '../../../../mocks/trouble'
import { findFarm, updateRevision } from '../../../../server/db/queries/farms'
import { insertPassRecord } from '../../../../server/db/queries/pass-records'
import { crops, fields, machines, soils } from '../../../../server/db/schema'
import { groundOrder } from '../../../../server/services/ground-order/ground-order'
import { pullWeather } from '../../../../server/services/weather/pull-weather'
import type { CropId, FarmId, FieldId, MachineId, PassRecordId, SoilId } from '../../../../shared/types/ids'
import { NOW, seedFarm, temporaryDatabase, type TemporaryDatabase } from '../../temporary-database'
import { fakeService } from '../../weather/fake-service'

const service = fakeService()
const HOUR = 3_600_000
const later = (hours: number) => new Date(NOW.getTime() + hours * HOUR)
beforeAll(() => service.start())
afterAll(() => service.stop())

describe('groundOrder', () => {
  let temporary: TemporaryDatabase
  let farmId: FarmId
  beforeEach(async () => {
    temporary = temporaryDatabase()
    farmId = seedWholeFarm(temporary, 'a')
    await pull()
  })
  afterEach(() => {
    setTrouble(null)
    temporary.close()
  })
  const pull = (now = NOW) => {
    service.at(now)
    return pullWeather({ db: temporary.db, now, gateway: service.gateway(), model: service.model })
  }
  const order = (now = NOW) => groundOrder(temporary.db, findFarm(temporary.db, farmId)!, now)
  const log = (fieldId: string, pass: 'dig' | 'plant', areaAc: number, endedAt = NOW) => {
    insertPassRecord(temporary.db, { id: `${fieldId}-${pass}-${endedAt.getTime()}` as PassRecordId, farmId, fieldId: fieldId as FieldId, pass, areaAc, startedAt: endedAt, endedAt, enteredAt: endedAt })
    updateRevision(temporary.db, farmId)
  }

  it('ranks the farm’s fields by weather that came through the gateway', () => {
    const { rows, rainLine, forecast, missing } = order()
    expect(rows.map(row => row.rank)).toEqual([1, 2, 3])
    expect(rows.every(row => row.doneBeforeRain!.of === 51)).toBe(true)
    expect(rainLine.status).toBe('known')
    expect(forecast).toMatchObject({ status: 'fresh', runs: 51, invented: true })
    expect(missing).toEqual([])
  })

  it('gives the same order until something changes, with the time that it is', () => {
    const first = order()
    const second = order(new Date(NOW.getTime() + 60_000))
    expect(second.rows).toBe(first.rows)
    expect(second.now).toBe('2025-05-06T10:01:00.000Z')
  })

  it('works it out again when acres are logged', () => {
    const first = order()
    log('a-0', 'plant', 40)
    const plant = order().rows.find(row => row.id === 'a-0')!.chain[2]!
    expect(plant).toEqual({ pass: 'plant', state: 'part', doneAc: 40 })
    expect(first.rows.find(row => row.id === 'a-0')!.chain[2]!.doneAc).toBe(0)
  })

  it('takes a field off the list once its acres add up, and forgets last season’s', () => {
    log('a-0', 'plant', 60)
    log('a-0', 'plant', 40, later(-2))
    log('a-1', 'plant', 100, new Date('2024-05-20T10:00:00Z'))
    expect(order().planted.map(field => field.id)).toEqual(['a-0'])
    expect(order().rows.map(row => row.id).sort()).toEqual(['a-1', 'a-2'])
  })

  it('works it out again in the next hour and after the next pull', async () => {
    const first = order()
    const nextHour = order(later(1))
    expect(nextHour.axis.startsAt).toBe('2025-05-06T11:00:00.000Z')
    await pull(later(1))
    const pulled = order(later(1))
    expect(pulled.forecast.fetchedAt).toBe('2025-05-06T11:00:00.000Z')
    expect(pulled.rows).not.toBe(nextHour.rows)
    expect(first.forecast.fetchedAt).toBe('2025-05-06T10:00:00.000Z')
  })

  it('goes on with the last good forecast when the service fails, says what is wrong, and stops when it is too old', async () => {
    setTrouble('503')
    await expect(pull(later(3))).rejects.toThrow()
    const late = order(later(3))
    expect(late.forecast.status).toBe('late')
    expect(late.rows.map(row => row.rank)).toEqual([1, 2, 3])
    expect(late.missing).toEqual([late.forecast.trouble])
    const expired = order(later(25))
    expect(expired.forecast.status).toBe('expired')
    expect(expired.rows.map(row => [row.rank, row.ground, row.atStake])).toEqual([[null, null, null], [null, null, null], [null, null, null]])
    expect(expired.ribbon).toBeNull()
  })

  it('answers before any forecast has come', () => {
    const fresh = temporaryDatabase()
    const id = seedWholeFarm(fresh, 'b')
    const empty = groundOrder(fresh.db, findFarm(fresh.db, id)!, NOW)
    expect(empty).toMatchObject({ forecast: { status: 'none', fetchedAt: null }, rainLine: { status: 'not-known' }, ribbon: null })
    expect(empty.rows.map(row => row.reason)).toEqual(Array.from({ length: 3 }, () => 'No forecast has come for it yet'))
    fresh.close()
  })

  it('never mixes up two farms, nor the same farm in two databases', async () => {
    const other = seedWholeFarm(temporary, 'b')
    await pull()
    const ours = order().rows.map(row => row.id)
    const theirs = groundOrder(temporary.db, findFarm(temporary.db, other)!, NOW).rows.map(row => row.id)
    expect(ours.every(id => id.startsWith('a-')) && theirs.every(id => id.startsWith('b-'))).toBe(true)
    const twin = temporaryDatabase()
    seedWholeFarm(twin, 'a')
    expect(groundOrder(twin.db, findFarm(twin.db, farmId)!, NOW).forecast.status).toBe('none')
    twin.close()
  })
})

/** Soil, crop, digger and planter for the three fields that the seed gives. */
function seedWholeFarm({ db }: TemporaryDatabase, slug: string): FarmId {
  const farmId = seedFarm(db, slug)
  const soilId = `${slug}-loam` as SoilId
  const cropId = `${slug}-wheat` as CropId
  db.insert(soils).values({ id: soilId, farmId, name: 'Loam', sandPct: 40, clayPct: 20, organicMatterPct: 3 }).run()
  db.insert(crops).values({ id: cropId, farmId, name: 'Wheat', kind: 'wheat', goalYieldBuPerAc: 60, priceUsdPerBu: 6, minimumSoilC: 4.4, plantingTable: 'wheat-us-2' }).run()
  for (const pass of ['dig', 'plant'] as const) {
    db.insert(machines).values({ id: `${slug}-${pass}` as MachineId, farmId, name: pass, pass, widthFt: 50, speedMph: 5.5, fieldEfficiency: 0.7, fromHour: 6, toHour: 21 }).run()
  }
  db.update(fields).set({ soilId, cropId }).where(eq(fields.farmId, farmId)).run()
  return farmId
}
