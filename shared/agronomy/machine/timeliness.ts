/**
 * What a machine's slowness costs: W = K·A²·Y·V/(Z·G·C·p), $ a year. ASABE EP496, from general knowledge; its unit is
 * proved by W = K·(D/Z)·(A·Y·V) with D the calendar days that the work takes.
 */
export interface Timeliness {
  /** share of the yield lost a day of delay */
  lossPerDay: number
  acres: number
  yieldPerAc: number
  priceUsd: number
  /** 4 when the work is spread evenly about the best date, 2 when it starts or ends there */
  spread: 2 | 4
  hoursPerDay: number
  acresPerHour: number
  /** share of days fit for work, above 0, at most 1 */
  fitShare: number
}

/** Calendar days that work takes. @throws {RangeError} when a figure is out of range */
export function calendarDays({ acres, hoursPerDay, acresPerHour, fitShare }: Pick<Timeliness, 'acres' | 'hoursPerDay' | 'acresPerHour' | 'fitShare'>): number {
  if (!(acres >= 0) || !(hoursPerDay > 0 && hoursPerDay <= 24) || !(acresPerHour > 0) || !(fitShare > 0 && fitShare <= 1)) throw new RangeError(`No days for ${acres} ac at ${acresPerHour} ac/h, ${hoursPerDay} h a day, ${fitShare} of days`)
  return acres / (hoursPerDay * acresPerHour * fitShare)
}

/** @returns $ a year @throws {RangeError} when a figure is out of range */
export function timelinessCostUsd(work: Timeliness): number {
  const { lossPerDay, acres, yieldPerAc, priceUsd, spread } = work
  if (!(lossPerDay >= 0 && lossPerDay < 1) || !(yieldPerAc >= 0) || !(priceUsd >= 0)) throw new RangeError(`No cost with a loss of ${lossPerDay} a day, ${yieldPerAc} an acre at $${priceUsd}`)
  return lossPerDay * calendarDays(work) / spread * acres * yieldPerAc * priceUsd
}

/**
 * Hours until a faster planter has caught up with the digger ahead of it: lead/(Cp − Cd).
 * @param leadAc - acres dug and not planted, ≥ 0
 * @returns Infinity: never
 * @throws {RangeError} when a figure is negative or NaN
 */
export function hoursToCatchUp(leadAc: number, planterAcPerHour: number, diggerAcPerHour: number): number {
  if (!(leadAc >= 0) || !(planterAcPerHour >= 0) || !(diggerAcPerHour >= 0)) throw new RangeError(`No time to catch up from ${leadAc} ac at ${planterAcPerHour} and ${diggerAcPerHour} ac/h: all at least 0`)
  return planterAcPerHour > diggerAcPerHour ? leadAc / (planterAcPerHour - diggerAcPerHour) : Infinity
}
