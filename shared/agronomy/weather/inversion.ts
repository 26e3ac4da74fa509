import { turnerStability, type Stability } from './stability'
import { boomWind } from './wind-profile'

/** How likely the air lies upside down, warm over cold. Screening only: smoke or two thermometers at the site decide. */
export type InversionChance = 'likely' | 'possible' | 'unlikely'

export interface InversionHour {
  /** hours from sunrise, negative before it */
  afterSunriseH: number
  /** hours to sunset, negative behind it */
  toSunsetH: number
  sunDeg: number
  /** at 10 m, m/s */
  windMs: number
  /** 0 to 100 */
  cloudPct: number
  ceilingFt: number | null
  /** temperature at about 80 m less that at 2 m, °C; null: not known */
  aloftC: number | null
}

/** Thresholds of the screening; settings, not published limits (spray.md 2.6). */
export interface InversionSettings {
  /** wind at 10 m under which a clear night is likely to have one, m/s */
  likelyBelowMs: number
  likelyCloudPct: number
  /** wind at the boom under which the hours before sunset may have one, m/s */
  possibleBelowMs: number
  possibleCloudPct: number
  boomM: number
}
/** 5 mph and 40 %; 3 mph at a boom 24 in up and 50 %. */
export const INVERSION_SETTINGS: InversionSettings = { likelyBelowMs: 2.2352, likelyCloudPct: 40, possibleBelowMs: 1.34112, possibleCloudPct: 50, boomM: 0.6096 }

/**
 * Screens an hour for a temperature inversion (spray.md 2.6, built from NDSU's and Missouri's field observations and
 * Turner's classes).
 *
 * @returns how likely, and the stability by Turner that it rests on
 * @throws {RangeError} when a value is out of its range
 */
export function screenInversion(hour: InversionHour, settings = INVERSION_SETTINGS): { chance: InversionChance, stability: Stability } {
  const { afterSunriseH, toSunsetH, windMs, cloudPct } = hour
  if (!(cloudPct >= 0 && cloudPct <= 100)) throw new RangeError(`The cloud (${cloudPct} %) must be 0 to 100 %`)
  const night = afterSunriseH < 1 || toSunsetH < 1
  const stability = turnerStability(windMs, { night, sunDeg: hour.sunDeg, cloudTenths: Math.round(cloudPct / 10), ceilingFt: hour.ceilingFt })
  const aroundNight = (toSunsetH >= 1 && toSunsetH <= 3) || (afterSunriseH >= 1 && afterSunriseH <= 2)
  if (stability === 'F' || stability === 'G' || (night && windMs < settings.likelyBelowMs && cloudPct <= settings.likelyCloudPct)) return { chance: 'likely', stability }
  const still = boomWind(windMs, settings.boomM).forLeastMs < settings.possibleBelowMs
  if ((aroundNight && still && cloudPct <= settings.possibleCloudPct) || stability === 'E' || (hour.aloftC ?? 0) > 0) return { chance: 'possible', stability }
  return { chance: 'unlikely', stability }
}
