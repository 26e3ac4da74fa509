import type { HourlyWeather } from '../../../../../shared/agronomy/weather/hourly'

/** A day's evapotranspiration over the hours 6 to 19 by a half sine, as the published runs of the model spread it. */
export const HALF_SINE = [0.0145, 0.0427, 0.0685, 0.0902, 0.1067, 0.1170, 0.1205, 0.1170, 0.1067, 0.0902, 0.0685, 0.0427, 0.0145]

export interface SoilInput { weather: HourlyWeather, localHour: Uint8Array, etoMm: Float64Array }

/** Hours of weather with only what the soil model reads. */
export function evenWeather(hours: number, fromLocalHour: number, rainMm: (hour: number) => number, airC: (hour: number) => number, etoMmPerDay: number): SoilInput {
  const each = (value: (hour: number) => number) => Float64Array.from({ length: hours }, (_, hour) => value(hour))
  const nothing = new Float64Array(hours)
  const localHour = Uint8Array.from({ length: hours }, (_, hour) => (fromLocalHour + hour) % 24)
  return {
    weather: { startsAt: 0, hours, rainMm: each(rainMm), temperatureC: each(airC), humidityPct: nothing, windMs: nothing, radiationWm2: nothing },
    localHour,
    etoMm: each(hour => etoMmPerDay * (HALF_SINE[localHour[hour]! - 6] ?? 0)),
  }
}

/** Some hours of an input, as a run that is fed in parts gets them. */
export function part({ weather, localHour, etoMm }: SoilInput, from: number, to: number): SoilInput {
  const cut = (values: Float64Array) => values.slice(from, to)
  return {
    weather: {
      startsAt: weather.startsAt + from * 3600, hours: to - from, rainMm: cut(weather.rainMm), temperatureC: cut(weather.temperatureC),
      humidityPct: cut(weather.humidityPct), windMs: cut(weather.windMs), radiationWm2: cut(weather.radiationWm2),
    },
    localHour: localHour.slice(from, to),
    etoMm: cut(etoMm),
  }
}
