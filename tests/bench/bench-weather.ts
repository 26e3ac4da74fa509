/** Weather, evapotranspiration and clock of some hours of spring, with one rain. */
export function benchWeather(hours: number) {
  const column = (value: (i: number) => number) => Float64Array.from({ length: hours }, (_, i) => value(i))
  return {
    weather: {
      startsAt: 1_746_525_600, hours, rainMm: column(i => i % 120 > 50 && i % 120 < 60 ? 1.2 : 0), temperatureC: column(i => 9 + 6 * Math.sin(i / 3.8)),
      humidityPct: column(() => 60), windMs: column(() => 4), radiationWm2: column(() => 150),
    },
    etoMm: column(i => i % 24 > 6 && i % 24 < 20 ? 0.25 : 0),
    localHour: Uint8Array.from({ length: hours }, (_, i) => (i + 5) % 24),
  }
}

/** Least milliseconds of some rounds: what else the machine does can only add. */
export function leastMs(rounds: number, once: () => void): number {
  let least = Infinity
  for (let round = 0; round < rounds; round++) {
    const started = performance.now()
    once()
    least = Math.min(least, performance.now() - started)
  }
  return least
}
