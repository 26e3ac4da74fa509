import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { setTrouble, TROUBLES } from '../../../mocks/trouble'
import { listDays } from '../../../server/db/queries/daily-weather'
import { countForecasts, findNewestForecast } from '../../../server/db/queries/forecasts'
import { listHours } from '../../../server/db/queries/hourly-weather'
import { listPlacesInUse } from '../../../server/db/queries/places'
import { findNewestPull } from '../../../server/db/queries/weather-pulls'
import { farmForecast } from '../../../server/services/weather/forecast-summary'
import { pullWeather } from '../../../server/services/weather/pull-weather'
import { weatherFor } from '../../../server/services/weather/weather-for'
import type { LocalDay } from '../../../shared/types/ids'
import { NOW, seedFarm, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'
import { fakeService } from './fake-service'

const service = fakeService()
const HOUR = 3_600_000
beforeAll(() => service.start())
afterAll(() => service.stop())

describe('pullWeather', () => {
  let temporary: TemporaryDatabase
  beforeEach(() => {
    temporary = temporaryDatabase()
    seedFarm(temporary.db, 'a')
    service.at(NOW)
  })
  afterEach(() => {
    setTrouble(null)
    temporary.close()
  })
  const pull = (now = NOW, patienceMs?: number) => {
    service.at(now)
    return pullWeather({ db: temporary.db, now, gateway: service.gateway(patienceMs), model: service.model })
  }
  const place = () => listPlacesInUse(temporary.db)[0]!

  it('pulls a place once, however many fields and farms use it', async () => {
    seedFarm(temporary.db, 'b')
    expect(await pull()).toBe(2)
    expect(countForecasts(temporary.db)).toBe(4)
  })

  it('stores sixty days that are over, the days ahead and fifty-one runs, with when they were issued and fetched', async () => {
    await pull()
    const weather = weatherFor(temporary.db, place(), NOW, { pastHours: 1440, aheadHours: 120 })
    if ('missing' in weather) throw new Error(weather.missing)
    expect([weather.past.hours, weather.forecast.hours, weather.runs.length, weather.runs[0]!.hours]).toEqual([1440, 120, 51, 120])
    expect(weather.past.startsAt + 1440 * 3600).toBe(NOW.getTime() / 1000)
    expect(weather.issuedAt).toEqual(new Date('2025-05-06T09:40:00Z'))
    expect([...weather.past.rainMm, ...weather.runs[50]!.temperatureC].every(Number.isFinite)).toBe(true)
  })

  it('puts the rain of an hour before its label into that hour', async () => {
    await pull()
    const answer = await service.gateway().forecast([place()], 20)
    if (!answer.ok) throw new Error(answer.trouble)
    const { startsAt, runs } = answer.value[0]!
    const stored = listHours(temporary.db, place().id, new Date(startsAt * 1000), NOW)
    expect(stored.slice(0, 200).map(hour => hour.rainMm)).toEqual([...runs[0]!.rainMm!.slice(0, 200)])
  })

  it('asks later only for what is missing, and for runs only when there are newer ones', async () => {
    await pull()
    const before = service.calls()
    await pull(new Date(NOW.getTime() + HOUR))
    expect(service.calls() - before).toBe(3)
    expect(findNewestForecast(temporary.db, place().id, 'runs', new Date(NOW.getTime() + HOUR))!.fetchedAt).toEqual(NOW)
    await pull(new Date(NOW.getTime() + 7 * HOUR))
    expect(findNewestForecast(temporary.db, place().id, 'runs', new Date(NOW.getTime() + 7 * HOUR))!.fetchedAt).toEqual(new Date(NOW.getTime() + 7 * HOUR))
  })

  it('catches up after a stop without a gap', async () => {
    await pull()
    const at = new Date(NOW.getTime() + 50 * HOUR)
    await pull(at)
    expect(listHours(temporary.db, place().id, new Date(at.getTime() - 100 * HOUR), at)).toHaveLength(100)
  })

  it('keeps the daily record by the farm’s own days, the day of the spring change with its 23 hours', async () => {
    await pull()
    const days = listDays(temporary.db, place().id, 'America/Chicago', '2025-03-08' as LocalDay)
    expect(days.filter(day => day.source === 'analysis').slice(0, 3).map(day => [day.localDay, day.hours])).toEqual([['2025-03-08', 24], ['2025-03-09', 23], ['2025-03-10', 24]])
    const [from, to] = [new Date('2025-04-26T05:00:00Z'), new Date('2025-04-27T05:00:00Z')]
    const sum = listHours(temporary.db, place().id, from, to).reduce((total, hour) => total + hour.rainMm, 0)
    expect(days.find(day => day.localDay === '2025-04-26')!.rainMm).toBeCloseTo(sum, 9)
    expect(sum).toBeGreaterThan(5)
  })

  it.each(TROUBLES)('keeps the last good forecast when the service fails: %s', async (trouble) => {
    await pull()
    const good = findNewestForecast(temporary.db, place().id, 'forecast', NOW)!.id
    const hours = temporary.sqlite.prepare('select count(*), sum(rain_mm), sum(temperature_c) from hourly_weather').raw().get()
    setTrouble(trouble)
    const before = service.calls()
    const at = new Date(NOW.getTime() + 3 * HOUR)
    // Only the two that never finish need a short patience; the others must fail by what they are.
    await expect(pull(at, ['hang', 'drip'].includes(trouble) ? 200 : undefined)).rejects.toThrow(/The weather service/)
    expect(service.calls() - before).toBeLessThanOrEqual(3)
    expect(findNewestForecast(temporary.db, place().id, 'forecast', at)!.id).toBe(good)
    expect(temporary.sqlite.prepare('select count(*), sum(rain_mm), sum(temperature_c) from hourly_weather').raw().get()).toEqual(hours)
    expect(findNewestPull(temporary.db)).toMatchObject({ outcome: 'failed', stored: 0 })
    expect(farmForecast(temporary.db, [place().id], true, at).summary).toMatchObject({ status: 'late', fetchedAt: NOW.toISOString(), trouble: expect.stringMatching(/The weather service/) })
    setTrouble(null)
    await pull(at)
    expect(farmForecast(temporary.db, [place().id], true, at).summary).toMatchObject({ status: 'fresh', trouble: null })
  })

  it('leaves a failing service alone after five failures, and tries it again after five minutes', async () => {
    service.at(NOW)
    const gateway = service.gateway()
    setTrouble('500')
    for (let i = 0; i < 5; i++) await gateway.runs([place()])
    const before = service.calls()
    expect(await gateway.runs([place()])).toMatchObject({ ok: false, trouble: expect.stringMatching(/leaving it alone/) })
    expect(service.calls()).toBe(before)
    setTrouble(null)
    service.at(new Date(NOW.getTime() + 6 * 60_000))
    expect((await gateway.runs([place()])).ok).toBe(true)
  })

  it('works nothing out from a forecast that is past its limit', async () => {
    await pull()
    const late = new Date(NOW.getTime() + 25 * HOUR)
    expect(weatherFor(temporary.db, place(), late, { pastHours: 48, aheadHours: 24 })).toEqual({ missing: expect.stringMatching(/too old/) })
    expect(farmForecast(temporary.db, [place().id], true, late).summary.status).toBe('expired')
    expect(farmForecast(temporary.db, [], true, late).summary.status).toBe('none')
  })

  it('gives the same answer to the same question', async () => {
    const [one, two] = [await service.gateway().runs([place()]), await service.gateway().runs([place()])]
    expect(one).toEqual(two)
  })
})
