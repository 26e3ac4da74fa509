import { hoursAfter, restrictedEntryHours } from '../spray/deadlines'
import { isWholeHourWithin, sprayDaylight } from '../spray/daylight'
import { exclusionZoneFt } from '../spray/exclusion-zone'
import { flowAtPressure, gallonsPerAcre, litresPerHectare, load, nozzleFlow, NOZZLE_COLOURS, ounceCourseFt, speedFromCourse } from '../spray/nozzle'
import { runsReaching, staysDry } from '../spray/rainfast'
import { blockedBy, goRuns, type SprayConditions, type SprayLimits } from '../spray/spray-hour'
import { boomWind } from '../weather/wind-profile'
import { check, type Figure } from './figure'

const MPH = 0.44704
const LABEL = 'The label is the law; wind and inversion are judged at the field. Nothing here says that spraying is safe or lawful.'
const none: SprayLimits = { leastWindMs: null, mostWindMs: null, gustOverMs: null, downwindHalfDeg: null, inversion: null, mostDeltaTC: null, leastTemperatureC: null, mostTemperatureC: null, mostRainChance: null, mostRainMm: null, mostRunoffChance: null, daylight: null }
const label = (value: number) => ({ value, source: 'an invented label' })
const windows: SprayLimits = { ...none, leastWindMs: label(3 * MPH), mostWindMs: label(10 * MPH) }
const calm: SprayConditions = { wind: { forLeastMs: 2, forMostMs: 3 }, gustMs: 4, windFromDeg: 270, sensitiveDeg: [], inversion: 'unlikely', deltaTC: 5, temperatureC: 18, rain: { largestChance: 0, sumMm: 0 }, runoffChance: 0, inDaylight: true }
/** Both readings reduced to a boom 24 in up, as the worked cases have it. */
const reduced = (mph: number) => boomWind(mph * MPH, 0.6096).forLeastMs
const said = (conditions: Partial<SprayConditions>, limits: SprayLimits) => blockedBy({ ...calm, ...conditions }, limits).map(({ what }) => what).join(', ') || 'go'
const member = (mm: number) => [mm, 0]

export const SPRAY_FIGURES: readonly Figure[] = [
  {
    id: 'spray-hour', subject: 'spray', name: 'May this hour be sprayed?', meaning: 'Each limit of the product against the hour; every limit that closes it is named.',
    equation: 'least ≤ wind ≤ most, and each other limit of the label', sources: ['the product’s own record', 'method notes on spraying, 1.5, 3.1, 4'], covers: ['spray/spray-hour#blockedBy', 'spray/spray-hour#goRuns'],
    checks: [
      check('12 mph at 10 m, reduced, 3 to 10 mph', 'go', () => said({ wind: { forLeastMs: reduced(12), forMostMs: reduced(12) } }, windows), 'method notes on spraying, 1.5'), check('4 mph', 'wind-low', () => said({ wind: { forLeastMs: reduced(4), forMostMs: reduced(4) } }, windows), 'method notes on spraying, 1.5'),
      check('22 mph', 'wind-high', () => said({ wind: { forLeastMs: reduced(22), forMostMs: reduced(22) } }, windows), 'method notes on spraying, 1.5'), check('12 mph as forecast', 'wind-high', () => said({ wind: { forLeastMs: 12 * MPH, forMostMs: 12 * MPH } }, windows), 'method notes on spraying, 1.5'),
      check('85.0 °F under a limit of 85 °F', 'go', () => said({ temperatureC: (85 - 32) / 1.8 }, { ...none, mostTemperatureC: label((85 - 32) / 1.8) }), 'method notes on spraying, 4.3'),
      check('Delta T 10.1 °C under a limit of 10', 'delta-t', () => said({ deltaTC: 10.1 }, { ...none, mostDeltaTC: label(10) }), 'method notes on spraying, 3.1'),
      check('rain not forecast so far', 'not-known', () => said({ rain: null }, { ...none, mostRainChance: label(0.2) }), 'not known is never a Go'),
      check('west wind, beans to the east, 45° either side', 'downwind', () => said({ sensitiveDeg: [90] }, { ...none, downwindHalfDeg: label(45) }), 'method notes on spraying, 1.4'),
      check('hours 1, 2 and 4 to 6 of seven', '0+2 3+3', () => goRuns([true, true, false, true, true, true, false]).map(({ from, hours }) => `${from}+${hours}`).join(' '), 'by the definition'),
    ],
    unknown: 'Gusts between forecast hours, and the field’s own air.', usualError: 'Wind forecasts are off by 3 mph and more.', caution: LABEL,
  },
  {
    id: 'rainfast', subject: 'spray', name: 'Dry long enough', meaning: 'Rain before the product is fast washes it off; the hours count from the end of spraying.',
    equation: 'no hour above the chance, and at most 0.02 in over the interval', sources: ['Illinois IPM Bulletin 9/1997 (old list of intervals)', 'method notes on spraying, 4.1, 4.4'], covers: ['spray/rainfast#staysDry', 'spray/rainfast#runsReaching'],
    checks: [
      check('four dry hours', 1, () => Number(staysDry(Array(4).fill({ chance: 0.1, mm: 0.05 }), 4, 0.2)!.dry), 'method notes on spraying, 4.1'), check('rain in the fifth hour does not count', 1, () => Number(staysDry([...Array(4).fill({ chance: 0, mm: 0 }), { chance: 0.9, mm: 5 }], 4, 0.2)!.dry), 'method notes on spraying, 4.1: labels 16 to 19'),
      check('0.6 mm in all', 0, () => Number(staysDry(Array(4).fill({ chance: 0.1, mm: 0.15 }), 4, 0.2)!.dry), 'method notes on spraying, 4.1: at most 0.02 in'),
      check('16 of 31 runs bring an inch', 16, () => runsReaching([...Array(16).fill(member(25.4)), ...Array(15).fill(member(25))], 2, 25.4).count, 'method notes on spraying, 4.4'),
    ],
    unknown: 'Dew, and the product’s true interval.', usualError: 'That of the rain forecast.', caution: LABEL,
  },
  {
    id: 'nozzle', subject: 'spray', name: 'Nozzle, rate and load', meaning: 'What the nozzle gives at a speed, and what goes into the tank.',
    equation: 'GPA = 5940·GPM/(mph·in); flow goes with the root of the pressure', sources: ['Florida WG013; Oklahoma State; Clemson; Arizona (ISO 10625)'],
    covers: ['spray/nozzle#gallonsPerAcre', 'spray/nozzle#nozzleFlow', 'spray/nozzle#flowAtPressure', 'spray/nozzle#ounceCourseFt', 'spray/nozzle#speedFromCourse', 'spray/nozzle#litresPerHectare', 'spray/nozzle#load'],
    checks: [
      check('0.4 GPM, 10 mph, 20 in', 11.88, () => gallonsPerAcre(0.4, 10, 20), 'method notes on spraying, 5.3', 1e-9), check('101 oz/min, 3 mph, 18 in', 88, () => gallonsPerAcre(101 / 128, 3, 18), 'Oklahoma State', 1.5, 'extension rounds the flow to 0.8; exact 86.80'),
      check('back to the flow', 0.4, () => nozzleFlow(11.88, 10, 20), 'inverse', 1e-9), check('0.4 GPM at 40 psi, at 20 psi', 0.4 / Math.SQRT2, () => flowAtPressure(0.4, 40, 20), 'square-root law', 1e-12),
      ...([[20, 204], [30, 136], [40, 102]] as const).map(([spacing, want]) => check(`1/128 ac at ${spacing} in, ft`, want, () => ounceCourseFt(spacing), 'Clemson', 0.5, 'printed in whole feet')),
      check('88 ft in 60 s, mph', 1, () => speedFromCourse(88, 60), 'by the definition', 1e-12), check('1 GPA, L/ha', 9.354, () => litresPerHectare(1), 'method notes on spraying, 5.3', 5e-4),
      check('red nozzle, GPM at 40 psi', 0.4, () => NOZZLE_COLOURS['04'][1], 'Arizona extension sheet'),
      check('15 GPA on 3.5 ac, gal', 52.5, () => load(3.5, 15, []).mixGal, 'method notes on spraying, 5.3'), check('3 lb/ac on 3.5 ac', 10.5, () => load(3.5, 15, [{ name: 'a', rate: 3, per: 'acre', unit: 'lb' }]).products[0]!.amount, 'method notes on spraying, 5.3'),
      check('32 fl oz/ac on 37 ac, gal', 9.25, () => load(37, 15, [{ name: 'a', rate: 32 / 128, per: 'acre', unit: 'gal' }]).products[0]!.amount, 'method notes on spraying, 5.3', 1e-9), check('17 lb in 100 gal, 1,200 gal', 204, () => load(80, 15, [{ name: 'ams', rate: 17, per: 'hundred-gallons', unit: 'lb' }]).products[0]!.amount, 'method notes on spraying, 5.3', 1e-9),
      check('0.25 % of 1,200 gal', 3, () => load(80, 15, [{ name: 'nis', rate: 0.25, per: 'percent', unit: 'gal' }]).products[0]!.amount, 'method notes on spraying, 5.3', 1e-9),
    ],
    unknown: 'Worn tips: catch and measure.', usualError: '5 % of a calibrated sprayer.', caution: LABEL,
  },
  {
    id: 'spray-rules', subject: 'spray', name: 'Zones, daylight, entry and records', meaning: 'Distances and hours that rules name, counted as they pass.',
    equation: 'elapsed hours; the longest interval of a tank governs', sources: ['40 CFR 170.405; 40 CFR 156.208 and 170', '2019 dicamba labels', 'FR Doc 2025-08220: 7 CFR 110.3 rescinded from 11 July 2025'],
    covers: ['spray/exclusion-zone#exclusionZoneFt', 'spray/daylight#sprayDaylight', 'spray/daylight#isWholeHourWithin', 'spray/deadlines#hoursAfter', 'spray/deadlines#restrictedEntryHours'],
    checks: [
      ...([[20, 'fine', 100], [20, 'medium', 25], [20, 'very coarse', 25], [10, 'coarse', 0]] as const).map(([height, drops, want]) => check(`${drops} drops from ${height} in, ft`, want, () => exclusionZoneFt(height, drops), '40 CFR 170.405; method notes on spraying, 1.2')),
      check('ends 10 June 16:30 CDT, 72 h', '2026-06-13T21:30:00.000Z', () => hoursAfter(new Date('2026-06-10T21:30Z'), 72).toISOString(), 'method notes on spraying, 6.2'), check('ends 15 May 14:20 CDT, 48 h', '2026-05-17T19:20:00.000Z', () => hoursAfter(new Date('2026-05-15T19:20Z'), 48).toISOString(), 'method notes on spraying, 6.3'),
      check('over the change of clock, 7 March 12:00 CST, 24 h', '2026-03-08T18:00:00.000Z', () => hoursAfter(new Date('2026-03-07T18:00Z'), 24).toISOString(), 'elapsed hours'), check('12 and 24 h in a tank', 24, () => restrictedEntryHours([12, 24]), 'method notes on spraying, 6.3'),
      check('Fargo, 15 May: from', '2026-05-15T11:52:02.000Z', () => fargo().from.toISOString(), 'method notes on spraying, 7.4'), check('to', '2026-05-15T23:55:43.000Z', () => fargo().to.toISOString(), 'method notes on spraying, 7.4'),
      check('the hour from 11:00Z', 0, () => Number(isWholeHourWithin(new Date('2026-05-15T11:00Z'), fargo())), 'method notes on spraying, 4.5: whole hours only'), check('the hour from 12:00Z', 1, () => Number(isWholeHourWithin(new Date('2026-05-15T12:00Z'), fargo())), 'method notes on spraying, 4.5'),
    ],
    unknown: 'State rules, and changes since these were read.', usualError: 'None in the arithmetic.', caution: LABEL,
  },
]

/** 1 h after sunrise to 2 h before sunset. */
function fargo() {
  return sprayDaylight({ sunrise: new Date('2026-05-15T10:52:02Z'), sunset: new Date('2026-05-16T01:55:43Z') }, { afterSunriseH: 1, beforeSunsetH: 2 })!
}
