import { activation } from '../crop/activation'
import { dayReaching, degreeDays, degreeDaysAveraged, degreeDaysClipped, degreeDaysHourly, degreeDaysSine, degreeDaysToC, DEGREE_DAY_RULES, sumDegreeDays } from '../crop/degree-days'
import { cornEmergence, EMERGENCE_HEAT, smallGrainEmergence, sugarbeetDays } from '../crop/emergence'
import { freezeRisk } from '../crop/freeze'
import { minimumSoilC } from '../crop/germination'
import { dayAfter, daysBetween, guaranteeShare, type LatePlanting } from '../crop/late-planting'
import { cornLeafStage } from '../crop/leaf-stage'
import { CHILL_RULES, plantingAdvice } from '../crop/planting-advice'
import { PLANTING_TABLES } from '../crop/planting-tables'
import { compareReplant, cornYieldPct } from '../crop/replant'
import { rollingVerdict } from '../crop/rolling'
import { backlogDays, sprayBy } from '../crop/spray-by'
import { meanStand, rowLengthFt, standFromHoop, standFromRow } from '../crop/stand'
import { calendarDay } from '../crop/calendar-day'
import { yieldShare } from '../crop/yield-share'
import { check, type Figure } from './figure'

const AGRONOMIST = 'The agronomist and the insurer decide; this is arithmetic on published tables.'
const CROP = 'method notes on crops,'
const MAX = [52, 58, 63, 49, 45, 55, 61, 66, 70, 74, 68, 57, 50, 54, 62, 69, 75, 81, 88, 92, 84, 72, 64, 60, 67, 73, 78, 80, 71, 66]
const MIN = [31, 35, 41, 38, 33, 29, 36, 43, 48, 50, 52, 44, 37, 34, 39, 45, 50, 55, 61, 66, 63, 54, 46, 40, 42, 49, 55, 58, 53, 47]
/** The worked season of method notes on crops, 1.5: planted 4 May, counted from 5 May. */
const SEASON = MAX.map((max, i) => ({ day: dayAfter('2025-05-05', i), max, min: MIN[i]! }))
const through = (day: string) => SEASON.filter(each => each.day <= `2025-${day}`)
const sums = (rule: Parameters<typeof sumDegreeDays>[1]) => ['05-07', '05-15', '05-23'].map(day => sumDegreeDays(through(day), rule).sum)
const sine = { ...DEGREE_DAY_RULES.corn, method: 'single-sine' as const }
const averaged = { ...DEGREE_DAY_RULES.corn, method: 'average-then-clip' as const }
const seasonRows = (name: string, want: readonly number[], rule: Parameters<typeof sumDegreeDays>[1]) => want.map((value, i) => check(`${name}, through ${['7', '15', '23'][i]} May`, value, () => sums(rule)[i]!, `${CROP} 1.5`, 0.005))
const crossing = (threshold: number, rule: Parameters<typeof dayReaching>[1] = DEGREE_DAY_RULES.corn) => dayReaching(SEASON, rule, threshold)!
const EM8578 = [[72, 48], [78, 45], [69, 43], [73, 45], [75, 46], [74, 49]].map(([max, min]) => [(max! - 32) / 1.8, (min! - 32) / 1.8] as const)
const MINNESOTA_CORN: LatePlanting = { finalDate: '2020-05-25', lateDays: 25, lossPctPerDay: 1, preventedPct: null }
const beside = (table: string, day: readonly [number, number]) => 100 * yieldShare(PLANTING_TABLES.get(table)!, calendarDay(...day))!

export const CROP_FIGURES: readonly Figure[] = [
  {
    id: 'degree-days', subject: 'crop', name: 'Growing degree days', meaning: 'Heat that a crop can use in a day; seeds come up after a sum of it, not after a number of days.',
    equation: 'corn and soybean: (min(max(Tx, 50), 86) + min(max(Tn, 50), 86))/2 − 50 °F', sources: ['Gilmore & Rogers 1958; Barger 1969', 'McMaster & Wilhelm 1997', 'Baskerville & Emin 1969'],
    covers: ['crop/degree-days#degreeDaysClipped', 'crop/degree-days#degreeDaysAveraged', 'crop/degree-days#degreeDaysSine', 'crop/degree-days#degreeDaysHourly', 'crop/degree-days#degreeDays', 'crop/degree-days#sumDegreeDays', 'crop/degree-days#dayReaching', 'crop/degree-days#degreeDaysToC'],
    checks: [
      ...([[80, 60, 20, 'Ohio State AGF-101'], [60, 40, 5, 'Ohio State AGF-101'], [80, 55, 17.5, 'Purdue, Heat Unit Concepts, example 1'], [70, 50, 10, 'Iowa State Agron 541'], [95, 90, 36, 'Iowa State: at most 36'], [50, 20, 0, 'by the definition']] as const)
        .map(([max, min, want, cite]) => check(`86/50, ${max} and ${min} °F`, want, () => degreeDays(min, max, DEGREE_DAY_RULES.corn), cite, 1e-9)),
      ...([[10, -4, 0, null, 3, 5], [4, -6, 0, null, 0, 2], [25, 15, 10, 30, 10, 10]] as const).flatMap(([max, min, base, cap, one, two]) => [
        check(`method 1, ${max} and ${min} °C, base ${base}`, one, () => degreeDaysAveraged(min, max, base, cap), `McMaster & Wilhelm 1997; ${CROP} 1.3`, 1e-9),
        check(`method 2, ${max} and ${min} °C, base ${base}`, two, () => degreeDaysClipped(min, max, base, cap), `McMaster & Wilhelm 1997; ${CROP} 1.3`, 1e-9),
      ]),
      ...([[55, 80, 17.5], [40, 60, 3.1831], [41, 68, 6.7882], [70, 90, 29.2245], [30, 49, 0]] as const).map(([min, max, want]) => check(`sine, ${min} to ${max} °F`, want, () => degreeDaysSine(min, max, 50, 86), `${CROP} 1.4`, 5e-5)),
      check('24 samples of the sine, 40 to 60 °F', 3.1922, () => degreeDaysHourly(Array.from({ length: 24 }, (_, h) => 50 + 10 * Math.sin(2 * Math.PI * (h + 0.5) / 24)), 50, 86).degreeDays, `${CROP} 1.4`, 5e-5),
      check('six days of wheat, °C, unrounded', 92.5, () => EM8578.reduce((sum, [max, min]) => sum + degreeDaysAveraged(min, max, 0, null), 0), `Oregon State EM 8578, ${CROP} T6`, 0.005, 'it prints 94, having rounded each day'),
      ...seasonRows('corn', [11.5, 59.5, 134.5], DEGREE_DAY_RULES.corn), ...seasonRows('corn, method 1', [2, 37.5, 100.5], averaged), ...seasonRows('corn, sine', [6.91, 48.57, 118.34], sine),
      ...seasonRows('small grain', [44.5, 196.5, 374], DEGREE_DAY_RULES['small-grain']), ...seasonRows('sugarbeet', [39.5, 179, 356.5], DEGREE_DAY_RULES.sugarbeet),
      check('the day of 115', '2025-05-23', () => crossing(115).day, `${CROP} 1.5`), check('its share', 0.17, () => crossing(115).share, `${CROP} 1.5`, 5e-4),
      check('the day of 170', '2025-05-25', () => crossing(170).day, `${CROP} 1.5`), check('its share', 0.404, () => crossing(170).share, `${CROP} 1.5`, 5e-4),
      check('115 by sine, share of 23 May', 0.862, () => crossing(115, sine).share, `${CROP} 1.5`, 5e-4), check('115 by method 1, share of 24 May', 0.5, () => crossing(115, averaged).share, `${CROP} 1.5`, 5e-4),
      check('180 °F·d in °C·d', 100, () => degreeDaysToC(180), `${CROP} 1.2`, 1e-9),
    ],
    unknown: 'The soil is not the air: a cold seedbed lags behind.', usualError: 'A sum is right for its own method only; another method differs by days in a cold spring.',
  },
  {
    id: 'emergence', subject: 'crop', name: 'Heat to emergence', meaning: 'How much heat a seed needs to come up, as a range.',
    equation: 'corn 90–120, 125 with adjustments; soybean 90–130; small grain 80 + 50 per inch', sources: ['Purdue (Nielsen 2019)', 'Wisconsin Crop Manager 10(8):63 (Lauer 2003)', 'Iowa State 2021', 'NDSU (Khan 2020)'],
    covers: ['crop/emergence#cornEmergence', 'crop/emergence#smallGrainEmergence', 'crop/emergence#sugarbeetDays', 'crop/leaf-stage#cornLeafStage'],
    checks: [
      check('corn, fine soil, middle', 170, () => cornEmergence({ texture: 'fine', depthIn: 2, dry: false, residuePct: 30 }).usual, `W121; ${CROP} 2.2`), check('corn, fine soil, high', 185, () => cornEmergence({ texture: 'fine', depthIn: 2, dry: false, residuePct: 30 }).high, `W121; ${CROP} 2.2`),
      check('corn, coarse soil, least adjustment', 95, () => cornEmergence({ texture: 'coarse', depthIn: 2, dry: false, residuePct: 30 }).high, `W121; ${CROP} 2.2`),
      check('corn, medium soil, 3 in', 140, () => cornEmergence({ texture: 'medium', depthIn: 3, dry: false, residuePct: 30 }).usual, 'W121: +15 per inch below 2'),
      check('corn, Purdue’s usual', 115, () => EMERGENCE_HEAT.corn.usual, 'Purdue field guide'), check('soybean, lowest', 90, () => EMERGENCE_HEAT.soybean.low, 'Iowa State, 19 April 2021'), check('soybean, highest', 130, () => EMERGENCE_HEAT.soybean.high, 'Iowa State, 19 April 2021'),
      ...([[1, 130], [2, 180], [3, 230]] as const).map(([depth, want]) => check(`wheat, ${depth} in`, want, () => smallGrainEmergence(depth).usual, `${CROP} 2.1, general knowledge`)),
      check('sugarbeet at 48 °F, fewest days', 10, () => sugarbeetDays(48)!.fewest, 'NDSU, Khan, 7 May 2020'), check('sugarbeet at 48 °F, most days', 21, () => sugarbeetDays(48)!.most!, 'NDSU, Khan, 7 May 2020'),
      check('corn, 201 since planting, up at 119', 1, () => cornLeafStage(201, 119)!, `Nielsen; ${CROP} 2.3`, 1e-9), check('corn, 350 since planting, up at 119', 2.82, () => cornLeafStage(350, 119)!, `Nielsen; ${CROP} 2.3`, 0.005),
    ],
    unknown: 'Crusts, seed vigour, uneven depth.', usualError: 'Two to five days in a cold spring.', caution: AGRONOMIST,
  },
  {
    id: 'soil-warmth-for-seed', subject: 'crop', name: 'Warm enough to plant', meaning: 'Seed that drinks cold water in its first day or two may die.',
    equation: 'hold under the crop’s minimum, or with cold rain within its window', sources: ['NDSU; Montana State; Manitoba', 'Nebraska Extension 2020; Penn State 2022; Iowa State'],
    covers: ['crop/germination#minimumSoilC', 'crop/planting-advice#plantingAdvice'],
    checks: [
      check('corn, °C', 10, () => minimumSoilC('corn'), 'NDSU 50 °F; Manitoba 10 °C', 1e-9), check('wheat, °C', 4, () => minimumSoilC('spring wheat'), 'Manitoba', 0.5, 'NDSU has 40 °F, which is 4.4 °C'),
      check('corn, mean 48 °F on 24 April', 'hold-cold', () => plantingAdvice({ meanF: 48, coldest: { f: 47, inHours: 12 }, rainIn: 0, pastOverride: false }, CHILL_RULES.corn), `${CROP} 3`),
      check('corn, mean 52 °F, 43 °F with 0.6 in within 48 h', 'hold-chill', () => plantingAdvice({ meanF: 52, coldest: { f: 43, inHours: 30 }, rainIn: 0.6, pastOverride: false }, CHILL_RULES.corn), `${CROP} 3`),
      check('soybean, the same at hour 30', 'caution', () => plantingAdvice({ meanF: 52, coldest: { f: 43, inHours: 30 }, rainIn: 0.6, pastOverride: false }, CHILL_RULES.soybean), `${CROP} 3`),
      check('wheat, mean 41 °F', 'go', () => plantingAdvice({ meanF: 41, coldest: { f: 38, inHours: 10 }, rainIn: 0.6, pastOverride: false }, CHILL_RULES.wheat), `${CROP} 3`),
    ],
    unknown: 'The hybrid’s own hardiness; sources on corn range from 39 to 50 °F.', usualError: 'Services disagree by 2 °C.', caution: AGRONOMIST,
  },
  {
    id: 'planting-date', subject: 'crop', name: 'Yield by planting date', meaning: 'What a day’s delay costs, from trials; never carried beyond the last date printed.',
    equation: 'straight lines between the printed dates', sources: ['UMN Extension (Potter & Quiring; Severson)', 'NDSU and UMN small-grain tables'], covers: ['crop/yield-share#yieldShare', 'crop/calendar-day#calendarDay'],
    checks: [
      check('corn, study 1, 12 May', 96.8, () => beside('corn-minnesota-1', [5, 12]), `UMN; ${CROP} 4.1`, 0.05), check('corn, study 2, 12 May', 98.6, () => beside('corn-minnesota-2', [5, 12]), `UMN; ${CROP} 4.1`, 0.05),
      check('corn, study 1, 1 June', 79.6, () => beside('corn-minnesota-1', [6, 1]), `UMN; ${CROP} 4.1`, 0.05), check('corn, study 1, 9 June', 69, () => beside('corn-minnesota-1', [6, 9]), 'UMN, last printed date', 1e-9),
      check('soybean, 17 May', 97.9, () => beside('soybean-minnesota', [5, 17]), `UMN; ${CROP} 4.5`, 0.05), check('soybean, 1 June', 89.36, () => beside('soybean-minnesota', [6, 1]), `UMN; ${CROP} 4.5`, 0.01),
      check('corn, 10 June', 'not known', () => yieldShare(PLANTING_TABLES.get('corn-minnesota-1')!, calendarDay(6, 10)) ?? 'not known', 'no extrapolation beyond the table'),
      check('wheat to Canada, 10 days behind the best week', 100 - 15, () => beside('wheat-canada', [5, 17]), 'NDSU: 1.5 % a day in a straight line', 1e-9),
    ],
    unknown: 'This year’s weather, the hybrid, the field.', usualError: 'Single years lie 10 % either side of such curves.', caution: AGRONOMIST,
  },
  {
    id: 'late-planting', subject: 'crop', name: 'Insurance dates', meaning: 'What is left of the guarantee when planting is late; dates are the county’s and the year’s.',
    equation: '1 − 0.01·n for n days behind the final date, up to 25', sources: ['UMN Extension 2020; 7 CFR 457 as they explain it'], covers: ['crop/late-planting#guaranteeShare', 'crop/late-planting#daysBetween', 'crop/late-planting#dayAfter'],
    checks: [
      check('25 May to 5 June, days', 11, () => daysBetween('2020-05-25', '2020-06-05'), `${CROP} T5: a printed example calls it ten`),
      check('50 ac on 4 June, $', 20_952, () => 50 * 465.6 * guaranteeShare('2020-06-04', MINNESOTA_CORN)!, 'UMN Extension 2020', 0.005), check('50 ac on 5 June, $', 20_719.2, () => 50 * 465.6 * guaranteeShare('2020-06-05', MINNESOTA_CORN)!, `${CROP} T5`, 0.005),
      check('31 May to 1 June', 0.99, () => guaranteeShare('2025-06-01', { ...MINNESOTA_CORN, finalDate: '2025-05-31' })!, `${CROP} 5`, 1e-12), check('last day, 10 June to 5 July', 0.75, () => guaranteeShare('2025-07-05', { ...MINNESOTA_CORN, finalDate: '2025-06-10' })!, 'thelandonline 2019', 1e-12),
      check('25 days behind 25 May', '2025-06-19', () => dayAfter('2025-05-25', 25), 'thelandonline 2019'), check('a day later', 'not known', () => guaranteeShare('2020-06-20', MINNESOTA_CORN) ?? 'not known', `${CROP} 5: the prevented-planting share is set by the year`),
    ],
    unknown: 'Your policy.', usualError: 'None in the arithmetic.', caution: 'The insurer’s word counts; ask before tearing anything up.',
  },
  {
    id: 'stand', subject: 'crop', name: 'Stand and replant', meaning: 'Plants an acre from a count, and what they may still yield against planting anew.',
    equation: 'length for 1/1000 ac = 43.56/(row/12); hoop: 43,560/(π(d/24)²)', sources: ['Wisconsin, Tennessee, Penn State', 'Iowa State PM 1885 (2001)'],
    covers: ['crop/stand#rowLengthFt', 'crop/stand#standFromRow', 'crop/stand#standFromHoop', 'crop/stand#meanStand', 'crop/replant#cornYieldPct', 'crop/replant#compareReplant'],
    checks: [
      ...([[15, 34 + 10 / 12], [20, 26 + 2 / 12], [30, 17 + 5 / 12], [36, 14 + 6 / 12]] as const).map(([row, want]) => check(`${row} in rows, ft`, want, () => rowLengthFt(row), `extension tables; ${CROP} 6.1, T1`, 0.05, 'printed to a whole inch')),
      check('98 plants in 34 ft 10 in of 15 in rows', 98_000, () => standFromRow(98, rowLengthFt(15), 15), `${CROP} 6.1`, 1e-6), check('1.7 plants a foot, 30 in rows', 29_621, () => standFromRow(1.7, 1, 30), 'Penn State', 0.5, 'printed as about 30,000'),
      ...([[24, 13_866], [28, 10_187], [28.25, 10_007], [30, 8874], [33, 7334], [36, 6162]] as const).map(([d, want]) => check(`one plant in a hoop of ${d} in`, want, () => standFromHoop(1, d), `${CROP} 6.2`, 0.5)),
      check('mean of 30 and 34 thousand', 32_000, () => meanStand([30_000, 34_000]).mean, 'by the definition'),
      ...([[28_000, '05-16', 99], [24_000, '05-01', 94], [20_000, '05-28', 73], [16_000, '06-12', 50], [12_000, '06-25', 35]] as const).map(([stand, on, want]) => check(`corn, ${stand} planted ${on}, %`, want, () => cornYieldPct(stand, on)!, 'Iowa State PM 1885', 1e-9)),
      check('keep 16,000 of 1 May against 28,000 on 28 May, gain %', 16, () => compareReplant({ plantsPerAc: 16_000, plantedOn: '05-01' }, { plantsPerAc: 28_000, plantedOn: '05-28' })!.gainPct, 'Iowa State PM 1885: 90 − 74', 1e-9),
    ],
    unknown: 'How even the stand is: gaps cost 2 to 6 %.', usualError: 'Count at least five places.', caution: 'The adjuster must agree before anything is torn up.',
  },
  {
    id: 'rolling', subject: 'crop', name: 'When to roll', meaning: 'Right behind the planter or when half are up; in between the roller snaps what is under the crust.',
    equation: 'by stage', sources: ['UMN 2008–10 (DeJong-Hughes, Holen & Glogoza)', 'NDSU; SDSU'], covers: ['crop/rolling#rollingVerdict'],
    checks: [
      check('before planting', 'good', () => rollingVerdict({ sincePlantingH: null, emerged: 0, leafStage: 0, soilWet: false }), `${CROP} 7.1`), check('five days behind the planter, not up', 'do-not', () => rollingVerdict({ sincePlantingH: 120, emerged: 0, leafStage: 0, soilWet: false }), `${CROP} 7.1`),
      check('60 % up, V1', 'with-care', () => rollingVerdict({ sincePlantingH: 300, emerged: 0.6, leafStage: 1, soilWet: false }), `${CROP} 7.1`), check('V3', 'not-recommended', () => rollingVerdict({ sincePlantingH: 500, emerged: 1, leafStage: 3, soilWet: false }), `${CROP} 7.1`), check('wet soil', 'do-not', () => rollingVerdict({ sincePlantingH: null, emerged: 0, leafStage: 0, soilWet: true }), `${CROP} 7.1`),
    ],
    unknown: 'No published temperature for rolling was found.', usualError: 'Not measured.', caution: AGRONOMIST,
  },
  {
    id: 'pre-emerge', subject: 'crop', name: 'Pre-emerge: by when, and was it activated', meaning: 'The label’s days behind planting or the first shoots, whichever comes first; then it needs rain to work.',
    equation: 'min(planted + label days, earliest emergence − 1); 0.25 and 0.5 in within 7 days', sources: ['Iowa State 2017 (Group 14 labels)', 'Clemson; Purdue; SDSU; Ontario (Stewart et al. 2012)'], covers: ['crop/spray-by#sprayBy', 'crop/spray-by#backlogDays', 'crop/activation#activation'],
    checks: [
      check('planted 4 May, label 3 days, up from 22 May', '2025-05-07', () => sprayBy('2025-05-04', 3, '2025-05-22')!.day, `${CROP} 7.2`), check('what sets it', 'label', () => sprayBy('2025-05-04', 3, '2025-05-22')!.by, `${CROP} 7.2`),
      check('400 ac at 46.1 ac/h, 8 h, half the days', 2.2, () => backlogDays(400, 46.1, 8, 0.5), `${CROP} 7.2`, 0.05),
      ...([[19.6, 'activated'], [0, 'not-activated'], [35.6, 'activated'], [3.3, 'not-activated'], [11.4, 'partial'], [43, 'activated']] as const).map(([mm, want]) => check(`${mm} mm in a week`, want, () => activation(Array(7).fill(mm / 7)).status, 'Seattle record, method notes on spraying, 11')),
    ],
    unknown: 'What the soil held before, and the product: some need an inch.', usualError: 'Labels and advice differ by half an inch.', caution: 'The label is the law.',
  },
  {
    id: 'freeze', subject: 'crop', name: 'Freeze', meaning: 'Growing points under the ground are safe; what stands above it may not be.',
    equation: 'watch at 32 °F; soybean 30 °F, corn 28 °F once up', sources: ['UMN 2020 (Naeve, Nicolai & Peters)', 'NDSU'], covers: ['crop/freeze#freezeRisk'],
    checks: [
      check('corn up, 28 °F', 'damage-likely', () => freezeRisk(28, 'corn', true), `${CROP} 10`), check('corn up, 30 °F', 'watch', () => freezeRisk(30, 'corn', true), `${CROP} 10`), check('soybean up, 30 °F', 'damage-likely', () => freezeRisk(30, 'soybean', true), `${CROP} 10`),
      check('soybean not up, 25 °F', 'none', () => freezeRisk(25, 'soybean', false), `${CROP} 10`), check('33 °F', 'none', () => freezeRisk(33, 'soybean', true), `${CROP} 10`),
    ],
    unknown: 'Hours below, low ground, residue.', usualError: '3 °F between knoll and hollow.', caution: 'Judge in the field three to five days later.',
  },
]
