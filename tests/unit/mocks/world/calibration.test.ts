import { describe, expect, it } from 'vitest'
import { rainBetween, TRUTH, type Scenario } from '../../../../mocks/world/season'
import { rainOnset } from '../../../../shared/agronomy/plan/rain-onset'
import { crps } from '../../../../shared/agronomy/weather/scores'

const farm = { latitude: 46.9, longitude: -96.8 }
const HOURS = 120
const RUNS = 31
const first = Date.parse('2025-03-06T00:00Z') / 3_600_000
const last = Date.parse('2025-07-05T00:00Z') / 3_600_000

/** Hours from a forecast's start to a tenth of an inch; the horizon for later. */
function onset(from: number, scenario: Scenario): number {
  const rain = Float64Array.from({ length: HOURS }, (_, hour) => rainBetween(from + hour, from + hour + 1, farm, scenario))
  return Math.min(HOURS, rainOnset(rain, HOURS))
}

// Every 12 hours of the hidden season: 242 forecasts. The demo's own front has its error written down, so it is left out.
describe('rain by hour t, over the hidden season', () => {
  const cases = Array.from({ length: Math.floor((last - first) / 12) }, (_, i) => first + i * 12)
    .filter(start => start < Date.parse('2025-05-03T00:00Z') / 3_600_000 || start > Date.parse('2025-05-09T12:00Z') / 3_600_000)
    .map(start => ({ truth: onset(start, TRUTH), runs: Array.from({ length: RUNS }, (_, run) => onset(start, { madeAt: start, run })) }))

  it('comes true between 60 and 80 % of the times that the runs say 70 %', () => {
    let [n, hits] = [0, 0]
    for (const { truth, runs } of cases) {
      for (let t = 6; t < HOURS; t += 3) {
        const chance = runs.filter(run => run < t).length / RUNS
        if (chance < 0.65 || chance >= 0.75) continue
        n++
        if (truth < t) hits++
      }
    }
    console.log(`rain by hour t: said 70 % ${n} times in ${cases.length} forecasts, came true ${(100 * hits / n).toFixed(0)} %`)
    expect(cases.length).toBeGreaterThan(200)
    expect(n).toBeGreaterThan(100)
    expect(hits / n).toBeGreaterThan(0.6)
    expect(hits / n).toBeLessThan(0.8)
  })

  it('is better told by runs than by the control alone', () => {
    const mean = (of: (each: typeof cases[number]) => number) => cases.reduce((sum, each) => sum + of(each), 0) / cases.length
    const [runs, control] = [mean(each => crps(each.runs, each.truth)), mean(each => crps([each.runs[0]!], each.truth))]
    console.log(`CRPS of the rain's hour: runs ${runs.toFixed(1)} h, control alone ${control.toFixed(1)} h`)
    expect(runs).toBeLessThan(control)
  })
})
