import { capacityAcPerHour, hoursForArea } from '../machine/capacity'
import { greatCircleKm } from '../machine/road'
import { calendarDays, hoursToCatchUp, timelinessCostUsd, type Timeliness } from '../machine/timeliness'
import { segments } from '../text/segments'
import { check, type Figure } from './figure'

const A324 = 'Iowa State A3-24'
const EXAMPLE: Timeliness = { lossPerDay: 0.005, acres: 1500, yieldPerAc: 45, priceUsd: 11, spread: 4, hoursPerDay: 12, acresPerHour: 20, fitShare: 0.5 }

export const MACHINE_FIGURES: readonly Figure[] = [
  {
    id: 'capacity', subject: 'machine', name: 'Acres an hour', meaning: 'Width, speed and how much of the time the machine really works.',
    equation: 'C = S·W·E/8.25', sources: ['ASABE EP496; Iowa State A3-24'], covers: ['machine/capacity#capacityAcPerHour', 'machine/capacity#hoursForArea', 'machine/road#greatCircleKm'],
    checks: [
      ...([[40, 6, 0.7, 20.4], [60, 12, 0.68, 59.3], [15, 5, 0.63, 5.7], [36, 5, 0.6, 13.1], [37.5, 6, 0.65, 17.7], [8, 5, 0.85, 4.1]] as const).map(([widthFt, speedMph, fieldEfficiency, want]) => check(`${widthFt} ft, ${speedMph} mph, ${fieldEfficiency * 100} %`, want, () => capacityAcPerHour({ widthFt, speedMph, fieldEfficiency }), A324, 0.05, 'printed to a tenth')),
      check('160 ac at 21.64 ac/h, h', 7.39, () => hoursForArea(160, 21.64), 'method notes on crops, 9.2', 0.005), check('a degree of latitude, km', 111.2, () => greatCircleKm({ latitude: 46, longitude: -97 }, { latitude: 47, longitude: -97 }), 'mean radius 6,371 km', 0.05),
    ],
    unknown: 'Corners, fills, breakdowns.', usualError: 'A tenth, once the efficiency is the farm’s own.', caution: 'Roads and machines have their own rules; drive by them.',
  },
  {
    id: 'timeliness', subject: 'machine', name: 'What slowness costs', meaning: 'A machine that takes twelve days plants half its acres a week late.',
    equation: 'W = K·A²·Y·V/(Z·G·C·p)', sources: ['ASABE EP496, from general knowledge, units proved'], covers: ['machine/timeliness#calendarDays', 'machine/timeliness#timelinessCostUsd', 'machine/timeliness#hoursToCatchUp'],
    checks: [
      check('1,500 ac at 20 ac/h, 12 h, half the days', 12.5, () => calendarDays(EXAMPLE), 'method notes on crops, 9.3', 1e-9), check('cost, spread about the best date, $', 11_601.56, () => timelinessCostUsd(EXAMPLE), 'method notes on crops, 9.3', 0.005), check('cost, all behind it, $', 23_203.13, () => timelinessCostUsd({ ...EXAMPLE, spread: 2 }), 'method notes on crops, 9.3', 0.006),
      check('100 ac dug ahead, planter 26, digger 21 ac/h, h', 20, () => hoursToCatchUp(100, 26, 21), 'method notes on crops, 9.2'), check('slower planter', 'never', () => hoursToCatchUp(100, 20, 21) === Infinity ? 'never' : 0, 'method notes on crops, 9.2'),
    ],
    unknown: 'The weather of the year.', usualError: 'The loss a day is known to a factor of two.',
  },
  {
    id: 'segments', subject: 'text', name: 'Parts of a text message', meaning: 'One part holds 160 plain characters; a curly quote or a degree sign leaves 70.',
    equation: 'GSM-7: 160 or 153 a part; UCS-2: 70 or 67', sources: ['3GPP TS 23.038; the service’s documentation'], covers: ['text/segments#segments'],
    checks: [
      ...([['a'.repeat(160), 1], ['a'.repeat(306), 2], ['a'.repeat(459), 3], [`${'a'.repeat(158)}[`, 1], [`${'a'.repeat(152)}€${'a'.repeat(152)}`, 3], ['€'.repeat(81), 2], ['’'.repeat(71), 2], ['’'.repeat(135), 3], ['😀'.repeat(36), 2]] as const).map(([text, want]) => check(`${[...text].length} characters from ‘${[...text][0]}’ to ‘${[...text].at(-1)}’`, want, () => segments(text).parts, 'method notes on spraying, 10')),
      check('degree sign', 'UCS-2', () => segments('41°').encoding, 'method notes on spraying, 10'), check('é, ñ, ü, Ø', 'GSM-7', () => segments('éñüØ').encoding, 'method notes on spraying, 10'),
    ],
    unknown: 'What the carrier does with it.', usualError: 'None.',
  },
]
