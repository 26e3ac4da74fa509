import { getPosition, getTimes } from 'suncalc'

/** Sun times and heights, by Meeus' equations as suncalc 2 has them: within a minute of the US Naval Observatory. */

export interface SunDay { sunrise: Date | null, sunset: Date | null, solarNoon: Date }

function onEarth(latitudeDeg: number, longitudeDeg: number): void {
  if (!(Math.abs(latitudeDeg) <= 90)) throw new RangeError(`The latitude (${latitudeDeg}°) must be −90 to 90°`)
  if (!(Math.abs(longitudeDeg) <= 180)) throw new RangeError(`The longitude (${longitudeDeg}°) must be −180 to 180°`)
}

/**
 * The solar day that holds an instant: pass local noon, since the day turns at local midnight by the sun.
 * @returns null for a sunrise or sunset that does not happen
 * @throws {RangeError} for a place that is none or no date
 */
export function sunDay(instant: Date, latitudeDeg: number, longitudeDeg: number): SunDay {
  onEarth(latitudeDeg, longitudeDeg)
  if (Number.isNaN(instant.getTime())) throw new RangeError('The instant must be a date')
  const { sunrise, sunset, solarNoon } = getTimes(instant, latitudeDeg, longitudeDeg)
  return { sunrise: sunrise ?? null, sunset: sunset ?? null, solarNoon }
}

/**
 * Height of the sun, lifted by the air as one sees it.
 * @returns degrees above the horizon
 * @throws {RangeError} for a place that is none or no date
 */
export function sunAltitudeDeg(instant: Date, latitudeDeg: number, longitudeDeg: number): number {
  onEarth(latitudeDeg, longitudeDeg)
  if (Number.isNaN(instant.getTime())) throw new RangeError('The instant must be a date')
  return getPosition(instant, latitudeDeg, longitudeDeg).altitude
}
