import { beforeAll, describe, expect, it } from 'vitest'
import { fieldSoil } from '../../../../../shared/agronomy/soil/field-soil'
import { advanceParticles, drawParticles, learnCall, particleRoom, runParticle, snapshotOf, waterOverFit, type Particle } from '../../../../../shared/agronomy/soil/particles'
import { CALL_MISTAKES, CALL_SPREAD } from '../../../../../shared/agronomy/soil/learning'
import { normalNumber, seededRandom, type Random } from '../../../../../shared/agronomy/soil/random'
import { copyState, startingState } from '../../../../../shared/agronomy/soil/water-balance'
import { crpsWeighted } from '../../../../../shared/agronomy/weather/scores'
import { evenWeather, part, type SoilInput } from './even-weather'

/**
 * Against itself, where the truth is known: 200 seeded springs on clay. The true field is one draw from the priors; the
 * forecast knows the grid's rain and runs of the days to come, of which the truth is another.
 */
const SPRINGS = 200
const PAST = 24 * 25
const AHEAD = 24 * 9
const VERSIONS = 40
const RUNS = 4
const CALLS_AT = [PAST - 24 * 9, PAST - 24 * 6, PAST - 24 * 3, PAST - 14]
/** Hours of the rain that each past ends with, so that something is left to tell. */
const LAST_RAIN = 12
const clay = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 0)

/** Rain in spells, a few a fortnight, and drying days between. */
function rainSpells(hours: number, random: Random): Float64Array {
  const rain = new Float64Array(hours)
  let hour = Math.floor(random() * 60)
  while (hour < hours) {
    const long = 3 + Math.floor(random() * 9)
    const mm = -12 * Math.log(1 - random())
    for (let i = 0; i < long && hour + i < hours; i++) rain[hour + i] = mm / long
    hour += long + 20 + Math.floor(-90 * Math.log(1 - random()))
  }
  return rain
}

const spring = (rain: Float64Array): SoilInput => evenWeather(rain.length, 6, hour => rain[hour]!, () => 11, 3)

/** Hour in which the seed zone is first fit; the end of the horizon for later. */
function firstFit(particle: Particle, { weather, etoMm, localHour }: SoilInput, room: ReturnType<typeof particleRoom>): number {
  const ahead = startingState(particle.soil)
  copyState(particle.state, ahead)
  const hour = runParticle(particle, weather, etoMm, localHour, ahead, room).seedZoneFit.indexOf(1)
  return hour < 0 || hour >= AHEAD ? AHEAD : hour
}

interface Outcome { truth: number, single: number[], versions: { hours: number[], weights: number[] }, gauge: { hours: number[], weights: number[] }, called: { hours: number[], weights: number[] } }

function simulate(seed: number): Outcome {
  const random = seededRandom(seed)
  const pastRain = rainSpells(PAST, random)
  pastRain.fill((8 + 20 * random()) / LAST_RAIN, PAST - LAST_RAIN)
  const past = spring(pastRain)
  const [truth] = drawParticles(clay, 1, random, 'grid', 11)
  const room = particleRoom(Math.max(PAST, AHEAD))
  const futures = Array.from({ length: RUNS + 1 }, () => spring(rainSpells(AHEAD, random)))
  const ensembleOf = (particles: Particle[]) => ({
    hours: particles.flatMap(particle => futures.slice(1).map(future => firstFit(particle, future, room))),
    weights: particles.flatMap(({ weight }) => Array<number>(RUNS).fill(weight / RUNS)),
  })
  const advance = (particles: readonly Particle[], from: number, to: number) => {
    const { weather, etoMm, localHour } = part(past, from, to)
    advanceParticles(particles, weather, etoMm, localHour, room)
  }
  const plain: Particle = { soil: clay, rainFactor: 1, etoFactor: 1, weight: 1, state: startingState(clay, 11) }
  const versions = drawParticles(clay, VERSIONS, random, 'grid', 11)
  // A gauge tells the true factor to within its own error.
  const gauge = snapshotOf(versions).map(particle => ({ ...particle, rainFactor: truth!.rainFactor * Math.exp(0.09 * normalNumber(random)) }))
  let called = snapshotOf(versions)
  advance([plain], 0, PAST)
  advance(versions, 0, PAST)
  advance(gauge, 0, PAST)
  let at = 0
  for (const callAt of CALLS_AT) {
    advance([truth!], at, callAt)
    advance(called, at, callAt)
    const feels = waterOverFit(truth!) + CALL_SPREAD * normalNumber(random)
    const call = (feels <= 0) !== (random() < CALL_MISTAKES) ? 'fit' : 'not-fit'
    called = learnCall(called, call, random)
    at = callAt
  }
  advance([truth!], at, PAST)
  advance(called, at, PAST)
  return { truth: firstFit(truth!, futures[0]!, room), single: futures.slice(1).map(future => firstFit(plain, future, room)), versions: ensembleOf(versions), gauge: ensembleOf(gauge), called: ensembleOf(called) }
}

describe('fit by hour t, over seeded springs', () => {
  let outcomes: Outcome[]
  beforeAll(() => void (outcomes = Array.from({ length: SPRINGS }, (_, seed) => simulate(seed + 1))), 120_000)
  const chanceBy = ({ hours, weights }: { hours: number[], weights: number[] }, t: number) => hours.reduce((sum, hour, i) => sum + (hour <= t ? weights[i]! : 0), 0)
  const score = (of: (outcome: Outcome) => { hours: number[], weights: number[] }) => outcomes.reduce((sum, outcome) => sum + crpsWeighted(of(outcome).hours, of(outcome).weights, outcome.truth), 0) / outcomes.length
  const equal = (hours: number[]) => ({ hours, weights: hours.map(() => 1 / hours.length) })

  it('comes true between 60 and 80 % of the times that it says 70 %', () => {
    let [n, hits, said] = [0, 0, 0]
    for (const outcome of outcomes) {
      for (let t = 6; t < AHEAD; t += 6) {
        const chance = chanceBy(outcome.versions, t)
        if (chance < 0.65 || chance >= 0.75) continue
        n++
        said += chance
        if (outcome.truth <= t) hits++
      }
    }
    console.log(`fit by hour t: said ${(100 * said / n).toFixed(0)} % ${n} times, came true ${(100 * hits / n).toFixed(0)} %`)
    expect(n).toBeGreaterThan(150)
    expect(hits / n).toBeGreaterThan(0.6)
    expect(hits / n).toBeLessThan(0.8)
  })

  it('versions beat the one set of parameters, and calls beat versions without', () => {
    const [single, versions, gauge, called] = [score(({ single: hours }) => equal(hours)), score(outcome => outcome.versions), score(outcome => outcome.gauge), score(outcome => outcome.called)]
    console.log(`CRPS of the first fit hour: one set of parameters ${single.toFixed(1)} h, versions ${versions.toFixed(1)} h, with a gauge ${gauge.toFixed(1)} h, with four calls ${called.toFixed(1)} h (calls save ${(100 * (1 - called / versions)).toFixed(0)} %, the gauge ${(100 * (1 - gauge / versions)).toFixed(0)} %)`)
    expect(versions).toBeLessThan(single)
    expect(called).toBeLessThan(versions)
    expect(gauge).toBeLessThan(versions * 1.02)
  })
})
