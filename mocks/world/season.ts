import { FRONTS, amountSpread, timingSpreadHours, type Front } from './fronts'
import { normal, wandering } from './noise'

/** One version of the weather: the truth, or what a run of a forecast cycle believes. */
export interface Scenario {
  /** Unix hours at which the forecast was made; Infinity: the truth */
  madeAt: number
  /** 0 is the control run */
  run: number
}
export const TRUTH: Scenario = { madeAt: Infinity, run: -1 }

export interface Place { latitude: number, longitude: number }

/** Weather at an instant; rain and snow are rates. */
export interface Moment {
  temperatureC: number
  dewPointC: number
  humidityPct: number
  cloudPct: number
  windMs: number
  gustMs: number
  windFromDeg: number
}

const REFERENCE = { latitude: 46.9, longitude: -96.8 }
/** Fronts move east at about this speed. */
const FRONT_KMH = 40
const KM_PER_DEGREE = 111.2
const SOLAR_CONSTANT_WM2 = 1361
/** Keys of the separate noises. */
const KEY = { warm: 11, cloud: 12, wind: 13, direction: 14, amount: 15, timing: 16, place: 17, dew: 18 }

/** The noise of a time in a scenario. It is the same at every place, so it is drawn once for all of them. */
interface Noises {
  warm: number
  cloud: number
  wind: number
  direction: number
  dew: number
  gust: number
  warmError: number
  cloudError: number
  windError: number
}
/** What a scenario has drawn so far: noises by time, and how each front differs. */
interface Draws { noises: Map<number, Noises>, fronts: Map<number, { timing: number, amount: number }> }
const drawn = new Map<string, Draws>()
/** Runs of some cycles; an older cycle is hardly asked for again. */
const MOST_DRAWN = 160

function drawsOf({ madeAt, run }: Scenario): Draws {
  const key = `${madeAt} ${run}`
  const known = drawn.get(key)
  if (known) return known
  if (drawn.size >= MOST_DRAWN) drawn.delete(drawn.keys().next().value!)
  const draws: Draws = { noises: new Map(), fronts: new Map() }
  drawn.set(key, draws)
  return draws
}

function noisesAt(time: number, scenario: Scenario): Noises {
  const { noises } = drawsOf(scenario)
  const known = noises.get(time)
  if (known) return known
  const made: Noises = {
    warm: wandering(time, 60, KEY.warm),
    cloud: wandering(time, 16, KEY.cloud),
    wind: wandering(time, 9, KEY.wind),
    direction: wandering(time, 40, KEY.direction),
    dew: wandering(time, 20, KEY.dew),
    gust: normal(Math.floor(time), KEY.wind, 5),
    warmError: error(time, scenario, KEY.warm),
    cloudError: error(time, scenario, KEY.cloud),
    windError: error(time, scenario, KEY.wind),
  }
  noises.set(time, made)
  return made
}

/** mm that fall between two instants (Unix hours) at a place. */
export function rainBetween(from: number, to: number, place: Place, scenario: Scenario): number {
  let mm = 0
  for (const passing of frontsNear(from, place, 40)) {
    const { startsAt, total } = believed(passing, scenario)
    mm += total * (shareFallen((to - startsAt) / passing.front.hours) - shareFallen((from - startsAt) / passing.front.hours))
  }
  return mm < 0.02 ? 0 : mm
}

/** Weather at an instant (Unix hours) at a place. */
export function momentAt(time: number, place: Place, scenario: Scenario): Moment {
  const noises = noisesAt(time, scenario)
  const since = sinceFronts(time, place, scenario)
  const cloud = cloudAt(noises, since)
  const temperatureC = temperatureAt(time, place, cloud, since, noises)
  const raining = since.some(({ front, hours }) => hours > 0 && hours < front.hours)
  const depression = Math.max(0.3, (raining ? 0.8 : 6.5) + (raining ? 0 : 2.2) * noises.dew * 0.6 + (raining ? 0 : 5) * Math.max(-0.7, swing(time, place)))
  const dewPointC = temperatureC - depression
  const { windMs, windFromDeg } = windAt(time, place, since, noises)
  return {
    temperatureC,
    dewPointC,
    humidityPct: Math.min(100, 100 * vapour(dewPointC) / vapour(temperatureC)),
    cloudPct: 100 * cloud,
    windMs,
    gustMs: windMs * (1.45 + 0.15 * Math.abs(noises.gust)),
    windFromDeg,
  }
}

/** Radiation at an instant, W/m²: clear-sky transmission and cloud attenuation in the usual simple forms. */
export function radiationAt(time: number, place: Place, scenario: Scenario): number {
  const altitude = sineOfSun(time, place)
  if (altitude <= 0) return 0
  return SOLAR_CONSTANT_WM2 * altitude * 0.76 * (1 - 0.72 * cloudAt(noisesAt(time, scenario), sinceFronts(time, place, scenario)) ** 2.2)
}

interface SinceFront { front: Front, hours: number }

/** Hours since each front near in time has come, as the scenario has it; negative: it is still to come. */
function sinceFronts(time: number, place: Place, scenario: Scenario): SinceFront[] {
  return frontsNear(time, place, 60).map(passing => ({ front: passing.front, hours: time - believed(passing, scenario).startsAt }))
}

/** A front as it passes a place: when it arrives there, and what it brings. */
interface Passing { front: Front, arrives: number, mm: number }
const passings = new Map<string, Passing[]>()

function passingsAt(place: Place): Passing[] {
  const key = `${place.latitude} ${place.longitude}`
  const known = passings.get(key)
  if (known) return known
  const delay = delayHours(place)
  const made = FRONTS.map(front => ({ front, arrives: front.startsAt + delay, mm: front.mm * shareHere(front, place) }))
  passings.set(key, made)
  return made
}

function frontsNear(time: number, place: Place, hours: number): Passing[] {
  const near: Passing[] = []
  for (const passing of passingsAt(place)) if (Math.abs(passing.arrives + passing.front.hours / 2 - time) < hours) near.push(passing)
  return near
}

/** Hours after the reference meridian at which a front reaches a place. */
function delayHours(place: Place): number {
  return (place.longitude - REFERENCE.longitude) * KM_PER_DEGREE * Math.cos(place.latitude * Math.PI / 180) / FRONT_KMH
}

/** What a place gets of a front, as a share of the front's own amount. */
function shareHere(front: Front, place: Place): number {
  return Math.exp(0.1 * wandering(place.latitude * 12, 1, KEY.place, front.id) + 0.1 * wandering(place.longitude * 9, 1, KEY.place, front.id, 1))
}

/**
 * When a front comes and how much it brings, as a scenario has it.
 *
 * The truth is one draw around the forecast's middle, each run another of the same spread: so rain comes as often as
 * the runs say.
 */
function believed({ front, arrives, mm: total }: Passing, scenario: Scenario): { startsAt: number, total: number } {
  const lead = arrives - scenario.madeAt
  if (!Number.isFinite(scenario.madeAt) || lead < -front.hours) return { startsAt: arrives, total }
  const { timing, amount } = errorsOf(front, scenario)
  return { startsAt: arrives + timingSpreadHours(lead) * timing, total: total * Math.exp(amountSpread(lead) * amount) }
}

/** How a scenario's draw of a front differs from the truth, in standard deviations. */
function errorsOf(front: Front, scenario: Scenario): { timing: number, amount: number } {
  const { fronts } = drawsOf(scenario)
  const known = fronts.get(front.id)
  if (known) return known
  const { madeAt, run } = scenario
  const made = {
    timing: normal(front.id, run, madeAt, KEY.timing) - (front.scriptedError ?? wandering(madeAt, 30, KEY.timing, front.id)),
    amount: normal(front.id, run, madeAt, KEY.amount) - wandering(madeAt, 30, KEY.amount, front.id),
  }
  fronts.set(front.id, made)
  return made
}

/** Share of a front's rain that has fallen after a share of its time: slow, heavy, slow. */
function shareFallen(x: number): number {
  if (x <= 0) return 0
  if (x >= 1) return 1
  return x * x * (3 - 2 * x)
}

function cloudAt(noises: Noises, since: SinceFront[]): number {
  let cloud = 0.35 + 0.22 * noises.cloud + noises.cloudError * 0.03
  for (const { front, hours } of since) {
    const ahead = Math.max(0, 1 + hours / 14)
    const behind = hours < front.hours ? 1 : Math.max(0, 1 - (hours - front.hours) / 12)
    cloud = Math.max(cloud, hours < 0 ? ahead : behind)
  }
  return Math.min(1, Math.max(0.02, cloud))
}

function temperatureAt(time: number, place: Place, cloud: number, since: SinceFront[], noises: Noises): number {
  const day = time / 24
  const yearDay = day - Date.UTC(2025, 0, 1) / 86_400_000
  const north = (place.latitude - REFERENCE.latitude) * 0.8
  let celsius = 10.4 - north - 17.5 * Math.cos(2 * Math.PI * (yearDay - 22) / 365)
  celsius += 2.2 * noises.warm
  celsius += 7.2 * (1 - 0.65 * cloud) * swing(time, place)
  for (const { front, hours } of since) {
    if (hours > -18 && hours < 0) celsius += 2 * (1 + hours / 18)
    else if (hours >= 0) celsius -= front.coldBehind * Math.min(1, hours / 4) * Math.exp(-Math.max(0, hours - 20) / 18)
  }
  return celsius + 0.03 * noises.warmError
}

/** −1 before sunrise to 1 in mid afternoon. */
function swing(time: number, place: Place): number {
  const solarHour = time + place.longitude / 15
  return Math.cos(2 * Math.PI * (solarHour - 15) / 24)
}

/** South-east wind ahead of a front, north-west behind it. */
function windAt(time: number, place: Place, since: SinceFront[], noises: Noises): { windMs: number, windFromDeg: number } {
  let speed = 4 + 1.1 * noises.wind + 1.3 * swing(time, place) + 0.02 * noises.windError
  let direction = 200 + 60 * noises.direction
  for (const { front, hours } of since) {
    const turned = 1 / (1 + Math.exp(-(hours - front.hours * 0.55) / 1.5))
    const grip = Math.exp(-(((hours - front.hours / 2) / 22) ** 2))
    speed += grip * Math.min(5, front.mm / 4)
    direction += grip * (((135 + 180 * turned) - direction + 540) % 360 - 180)
  }
  return { windMs: Math.max(0.4, speed), windFromDeg: ((direction % 360) + 360) % 360 }
}

/** Error of a forecast at a time, growing with the lead: a middle shared by all runs, and the run's own. 0 for the truth. */
function error(time: number, { madeAt, run }: Scenario, key: number): number {
  if (!Number.isFinite(madeAt) || time <= madeAt) return 0
  const lead = Math.min(time - madeAt, 168)
  return Math.sqrt(lead) * 4 * (wandering(time, 18, key, madeAt, run, 7) - wandering(time, 18, key, madeAt, 8)) * Math.SQRT1_2
}

function vapour(celsius: number): number {
  return Math.exp(17.27 * celsius / (celsius + 237.3))
}

/** Sine of the sun's height. */
function sineOfSun(time: number, place: Place): number {
  const yearDay = time / 24 - Date.UTC(2025, 0, 1) / 86_400_000
  const declination = 0.409 * Math.sin(2 * Math.PI * (yearDay + 1) / 365 - 1.39)
  const hourAngle = Math.PI / 12 * (((time % 24) + place.longitude / 15) - 12)
  const phi = place.latitude * Math.PI / 180
  return Math.sin(phi) * Math.sin(declination) + Math.cos(phi) * Math.cos(declination) * Math.cos(hourAngle)
}
