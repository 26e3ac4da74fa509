import { describe, expect, it } from 'vitest'
import type { FarmInputs } from '../../../../server/services/ground-order/farm-inputs'
import { workOutOrder } from '../../../../server/services/ground-order/work-out-order'
import type { GroundOrder } from '../../../../shared/types/ground-order'
import type { CropId, FieldId, PlaceId, SoilId } from '../../../../shared/types/ids'
import { madeFarm, madeField, madeMachine, madeWeather, NOW, PLACE, THERE } from './made-farm'

const order = (over: Partial<FarmInputs> = {}) => workOutOrder(madeFarm(over))
const row = (worked: GroundOrder, name: string) => worked.rows.find(field => field.name === name)!

describe('workOutOrder', () => {
  it('ranks fields that are whole, with every number that the page shows', () => {
    const worked = order()
    expect(worked.missing).toEqual([])
    expect(worked.axis).toEqual({ startsAt: '2025-05-06T10:00:00.000Z', hours: 120 })
    expect(worked.rows.map(field => field.rank)).toEqual([1, 2])
    const first = worked.rows[0]!
    expect(first).toMatchObject({ ground: 'fit', beforeRain: true, crop: 'Corn', soil: 'Loam', fitAt: null, doneBeforeRain: { count: 3, of: 3 } })
    expect(first.aboveFitMm).toHaveLength(120)
    expect(first.track[0]!.from).toBe(worked.axis.startsAt)
    expect(first.track.at(-1)!.to).toBe('2025-05-11T10:00:00.000Z')
    expect(first.atStake!.meanUsd).toBeGreaterThan(0)
    expect(first.planterHours).toBeCloseTo(160 / (60 * 5.5 * 0.7 / 8.25), 9)
    expect(first.bars.map(bar => bar.machine)).toEqual(expect.arrayContaining(['Badger', 'Jay']))
    expect(worked.totals).toEqual({ areaLeftAc: 320, atStakeUsd: expect.closeTo(first.atStake!.meanUsd + worked.rows[1]!.atStake!.meanUsd, 6) })
  })

  it('reads the rain line by rank from the runs', () => {
    expect(order().rainLine).toMatchObject({
      status: 'known', earlyAt: '2025-05-08T12:00:00.000Z', medianAt: '2025-05-08T17:00:00.000Z', lateAt: '2025-05-08T22:00:00.000Z', share: 1, likelyMm: 24, thresholdMm: 2.54,
    })
    expect(order({ weather: new Map([[PLACE, madeWeather([Infinity, Infinity, 60])]]) }).rainLine).toMatchObject({ status: 'none-in-horizon', medianAt: null, earlyAt: '2025-05-08T22:00:00.000Z', share: 1 / 3 })
  })

  it('explains each number by what it was worked out from: they add up', () => {
    const { explain, savedPerPlanterHourUsd, planterHours, atStake } = order().rows[0]!
    const value = (rows: { label: string, quantity: { value: unknown } }[], label: string) => rows.find(entry => entry.label === label)!.quantity.value as number
    const saved = explain!.savedPerPlanterHour.rows
    expect((value(saved, 'Kept by going in its turn') - value(saved, 'Kept by going last')) / planterHours!).toBeCloseTo(savedPerPlanterHourUsd!, 9)
    const stake = explain!.atStake.rows
    const kept = value(stake, 'Yield kept if planted today') - value(stake, 'Yield kept by waiting')
    expect(value(stake, 'Acres to plant') * kept * value(stake, 'Goal') * value(stake, 'Price')).toBeCloseTo(atStake!.meanUsd, 6)
    for (const part of Object.values(explain!)) expect(part.sources.length).toBeGreaterThan(0)
  })

  it('puts first what loses more by waiting', () => {
    const worked = order({ fields: [madeField('A light field', { soilId: 'sandy' as SoilId }), madeField('Heavy ground', { soilId: 'clay' as SoilId })], weather: new Map([[PLACE, madeWeather([40, 42, 45], 20)]]) })
    expect(row(worked, 'Heavy ground').fitAgainAt! > row(worked, 'A light field').fitAgainAt!).toBe(true)
    expect(worked.rows.map(field => field.name)).toEqual(['Heavy ground', 'A light field'])
  })

  it('counts acres that are done and takes planted fields off the list', () => {
    const fields = [madeField('North'), madeField('South')]
    const done = (index: number, pass: 'dig' | 'plant', areaAc: number) => ({ fieldId: fields[index]!.id, pass, areaAc, lastEndedAt: new Date('2025-05-06T03:30:00Z') })
    const worked = order({ fields, passTotals: [done(0, 'dig', 160), done(0, 'plant', 160), done(1, 'plant', 60)] })
    expect(worked.rows.map(field => field.name)).toEqual(['South'])
    expect(worked.rows[0]!.chain.map(({ state, doneAc }) => [state, doneAc])).toEqual([['part', 60], ['not-needed', 0], ['part', 60], ['not-needed', 0], ['not-needed', 0]])
    // Half past ten in the evening of the fifth, at the farm.
    expect(worked.planted).toEqual([{ id: fields[0]!.id, name: 'North', areaAc: 160, crop: 'Corn', plantedOn: '2025-05-05' }])
  })

  it('says which machine is in a field and when it is through', () => {
    const fields = [madeField('North')]
    const worked = order({
      fields,
      machines: [madeMachine('Badger', 'dig'), madeMachine('Jay', 'plant', { atFieldId: fields[0]!.id })],
      passTotals: [{ fieldId: fields[0]!.id, pass: 'dig', areaAc: 160, lastEndedAt: NOW }, { fieldId: fields[0]!.id, pass: 'plant', areaAc: 104, lastEndedAt: NOW }],
    })
    // 56 ac at 28 ac/h from six in the morning.
    expect(worked.rows[0]!.reason).toBe('Jay is in it: 56 ac left, done by 8 am')
  })

  it('calls warm-crop ground Cold and says what the crop wants', () => {
    const worked = order({ fields: [madeField('North', { cropId: 'cold-corn' as CropId })] })
    expect(worked.rows[0]).toMatchObject({ ground: 'cold', beforeRain: false, reason: expect.stringMatching(/^Dry enough, but \d+°F at seed depth; wants 77°F$/) })
  })

  it('gives nights from sunset to sunrise, each day its low and high, and null for a day that is hardly known', () => {
    const { ribbon } = order()
    expect(ribbon!.nights).toHaveLength(6)
    // Sunrise at 46.9 N 96.8 W on 6 May 2025 is near 6:00 am, sunset near 8:44 pm.
    expect(ribbon!.nights[0]!.from).toBe('2025-05-06T10:00:00.000Z')
    expect(Math.abs(Date.parse(ribbon!.nights[0]!.to) - Date.parse('2025-05-06T11:00:00Z'))).toBeLessThan(10 * 60_000)
    expect(Math.abs(Date.parse(ribbon!.nights[1]!.from) - Date.parse('2025-05-07T01:44:00Z'))).toBeLessThan(10 * 60_000)
    expect(ribbon!.days.map(day => day.localDay)).toEqual(['2025-05-06', '2025-05-07', '2025-05-08', '2025-05-09', '2025-05-10', '2025-05-11'])
    expect(ribbon!.days[0]!.startsAt).toBe('2025-05-06T05:00:00.000Z')
    expect(ribbon!.days[0]).toMatchObject({ minC: 9, maxC: 19 })
    expect(ribbon!.days[5]).toMatchObject({ minC: null, maxC: null, rainMm: null })
    expect(ribbon!.days[2]!.rainMm! + ribbon!.days[3]!.rainMm!).toBeCloseTo(24, 1)
  })

  it('is the same, to the byte, whatever the order of its inputs', () => {
    const fields = ['East', 'West', 'North', 'South'].map((name, i) => madeField(name, { latitude: 46.9 + i / 100, soilId: ['loam', 'clay', 'sandy', 'loam'][i]! as SoilId }))
    const machines = [madeMachine('Badger', 'dig'), madeMachine('Jay', 'plant'), madeMachine('Wren', 'plant', { widthFt: 40 })]
    const sorted = [...fields].sort((a, b) => a.id.localeCompare(b.id))
    expect(JSON.stringify(order({ fields: [...fields].reverse(), machines: [...machines].reverse() }))).toBe(JSON.stringify(order({ fields: sorted, machines })))
  })
})

describe('workOutOrder, with something missing', () => {
  const unranked = (worked: GroundOrder) => worked.rows.filter(field => field.rank === null)

  it.each<[string, Partial<FarmInputs>, string | RegExp]>([
    ['a soil', { fields: [madeField('North'), madeField('South', { soilId: null })] }, 'No soil is set: add one on the Farm page so its ground can be worked out'],
    ['a place', { fields: [madeField('North'), madeField('South', { placeId: null })] }, /^It has no place on the map/],
    ['weather of its place', { fields: [madeField('North'), madeField('South', { placeId: 'elsewhere' as PlaceId })] }, /^No weather has been pulled/],
    ['a crop', { fields: [madeField('North'), madeField('South', { cropId: null })] }, /^No crop is set/],
    ['a possible soil', { fields: [madeField('North'), madeField('South', { soilId: 'odd' as SoilId })], soils: [...madeFarm().soils, { ...madeFarm().soils[0]!, id: 'odd' as SoilId, sandPct: 90, clayPct: 60 }] }, /^Its soil has impossible figures/],
    ['a rock picker', { fields: [madeField('North'), madeField('South', { chain: ['dig', 'rocks', 'plant'] })] }, /^No rock picker is set/],
    ['planting', { fields: [madeField('North'), madeField('South', { chain: ['dig'] })] }, /^Nothing to plant here/],
  ])('ranks the rest and says so of a field without %s', (_, over, reason) => {
    const worked = order(over)
    expect(worked.rows.map(field => [field.name, field.rank])).toEqual([['North', 1], ['South', null]])
    expect(row(worked, 'South').reason).toMatch(reason)
    expect(row(worked, 'South')).toMatchObject({ doneBeforeRain: null, atStake: null, savedPerPlanterHourUsd: null, bars: [] })
  })

  it('still tells the ground of a field without a crop', () => {
    const worked = order({ fields: [madeField('South', { cropId: null })] })
    expect(worked.rows[0]).toMatchObject({ ground: 'fit', crop: null, rank: null })
    expect(worked.missing).toEqual(['South: No crop is set: add one on the Farm page so that planting it can be ranked.'])
  })

  it('plans nothing without machines, and says which are wanted', () => {
    const worked = order({ machines: [] })
    expect(unranked(worked)).toHaveLength(2)
    expect(worked.missing).toEqual(['No digger is set: add one on the Farm page so its work can be planned.', 'No planter is set: add one on the Farm page so its work can be planned.'])
    expect(row(worked, 'North').ground).toBe('fit')
  })

  it('plans without a machine that has no hours', () => {
    const worked = order({ machines: [madeMachine('Badger', 'dig'), madeMachine('Jay', 'plant'), madeMachine('Wren', 'plant', { fromHour: 9, toHour: 9 })] })
    expect(worked.rows.map(field => field.rank)).toEqual([1, 2])
    expect(worked.missing).toEqual(['Wren has no working hours: set them on the Farm page so it can be planned.'])
    expect(worked.machines.find(lane => lane.name === 'Wren')!.bars).toEqual([])
  })

  it('works nothing out from a forecast that may not be used', () => {
    const worked = order({ weather: new Map([[PLACE, { missing: 'Its forecast is too old to work anything out from' }]]), forecast: { ...madeFarm().forecast, status: 'expired' } })
    expect(worked).toMatchObject({ ribbon: null, rainLine: { status: 'not-known', medianAt: null, share: null, likelyMm: null }, totals: { areaLeftAc: 320, atStakeUsd: null } })
    expect(worked.rows.map(({ rank, ground, core }) => [rank, ground, core])).toEqual([[null, null, null], [null, null, null]])
    expect(worked.missing).toEqual(['North and South: Its forecast is too old to work anything out from.'])
  })

  it.each([
    ['no runs', madeWeather([]), /without its runs/],
    ['a gap', gap(), /has a gap/],
    ['runs that end within a day', madeWeather([50, 55, 60], 8, 20), /doesn’t reach a day ahead/],
    ['a short past', { ...madeWeather([50]), past: { ...madeWeather([50]).past, hours: 240 } }, /Only 10 days of past weather/],
  ])('works nothing out from weather with %s', (_, weather, reason) => {
    const worked = order({ weather: new Map([[PLACE, weather]]) })
    expect(worked.rows.every(field => field.rank === null && reason.test(field.reason))).toBe(true)
  })

  it('takes what places have in common when their runs differ in number and length', () => {
    const worked = order({ fields: [madeField('North'), madeField('South', { placeId: THERE, latitude: 47.1 })], weather: new Map([[PLACE, madeWeather([50, 55, 60])], [THERE, madeWeather([50, 55], 8, 96)]]) })
    expect(worked.axis.hours).toBe(96)
    expect(worked.rows.map(field => field.doneBeforeRain!.of)).toEqual([2, 2])
  })

  it('doesn’t value planting past the last printed date', () => {
    const fields = [madeField('North', { cropId: 'wheat' as CropId })]
    const june = new Date('2025-06-20T10:20:00Z')
    const shift = (weather: ReturnType<typeof madeWeather>) => {
      const by = (june.getTime() - NOW.getTime()) / 1000
      for (const hourly of [weather.past, weather.forecast, ...weather.runs]) hourly.startsAt += by
      return weather
    }
    const worked = order({ now: june, fields, weather: new Map([[PLACE, shift(madeWeather([50, 55, 60]))]]) })
    expect(worked.rows[0]).toMatchObject({ rank: 1, atStake: null, savedPerPlanterHourUsd: null, reason: expect.stringContaining('no table says what waiting costs wheat') })
    expect(worked.totals.atStakeUsd).toBeNull()
  })

  it('answers for a farm without fields', () => {
    expect(order({ fields: [], weather: new Map() })).toMatchObject({ rows: [], planted: [], missing: [], totals: { areaLeftAc: 0, atStakeUsd: null } })
  })

  it('keeps the id of every field once, in rows or among the planted', () => {
    const fields = [madeField('North'), madeField('South', { soilId: null }), madeField('East', { cropId: null })]
    const worked = order({ fields, passTotals: [{ fieldId: 'north' as FieldId, pass: 'plant', areaAc: 160, lastEndedAt: NOW }] })
    expect([...worked.rows, ...worked.planted].map(field => field.id).sort()).toEqual(['east', 'north', 'south'])
  })
})

function gap() {
  const weather = madeWeather([50, 55, 60])
  weather.runs[1]!.temperatureC[30] = Number.NaN
  return weather
}
