import { capillaryRiseMm } from '../soil/capillary'
import { dryCurveNumber, fallowCurveNumber, retentionMm, stormRunoffMm, wetCurveNumber } from '../soil/curve-number'
import { dryingFactor, totalEvaporableMm } from '../soil/evaporation'
import { frozenGroundIndex, frozenShare, snowDepthCm } from '../soil/frozen-ground'
import { hydrologicGroup } from '../soil/hydrologic-group'
import { chanceOfCall, normalShare, rainWithGauge, withCall, withProbe } from '../soil/learning'
import { conductivityMmH, soilProperties, waterAtConductivity } from '../soil/properties'
import { fallsAsSnow, meltableMm } from '../soil/snow'
import { dampingDepthM, DEPTH_2_IN_M, DEPTH_4_IN_M, DIFFUSIVITY_M2_S, RATE_BARE, soilMeanC, swingLagHours, swingShare } from '../soil/soil-temperature'
import { textureClass } from '../soil/texture'
import { bestTillageWater, CLASS_RETENTION, wettestTillageWater } from '../soil/tillage-limit'
import { drainedMm, hoursToDrain } from '../soil/unit-gradient-drainage'
import { check, type Figure } from './figure'

const TABLE_3 = 'Saxton & Rawls 2006, table 3'
const PRINTED = 'printed in whole percent'
const soil = (sandPct: number, clayPct: number) => soilProperties({ sandPct, clayPct, organicMatterPct: 2.5 })
const runoffIn = (rainIn: number, curveNumber: number) => stormRunoffMm(rainIn * 25.4, retentionMm(curveNumber)) / 25.4
const hours = (sand: number, clay: number, depthMm: number) => hoursToDrain(soil(sand, clay), depthMm, soil(sand, clay).saturation, soil(sand, clay).fieldCapacity)
const damping = () => dampingDepthM(DIFFUSIVITY_M2_S)
/** Depletion at the end of each of ten days of FAO-56 example 31: TEW 20, REW 9, Kc max 1.20 less Kcb 0.15, ETo 4.5. */
function depletions(): number[] {
  let depletion = 0
  return Array.from({ length: 10 }, () => depletion += dryingFactor(depletion, 9, 20) * 1.05 * 4.5)
}
function coldMonth(): number {
  let index = 0
  for (let day = 0; day < 30; day++) index = frozenGroundIndex(index, -8, 0)
  return index
}
const FIELD = 'A field is not one soil: knoll and hollow differ more than the tables do.'

export const SOIL_FIGURES: readonly Figure[] = [
  {
    id: 'texture', subject: 'soil', name: 'Texture class and hydrologic group', meaning: 'Sand, silt and clay give the soil its name; how fast it takes up water gives it a letter.',
    equation: 'the USDA triangle; A to D by saturated conductivity', sources: ['Benham, Ahrens & Nettleton 2009, USDA-NRCS', 'NEH-630 ch. 7, table 7-1'], covers: ['soil/texture#textureClass', 'soil/hydrologic-group#hydrologicGroup'],
    checks: [
      ...([[88, 5, 'sand'], [65, 10, 'sandy loam'], [40, 20, 'loam'], [20, 15, 'silt loam'], [30, 35, 'clay loam'], [10, 35, 'silty clay loam'], [10, 45, 'silty clay'], [25, 50, 'clay']] as const).map(([sand, clay, want]) => check(`sand ${sand} %, clay ${clay} %`, want, () => textureClass(sand, clay), `${TABLE_3}, names its soils so`)),
      ...([[0.3, 'D'], [1.2, 'C'], [4.3, 'B'], [10.1, 'A']] as const).map(([speed, want]) => check(`${speed} µm/s`, want, () => hydrologicGroup(speed * 3.6, false), 'NEH-630 table 7-1')),
    ],
    unknown: 'Layers, stones, and what tillage did.', usualError: 'By hand one class off is common.',
  },
  {
    id: 'soil-properties', subject: 'soil', name: 'What a soil holds and lets through', meaning: 'From texture and organic matter: the water at which plants wilt, the water left after draining, the water that fills it, and how fast it drains.',
    equation: 'Saxton & Rawls 2006, eqs 1 to 16', sources: ['Saxton & Rawls 2006, Soil Sci. Soc. Am. J. 70:1569'], covers: ['soil/properties#soilProperties', 'soil/properties#conductivityMmH', 'soil/properties#waterAtConductivity'],
    checks: [
      ...([['sand', 88, 5, 5, 10, 46, 108.1], ['loam', 40, 20, 14, 28, 46, 15.5], ['silt loam', 20, 15, 11, 31, 48, 16.1], ['clay loam', 30, 35, 22, 36, 48, 4.3], ['silty clay', 10, 45, 27, 41, 52, 3.7], ['clay', 25, 50, 30, 42, 50, 1.1]] as const).flatMap(([name, sand, clay, wilting, capacity, saturation, conductivity]) => [
        check(`${name}: wilting point, %`, wilting, () => 100 * soil(sand, clay).wiltingPoint, TABLE_3, 0.5, PRINTED), check(`${name}: field capacity, %`, capacity, () => 100 * soil(sand, clay).fieldCapacity, TABLE_3, 0.5, PRINTED),
        check(`${name}: saturation, %`, saturation, () => 100 * soil(sand, clay).saturation, TABLE_3, 0.5, PRINTED), check(`${name}: conductivity, mm/h`, conductivity, () => soil(sand, clay).saturatedConductivityMmH, TABLE_3, 0.06, 'printed to a tenth'),
      ]),
      check('clay by the copy with 1.238 in eq 2: not this', 0.4206, () => soil(25, 50).fieldCapacity, 'method notes on soil, 2: the misprint gives 0.4139', 5e-5),
      check('conductivity of clay at saturation is the saturated one', 1.14, () => conductivityMmH(soil(25, 50), soil(25, 50).saturation), TABLE_3, 0.005),
      check('and back to the water', 0.4206, () => waterAtConductivity(soil(25, 50), conductivityMmH(soil(25, 50), 0.4206)), 'inverse', 1e-9),
    ],
    unknown: FIELD, usualError: 'Conductivity to a factor of two to three; water to 4 %.',
  },
  {
    id: 'drainage', subject: 'soil', name: 'Draining by gravity', meaning: 'Wet ground lets its water go fast at first and ever slower.',
    equation: 'dθ/dt = −Ks(θ/θs)^(3 + 2/λ)/L, in closed form', sources: ['unit gradient with Campbell’s conductivity', 'Jabro et al. 2009'], covers: ['soil/unit-gradient-drainage#hoursToDrain', 'soil/unit-gradient-drainage#drainedMm', 'soil/capillary#capillaryRiseMm'],
    checks: [
      ...([['clay', 25, 50, 100, 107], ['clay', 25, 50, 600, 639], ['silty clay loam', 10, 35, 300, 152], ['clay loam', 30, 35, 300, 282], ['loam', 40, 20, 100, 128]] as const).map(([name, sand, clay, depth, want]) => check(`${name}, ${depth} mm, h`, want, () => hours(sand, clay, depth), 'method notes on soil, 5, closed form', 0.5, 'given in whole hours')),
      ...([[1, 0.903], [24, 5.203], [96, 7.602]] as const).map(([time, want]) => check(`saturated clay, 100 mm, ${time} h, mm`, want, () => drainedMm(soil(25, 50), 100, 100 * soil(25, 50).saturation, time), 'method notes on soil, 5', 5e-4)),
      check('no rise into a wetter layer, mm', 0, () => capillaryRiseMm(0.4, 0.4, 0.3, 0.4, 100, 0.01), 'by the rule'),
    ],
    unknown: 'Cracks and worm holes, which drain a field overnight.', usualError: 'A factor of two in time.',
  },
  {
    id: 'runoff', subject: 'soil', name: 'Rain that runs off', meaning: 'What a storm leaves on the ground instead of in it.',
    equation: 'Q = (P − 0.2S)²/(P + 0.8S), S = 25.4(1000/CN − 10)', sources: ['TR-55 (1986); NEH-630 ch. 9 and 10', 'Chow et al. 1988'], covers: ['soil/curve-number#stormRunoffMm', 'soil/curve-number#retentionMm', 'soil/curve-number#fallowCurveNumber', 'soil/curve-number#dryCurveNumber', 'soil/curve-number#wetCurveNumber'],
    checks: [
      ...([[70, 1.2, 0.03], [70, 2, 0.24], [70, 4, 1.33], [70, 6, 2.81], [90, 1, 0.32], [90, 2.5, 1.53], [90, 5, 3.88]] as const).map(([cn, rain, want]) => check(`${rain} in on curve number ${cn}, in`, want, () => runoffIn(rain, cn), 'TR-55 table 2-1', 0.005, 'printed to a hundredth')),
      check('9 in on 94.82, in', 8.3761, () => runoffIn(9, 94.82), 'textbook problem; method notes on soil, 3', 5e-5),
      ...([['A', 77], ['B', 86], ['C', 91], ['D', 94]] as const).map(([group, want]) => check(`bare fallow, group ${group}`, want, () => fallowCurveNumber(group, 0), 'TR-55 table 2-2b')),
      check('75 when dry', 55.8, () => dryCurveNumber(75), 'Chow et al. 1988', 0.05), check('75 when wet', 87.3, () => wetCurveNumber(75), 'Chow et al. 1988', 0.05),
    ],
    unknown: 'Slope, wheel tracks, a crust.', usualError: 'Half of a small runoff.',
  },
  {
    id: 'drying', subject: 'soil', name: 'How the surface dries', meaning: 'Wet ground gives water as fast as the air takes it; then ever less.',
    equation: 'Kr = (TEW − De)/(TEW − REW)', sources: ['FAO-56 eqs 73 and 74, table 19'], covers: ['soil/evaporation#dryingFactor', 'soil/evaporation#totalEvaporableMm'],
    checks: [
      ...([4.73, 9.45, 13.98, 16.57, 18.04, 18.88, 19.36, 19.64, 19.79, 19.88] as const).map((want, i) => check(`bare loam, depletion at the end of day ${i + 1}, mm`, want, () => depletions()[i]!, 'FAO-56 example 31', 0.0051, 'recomputed at full precision; the example rounds to a tenth')),
      check('all that can evaporate from clay, mm', 27.06, () => totalEvaporableMm(0.4198204676875, 0.298345, 0.1), 'FAO-56 eq 73; method notes on soil, 4, its clay', 0.005),
    ],
    unknown: 'Shade of residue beyond its cover.', usualError: 'A tenth to a fifth of the evaporation.',
  },
  {
    id: 'frost-and-snow', subject: 'soil', name: 'Frost and snow', meaning: 'Frozen ground sheds rain and carries machines; snow hides it from both.',
    equation: 'CFGI(t) = 0.97·CFGI(t−1) − T·exp(−0.4·K·snow); melt 0.06 in per °F and day', sources: ['Molnau & Bissell 1983; SWB2', 'NEH-630 ch. 11; SWAT'], covers: ['soil/frozen-ground#frozenGroundIndex', 'soil/frozen-ground#frozenShare', 'soil/frozen-ground#snowDepthCm', 'soil/snow#fallsAsSnow', 'soil/snow#meltableMm'],
    checks: [
      check('a day of −10 °C', 10, () => frozenGroundIndex(0, -10, 0), 'SWB2 eq 1-9', 1e-9), check('80 after a day of 5 °C', 72.6, () => frozenGroundIndex(80, 5, 0), 'SWB2 eq 1-9', 0.005), check('30 days of −8 °C', 159.73, coldMonth, 'method notes on soil, 7', 0.005),
      check('frozen share at 70', 0.519, () => frozenShare(70), 'SWB2: 56 to 83', 5e-4), check('melt at 42 °F in a day, in', 0.6, () => meltableMm((42 - 32) / 1.8, 0.06 * 25.4 * 1.8, 24) / 25.4, 'NEH-630 ch. 11', 1e-9),
      check('1 °C', 'snow', () => fallsAsSnow(1) ? 'snow' : 'rain', 'SWAT, Ames set'), check('25 mm of water, cm of snow', 25, () => snowDepthCm(25), 'SWB2: ten times'),
    ],
    unknown: 'Frost under drifts and bare knolls.', usualError: 'Days, at the end of winter.',
  },
  {
    id: 'soil-temperature', subject: 'soil', name: 'Soil temperature at seed depth', meaning: 'The ground follows the air slowly; its day’s swing shrinks and comes later with depth.',
    equation: 'T(J) = T(J−1) + (A − T(J−1))·0.25; exp(−z/d), d = √(D·86400/π)', sources: ['Zheng, Hunt & Running 1993, Climate Research 2:183', 'Hillel 1982'], covers: ['soil/soil-temperature#soilMeanC', 'soil/soil-temperature#dampingDepthM', 'soil/soil-temperature#swingShare', 'soil/soil-temperature#swingLagHours'],
    checks: [
      ...([[3, 6, 3.75], [3.75, 8, 4.8125], [6.6094, 5, 6.207]] as const).map(([before, air, want]) => check(`from ${before} °C in a day of ${air} °C`, want, () => soilMeanC(before, air, RATE_BARE), 'method notes on soil, 8', 5e-5)),
      check('damping depth, m', 0.1173, damping, 'Hillel 1982, D = 5e-7', 5e-5), check('share of the swing at 2 in', 0.648, () => swingShare(DEPTH_2_IN_M, damping()), 'method notes on soil, 8', 5e-4), check('share at 4 in', 0.42, () => swingShare(DEPTH_4_IN_M, damping()), 'method notes on soil, 8', 5e-4),
      check('lag at 4 in, h', 3.31, () => swingLagHours(DEPTH_4_IN_M, damping()), 'method notes on soil, 8', 0.005),
    ],
    unknown: 'Colour and slope of the ground.', usualError: '1.5 to 2 °C of a daily mean.', caution: 'Measure at seed depth before you plant.',
  },
  {
    id: 'tillage-limit', subject: 'soil', name: 'Too wet to till', meaning: 'The water at which soil crumbles best, and the wettest at which it still may be worked.',
    equation: 'inflection of the retention curve; best + 0.4(saturation − best)', sources: ['Dexter & Bird 2001, Soil Tillage Res. 57:203'], covers: ['soil/tillage-limit#bestTillageWater', 'soil/tillage-limit#wettestTillageWater'],
    checks: ([['silty clay', 0.3045, 0.3267], ['clay', 0.3203, 0.3442], ['silty clay loam', 0.3304, 0.3702], ['clay loam', 0.308, 0.3488], ['silt loam', 0.3153, 0.3692], ['loam', 0.2963, 0.3498]] as const).flatMap(([name, best, wettest]) => [
      check(`${name}, best`, best, () => bestTillageWater(CLASS_RETENTION[name]), 'Dexter & Bird eq 6; method notes on soil, 8.3', 5e-5), check(`${name}, wettest`, wettest, () => wettestTillageWater(CLASS_RETENTION[name]), 'Dexter & Bird eq 11; method notes on soil, 8.3', 5e-5),
    ]),
    unknown: FIELD, usualError: '3 % water.', caution: 'Dig and crumble it before you drive.',
  },
  {
    id: 'learning', subject: 'soil', name: 'What a gauge, a probe and a hand teach', meaning: 'A reading moves what is believed of a field by as much as it is surer than the model; a person’s call counts most.',
    equation: 'w = σp²/(σp² + σg²); P(call) = ε + (1 − 2ε)Φ(∓x/σ)', sources: ['soil.md 11.3 to 11.5; probit moment matching'], covers: ['soil/learning#rainWithGauge', 'soil/learning#withProbe', 'soil/learning#withCall', 'soil/learning#chanceOfCall', 'soil/learning#normalShare'],
    checks: [
      check('gauge 12 mm (0.1) on 20 mm (0.5), mm', 12.24, () => rainWithGauge({ value: 20, spread: 0.5 }, { value: 12, spread: 0.1 }).value, 'method notes on soil, 11.3', 0.005), check('its spread', 0.098, () => rainWithGauge({ value: 20, spread: 0.5 }, { value: 12, spread: 0.1 }).spread, 'method notes on soil, 11.3', 5e-4),
      check('gauge 10.16 (0.15) on 25.4 (0.4), mm', 11.375, () => rainWithGauge({ value: 25.4, spread: 0.4 }, { value: 10.16, spread: 0.15 }).value, 'method notes on soil, 11.3', 5e-4), check('its spread', 0.1404, () => rainWithGauge({ value: 25.4, spread: 0.4 }, { value: 10.16, spread: 0.15 }).spread, 'method notes on soil, 11.3', 5e-5),
      check('probe 0.37 (0.03) on 0.40 (0.03)', 0.385, () => withProbe({ value: 0.4, spread: 0.03 }, { value: 0.37, spread: 0.03 }).value, 'method notes on soil, 11.5', 1e-9), check('its spread', 0.0212, () => withProbe({ value: 0.4, spread: 0.03 }, { value: 0.37, spread: 0.03 }).spread, 'method notes on soil, 11.5', 5e-5),
      ...([[0.02, 'not-fit', 0, 0.7105, 0.03202, 0.02427], [0.02, 'fit', 0.05, 0.3106, -0.00474, 0.02511], [-0.02, 'not-fit', 0.05, 0.3106, 0.00474, 0.02511]] as const).flatMap(([value, call, mistakes, chance, moved, spread]) => [
        check(`over ${value} (0.03), called ${call}, mistakes ${mistakes}: chance`, chance, () => withCall({ value, spread: 0.03 }, call, mistakes).chance, 'method notes on soil, 11.4', 5e-5),
        check(`over ${value}, called ${call}, mistakes ${mistakes}: then over`, moved, () => withCall({ value, spread: 0.03 }, call, mistakes).value, 'method notes on soil, 11.4', 5e-6), check(`over ${value}, called ${call}, mistakes ${mistakes}: then spread`, spread, () => withCall({ value, spread: 0.03 }, call, mistakes).spread, 'method notes on soil, 11.4', 5e-6),
      ]),
      check('a call of fit at the fit level', 0.5, () => chanceOfCall('fit', 0), 'by symmetry', 1e-12), check('Φ(1.96)', 0.975, () => normalShare(1.959963984540054), 'tables of the normal distribution', 1e-9),
    ],
    unknown: 'How exactly your own hand calls it, until there are calls to learn from.', usualError: 'One surprising call moves the field by 2.5 % water.',
  },
]
