/** Arithmetic of nozzle, rate and load (spray.md 5.3). US customary, as tank and label have it. */

function above0(values: Record<string, number>): void {
  for (const [name, value] of Object.entries(values)) if (!(value > 0) || !Number.isFinite(value)) throw new RangeError(`The ${name} (${value}) must be above 0`)
}

/** GPA = 5940·GPM/(mph·in): 43,560·12·60/5280 (Florida WG013). @returns gallons an acre @throws {RangeError} unless all are above 0 */
export function gallonsPerAcre(gallonsPerMinute: number, speedMph: number, spacingIn: number): number {
  above0({ flow: gallonsPerMinute, speed: speedMph, spacing: spacingIn })
  return 5940 * gallonsPerMinute / (speedMph * spacingIn)
}

/** The flow that a rate needs, gallons a minute for each nozzle. @throws {RangeError} unless all are above 0 */
export function nozzleFlow(rateGpa: number, speedMph: number, spacingIn: number): number {
  above0({ rate: rateGpa, speed: speedMph, spacing: spacingIn })
  return rateGpa * speedMph * spacingIn / 5940
}

/** Flow at another pressure: it goes with the square root. @throws {RangeError} unless all are above 0 */
export function flowAtPressure(gallonsPerMinute: number, pressurePsi: number, atPsi: number): number {
  above0({ 'flow': gallonsPerMinute, 'pressure': pressurePsi, 'other pressure': atPsi })
  return gallonsPerMinute * Math.sqrt(atPsi / pressurePsi)
}

/** Length of a course that is 1/128 acre at a spacing: ounces caught are gallons an acre. @returns ft @throws {RangeError} unless above 0 */
export function ounceCourseFt(spacingIn: number): number {
  above0({ spacing: spacingIn })
  return 43_560 / 128 / (spacingIn / 12)
}

/** Speed from a timed course: ft·60/(s·88). @returns mph @throws {RangeError} unless all are above 0 */
export function speedFromCourse(distanceFt: number, seconds: number): number {
  above0({ distance: distanceFt, time: seconds })
  return distanceFt * 60 / (seconds * 88)
}

/** Litres a hectare from gallons an acre. @throws {RangeError} unless above 0 */
export function litresPerHectare(rateGpa: number): number {
  above0({ rate: rateGpa })
  return rateGpa * 3.785411784 / 0.40468564224
}

/** Colours of nozzle sizes by ISO 10625, with their flow at 40 psi, gallons a minute. The colour of a drop class is another. */
export const NOZZLE_COLOURS = {
  '01': ['orange', 0.1], '015': ['green', 0.15], '02': ['yellow', 0.2], '025': ['purple', 0.25], '03': ['blue', 0.3], '04': ['red', 0.4], '05': ['brown', 0.5], '06': ['grey', 0.6], '08': ['white', 0.8],
} as const

/** What goes into the tank for some acres. */
export interface Load {
  /** gallons of mix */
  mixGal: number
  /** of each product, in the unit of its rate */
  products: { name: string, amount: number, unit: string }[]
}

/**
 * @param products - rate an acre, or percent of the mix's volume, or pounds in 100 gallons
 * @throws {RangeError} unless area and rate are above 0 and product rates at least 0
 */
export function load(acres: number, rateGpa: number, products: readonly { name: string, rate: number, per: 'acre' | 'percent' | 'hundred-gallons', unit: string }[]): Load {
  above0({ area: acres, rate: rateGpa })
  const mixGal = acres * rateGpa
  const bad = products.find(({ rate }) => !(rate >= 0))
  if (bad) throw new RangeError(`The rate of ${bad.name} (${bad.rate}) must be at least 0`)
  return { mixGal, products: products.map(({ name, rate, per, unit }) => ({ name, unit, amount: per === 'acre' ? rate * acres : rate * mixGal / 100 })) }
}
