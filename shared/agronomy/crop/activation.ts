/** Rain that washes a soil-applied herbicide into the top of the soil (spray.md 4.2). */

export type Activation = 'not-activated' | 'partial' | 'activated' | 'leaching-risk'

/** Inches over the seven days behind the application; settings over the labels and Clemson, Purdue and SDSU's advice. */
export const ACTIVATION_IN = { partial: 0.25, full: 0.5, leachingInADay: 2 } as const

const MM_PER_INCH = 25.4

/**
 * @param dailyMm - rain of days 1 to 7 behind the application, ≥ 0; the day itself is not among them
 * @throws {RangeError} with more than seven days or a negative amount
 */
export function activation(dailyMm: readonly number[]): { sumMm: number, status: Activation } {
  if (dailyMm.length > 7 || dailyMm.some(mm => !(mm >= 0))) throw new RangeError('Activation looks at up to seven days of rain, none negative')
  const sumMm = dailyMm.reduce((sum, mm) => sum + mm, 0)
  const inches = sumMm / MM_PER_INCH
  if (dailyMm.some(mm => mm >= ACTIVATION_IN.leachingInADay * MM_PER_INCH)) return { sumMm, status: 'leaching-risk' }
  return { sumMm, status: inches >= ACTIVATION_IN.full ? 'activated' : inches >= ACTIVATION_IN.partial ? 'partial' : 'not-activated' }
}
