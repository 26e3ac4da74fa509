import { plottingPosition, quantileByRank } from '../plan/chance'
import { rainOnset } from '../plan/rain-onset'
import { areaChance, chanceOfAmount, hourReaching, rainStartedBy } from '../weather/rain-chance'
import { brierParts, brierScore, brierSkill, crps, crpsNormal, crpsWeighted, intervalScore, pinballLoss } from '../weather/scores'
import { check, type Figure } from './figure'

const CHANCES = [0.05, 0.1, 0.3, 0.5, 0.6, 0.4]
const rows = (name: string, want: readonly number[], got: () => readonly number[], cite: string) => want.map((value, i) => check(`${name}, hour ${i + 1}`, value, () => got()[i]!, cite, 5e-5))
const RUNS = [
  [0, 0, 0.2, 1.5, 2, 0.5], [0, 0, 0, 0.6, 1.2, 1.5], [0, 0, 0, 0, 0, 0.3], [0.1, 0.4, 2.5, 1, 0, 0], [0, 0, 1, 1, 1, 1],
  [0, 0, 0, 2.6, 0.4, 0], [0, 0, 0, 0, 3, 2], [0, 0.2, 0.8, 1.2, 1, 0.2], [0, 0, 0, 0, 0.1, 0.2], [0, 0.5, 1.5, 3, 1, 0],
]
const onsets = () => RUNS.map(run => rainOnset(Float64Array.from(run), 6))
/** The table counts hours from 1. */
const hourNumber = (index: number) => index === Infinity ? 'none' : index + 1
const ones = (chance: number, happened: boolean) => [{ chance, happened }]
const MIXED = [{ chance: 0.2, happened: false }, { chance: 0.2, happened: true }, { chance: 0.8, happened: true }, { chance: 0.8, happened: true }]
const S8 = 'method notes on spraying, 8'

export const RAIN_FIGURES: readonly Figure[] = [
  {
    id: 'rain-started', subject: 'rain', name: 'When rain starts, from hourly chances', meaning: 'Hours of rain hang together, so chances of single hours must not be multiplied.',
    equation: 'S(t) = S(t−1)·P00/q(t−1), P00 = q₋q + ρ√(p₋q₋pq), clipped', sources: ['first-order Markov chain, method notes on spraying, 8.2; NBM: Huntemann & Ruth 2017'],
    covers: ['weather/rain-chance#rainStartedBy', 'weather/rain-chance#hourReaching', 'weather/rain-chance#chanceOfAmount', 'weather/rain-chance#areaChance'],
    checks: [
      ...rows('independent', [0.05, 0.145, 0.4015, 0.7007, 0.8803, 0.9282], () => rainStartedBy(CHANCES, 0).independent, `${S8}.2, table`),
      ...rows('persistence 0.6', [0.05, 0.1058, 0.3045, 0.5156, 0.6639, 0.6773], () => rainStartedBy(CHANCES, 0.6).persistent, `${S8}.2, table`),
      ...rows('largest', [0.05, 0.1, 0.3, 0.5, 0.6, 0.6], () => rainStartedBy(CHANCES, 1).lowest, `${S8}.2, table`),
      ...rows('sum', [0.05, 0.15, 0.45, 0.95, 1, 1], () => rainStartedBy(CHANCES, 0).highest, `${S8}.2, table`),
      check('six hours of 0.2, independent', 0.7379, () => rainStartedBy(Array(6).fill(0.2), 0).independent[5]!, `${S8}.2`, 5e-5),
      check('six hours of 0.2, persistence 0.6', 0.4727, () => rainStartedBy(Array(6).fill(0.2), 0.6).persistent[5]!, `${S8}.2`, 5e-5),
      check('hour by which 1 in 10, persistence 0.6', 2, () => hourReaching(rainStartedBy(CHANCES, 0.6).persistent, 0.1)!, `${S8}.2`),
      check('half', 4, () => hourReaching(rainStartedBy(CHANCES, 0.6).persistent, 0.5)!, `${S8}.2`),
      check('9 in 10', 'not within', () => hourReaching(rainStartedBy(CHANCES, 0.6).persistent, 0.9) ?? 'not within', `${S8}.2`),
      check('chance of 0.1 in, chance 0.6, mean 1.8 mm', 0.2573, () => chanceOfAmount(0.6, 1.8, 2.54), `${S8}.3`, 5e-5),
      check('chance of 0.01 in', 0.5513, () => chanceOfAmount(0.6, 1.8, 0.254), `${S8}.3`, 5e-5),
      check('chance of 1 in, mean 20 mm', 0.28, () => chanceOfAmount(0.6, 20, 25.4), 'method notes on spraying, 4.4', 5e-5),
      check('confidence 0.5 over 0.8 of the area', 0.4, () => areaChance(0.5, 0.8), 'US National Weather Service', 1e-12),
    ],
    unknown: 'The true persistence, which changes with the kind of rain.', usualError: 'Wide: runs of a forecast are used wherever they are to be had.',
  },
  {
    id: 'rain-line', subject: 'rain', name: 'The rain line', meaning: 'The hour by which half of the forecast’s runs have brought a tenth of an inch; around it, when 1 and 9 in 10 have.',
    equation: 'first hour with a running sum of at least 2.54 mm, by rank over the runs', sources: ['method notes on spraying, 8.4'], covers: ['plan/rain-onset#rainOnset', 'plan/chance#quantileByRank', 'plan/chance#plottingPosition'],
    checks: [
      ...[5, 6, Infinity, 3, 5, 4, 5, 5, Infinity, 4].map((want, i) => check(`onset of run ${i + 1}`, want === Infinity ? 'none' : want, () => hourNumber(onsets()[i]!), `${S8}.4`)),
      check('1 in 10', 3, () => hourNumber(quantileByRank(onsets(), 0.1)), `${S8}.4`),
      check('half', 5, () => hourNumber(quantileByRank(onsets(), 0.5)), `${S8}.4`),
      check('9 in 10', 'none', () => hourNumber(quantileByRank(onsets(), 0.9)), `${S8}.4`),
      check('none of 51 runs is said as', 1 / 155, () => plottingPosition(0, 51), 'plotting position (k + 1/3)/(n + 2/3)', 1e-12),
    ],
    unknown: 'Storms that no run has, and showers that pass beside the field.', usualError: 'Hours, more the farther ahead; models bring rain 1 to 2 hours late (Davis et al. 2006).',
  },
  {
    id: 'scores', subject: 'rain', name: 'How forecasts are scored', meaning: 'What was said against what came: 7 in 10 must come true 7 times in 10.',
    equation: 'Brier (f − o)²; CRPS mean|x − y| − Σ|xi − xj|/2n²; pinball', sources: ['Murphy 1973; Hersbach 2000, Wea. Forecasting 15:559; Gneiting et al. 2005'],
    covers: ['weather/scores#brierScore', 'weather/scores#brierParts', 'weather/scores#brierSkill', 'weather/scores#crps', 'weather/scores#crpsWeighted', 'weather/scores#crpsNormal', 'weather/scores#pinballLoss', 'weather/scores#intervalScore'],
    checks: [
      check('70 % and rain', 0.09, () => brierScore(ones(0.7, true)), 'encyclopedia article on the Brier score', 1e-9),
      check('30 % and rain', 0.49, () => brierScore(ones(0.3, true)), 'the same', 1e-9),
      check('50 %', 0.25, () => brierScore(ones(0.5, false)), 'the same', 1e-9),
      check('parts add up to the score', 0, () => brierParts(MIXED).reliability - brierParts(MIXED).resolution + brierParts(MIXED).uncertainty - brierScore(MIXED), 'Murphy’s decomposition', 1e-12),
      check('skill of a forecast of the mean', 0, () => brierSkill([{ chance: 0.5, happened: true }, { chance: 0.5, happened: false }])!, 'by the definition', 1e-12),
      check('CRPS of 1, 2, 4 against 3', 0.6667, () => crps([1, 2, 4], 3), `${S8}.6`, 5e-5),
      check('the same with equal weights', 0.6667, () => crpsWeighted([1, 2, 4], [2, 2, 2], 3), `${S8}.6`, 5e-5),
      check('normal 0, 1 against 0', 0.23369, () => crpsNormal(0, 1, 0), `${S8}.6`, 5e-6),
      check('normal 0, 1 against 1', 0.60244, () => crpsNormal(0, 1, 1), `${S8}.6`, 5e-6),
      check('normal 3, 2 against 4.5', 0.89629, () => crpsNormal(3, 2, 4.5), `${S8}.6`, 5e-6),
      ...([[0.1, 3, 0.3], [0.5, 5, 0.5], [0.9, 9, 0.3]] as const).map(([tau, quantile, want]) => check(`pinball ${tau} at ${quantile} against 6`, want, () => pinballLoss(tau, quantile, 6), `${S8}.6`, 1e-9)),
      check('80 % interval 3 to 9 against 6', 6, () => intervalScore(0.2, 3, 9, 6), `${S8}.6`, 1e-9),
    ],
    unknown: 'Few seasons prove little.', usualError: 'Shrinks with the root of the number of cases.',
  },
]
