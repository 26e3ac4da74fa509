import { describe, expect, it } from 'vitest'
import { drySpell, LOOK_BACK_DAYS, ordinaryDryDay } from '../../../../../shared/agronomy/plan/dry-spell'
import type { HourlyWeather } from '../../../../../shared/agronomy/weather/hourly'

function past(days: number, temperatureC: (day: number, hour: number) => number, rainMm: (day: number, hour: number) => number): { weather: HourlyWeather, localHour: Uint8Array } {
  const hours = days * 24
  const column = (value: (day: number, hour: number) => number) => Float64Array.from({ length: hours }, (_, i) => value(Math.floor(i / 24), i % 24))
  return {
    localHour: Uint8Array.from({ length: hours }, (_, i) => i % 24),
    weather: { startsAt: 0, hours, rainMm: column(rainMm), temperatureC: column(temperatureC), humidityPct: column(() => 60), windMs: column(() => 4), radiationWm2: column((_, hour) => hour * 10) },
  }
}

describe('ordinaryDryDay', () => {
  it('averages each hour of the day over its dry hours', () => {
    const { weather, localHour } = past(4, (day, hour) => day * 10 + hour, day => day === 3 ? 1 : 0)
    const day = ordinaryDryDay(weather, localHour)
    expect(day.temperatureC[6]).toBeCloseTo((0 + 10 + 20) / 3 + 6, 12)
    expect(day.radiationWm2[6]).toBeCloseTo(60, 12)
  })

  it('takes all hours where each was wet', () => {
    const { weather, localHour } = past(2, day => day * 10, (_, hour) => hour === 6 ? 1 : 0)
    expect(ordinaryDryDay(weather, localHour).temperatureC[6]).toBeCloseTo(5, 12)
  })

  it('looks back a fortnight and no further', () => {
    const { weather, localHour } = past(LOOK_BACK_DAYS + 6, day => day < 6 ? 40 : 8, () => 0)
    expect(ordinaryDryDay(weather, localHour).temperatureC[12]).toBeCloseTo(8, 12)
  })

  it('refuses a past without some hour of the day', () => {
    const { weather, localHour } = past(1, () => 5, () => 0)
    expect(() => ordinaryDryDay({ ...weather, hours: 20 }, localHour)).toThrow(RangeError)
  })
})

describe('drySpell', () => {
  it('repeats the day by the farm’s clock, without rain', () => {
    const { weather, localHour } = past(3, (_, hour) => hour, () => 0)
    const spell = drySpell(ordinaryDryDay(weather, localHour), 3600, Uint8Array.of(22, 23, 0, 1))
    expect([...spell.temperatureC]).toEqual([22, 23, 0, 1])
    expect([...spell.rainMm]).toEqual([0, 0, 0, 0])
    expect(spell.hours).toBe(4)
  })
})
