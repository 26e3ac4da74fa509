import { describe, expect, it } from 'vitest'
import { reason, type ReasonFacts, type Say } from '../../../../../shared/agronomy/plan/reason'

/** A farm in US units whose plan starts on Tuesday at five in the morning. */
const say: Say = {
  time: hour => ['Tue', 'Wed', 'Thu', 'Fri', 'Sat'][Math.floor((hour + 5) / 24)]! + ` ${(hour + 5) % 24}:00`,
  temperature: celsius => `${Math.round(celsius * 1.8 + 32)}°F`,
  area: acres => `${Math.round(acres)} ac`,
  money: usd => `$${Math.round(usd)}`,
}

const facts: ReasonFacts = {
  ground: 'fit',
  inField: null,
  fitAt: null,
  rainAt: 58,
  planter: 'Jay',
  planterHours: 13,
  cropName: 'corn',
  seedZoneC: 11,
  minimumSoilC: 10,
  likely: true,
  savedPerPlanterHourUsd: 576,
  atStakeUsd: 21_400,
  plantedByRainAc: 0,
  areaAc: 312,
  wouldLieOpen: false,
  savesMost: false,
  staysWetLongest: false,
  driesFirst: false,
  nextDoorTo: null,
}

describe('reason', () => {
  const cases: [string, Partial<ReasonFacts>, string][] = [
    ['the richest that is fit', { savesMost: true }, 'Fit now, and the most money per planter hour'],
    ['a machine in the field', { inField: { machine: 'Jay', areaLeftAc: 146, doneAt: 6 }, savesMost: true }, 'Jay is in it: 146 ac left, done by Tue 11:00'],
    ['a machine that the rain will catch', { inField: { machine: 'Jay', areaLeftAc: 146, doneAt: null } }, 'Jay is in it: 146 ac left'],
    ['slow ground', { ground: 'close', fitAt: 5, staysWetLongest: true }, 'Fit by Tue 10:00; stays wet longest once rained on'],
    ['a neighbour', { ground: 'close', fitAt: 9, nextDoorTo: 'Long Slough' }, 'Fit by Tue 14:00; next door to Long Slough'],
    ['light ground', { driesFirst: true }, 'Fit now; dries fast again, so it can wait'],
    ['any other', {}, 'Fit now; saves $576 per planter hour'],
    ['a field that is done either way', { savedPerPlanterHourUsd: 0.4, savesMost: true }, 'Fit now; done before the rain even if it goes last'],
    ['a dry spell', { savedPerPlanterHourUsd: 0, rainAt: null }, 'Fit now; no rain in sight'],
    ['cold ground', { ground: 'cold', seedZoneC: 7.2, likely: false }, 'Dry enough, but 45°F at seed depth; wants 50°F'],
    ['ground that is all but warm enough', { ground: 'cold', seedZoneC: 9.9, likely: false }, 'Dry enough, but just under 50°F at seed depth; wants 50°F'],
    ['cold rain ahead', { ground: 'cold', seedZoneC: 10.5, likely: false }, 'Warm enough, but cold rain is coming and would chill corn seed'],
    ['frozen ground', { ground: 'frozen', likely: false }, 'Frozen; nothing to lose by waiting'],
    ['frost that goes out in time', { ground: 'frozen', fitAt: 30 }, 'Frozen; fit Wed 11:00 once the frost is out'],
    ['wet ground', { ground: 'wet', likely: false }, 'Too wet to work before the rain'],
    ['ground that dries after the rain only', { ground: 'wet', fitAt: 90, likely: false }, 'Too wet to work before the rain'],
    ['wet ground and no rain in sight', { ground: 'wet', likely: false, rainAt: null }, 'Not fit within five days'],
    ['too little time left', { ground: 'wet', fitAt: 52, likely: false }, 'Fit by Thu 9:00, too late to finish before rain'],
    ['open ground', { ground: 'fit', likely: false, wouldLieOpen: true }, 'Leave it undug: it would lie open in the rain'],
    ['a field that the rain will stop', { likely: false, plantedByRainAc: 230 }, 'Fit now; rain is likely to stop it at 230 ac'],
    ['a date at which waiting is free', { cropName: 'soybeans', atStakeUsd: 0, likely: false }, 'Fit now; waiting costs soybeans almost nothing yet'],
    ['ground that can’t be planted before the rain at all', { ground: 'wet', fitAt: 90, atStakeUsd: 0, likely: false }, 'Too wet to work before the rain'],
    ['a planter that is busy', { ground: 'wet', fitAt: 29, likely: false }, 'Fit by Wed 10:00; only if Jay is ahead of plan'],
    ['no figure', { savedPerPlanterHourUsd: null }, 'Fit now; no table says what waiting costs corn at this date'],
  ]

  it.each(cases)('speaks of %s', (_, over, words) => {
    expect(reason({ ...facts, ...over }, say)).toBe(words)
  })
})
