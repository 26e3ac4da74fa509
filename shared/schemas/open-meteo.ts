import { z } from 'zod'

/** What Open-Meteo answers: unix time, GMT, metric units. Values outside what weather can be are refused whole. */

const UNITS: [RegExp, string, [number, number]][] = [
  [/^temperature_2m/, '°C', [-60, 55]], [/^relative_humidity_2m/, '%', [0, 100]], [/^precipitation/, 'mm', [0, 200]], [/^wind_speed_10m/, 'm/s', [0, 75]],
  [/^wind_gusts_10m/, 'm/s', [0, 110]], [/^wind_direction_10m/, '°', [0, 360]], [/^shortwave_radiation/, 'W/m²', [0, 1400]],
]

const Hourly = z.object({ time: z.array(z.int()).min(2) }).catchall(z.array(z.number().nullable()))

export const OpenMeteoPlace = z.object({
  elevation: z.number().nullable().optional(),
  utc_offset_seconds: z.literal(0),
  hourly_units: z.record(z.string(), z.string()),
  hourly: Hourly,
}).superRefine((answer, context) => {
  const { time, ...columns } = answer.hourly
  if (time.some((at, i) => at % 3600 !== 0 || (i > 0 && at - time[i - 1]! !== 3600))) context.addIssue('the hours are not whole hours in a row')
  for (const [name, values] of Object.entries(columns)) {
    const [, unit, [least, most]] = UNITS.find(([pattern]) => pattern.test(name)) ?? [null, null, [-Infinity, Infinity]]
    if (unit !== null && answer.hourly_units[name] !== unit) context.addIssue(`${name} came in ${String(answer.hourly_units[name]).slice(0, 20)}, not ${unit}`)
    if (values.length !== time.length) context.addIssue(`${name} has ${values.length} values for ${time.length} hours`)
    if (values.some(value => value !== null && !(value >= least && value <= most))) context.addIssue(`${name} holds values that no weather has`)
  }
})
export type OpenMeteoPlace = z.output<typeof OpenMeteoPlace>

export const OpenMeteoAnswer = z.union([OpenMeteoPlace.transform(one => [one]), z.array(OpenMeteoPlace).min(1)])

export const OpenMeteoMeta = z.object({ last_run_availability_time: z.int().positive() })
