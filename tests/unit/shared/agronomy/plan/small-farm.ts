import { PASS_COUNT, type PlanMachine, type PlanProblem } from '../../../../../shared/agronomy/plan/problem'
import { StretchListBuilder } from '../../../../../shared/agronomy/plan/workable'
import { workingStretches } from '../../../../../shared/agronomy/machine/working-hours'

/** A farm in words that a test can write and an independent reader can check a timeline against. */
export interface SmallFarm {
  hours: number
  fields: { areaAc: number, doneAc?: number[], needed?: number[], ground?: number, heldUntil?: number, usdPerAc?: number }[]
  machines: { pass: number, rateAcPerHour: number, fromHour?: number, toHour?: number, downUntil?: number, at?: number }[]
  /** runs × grounds: when the rain starts, and the flags of each pass hour by hour */
  runs: { rainAt: number, flags: Uint8Array[] }[][]
  moveHours?: number
  shareByHour?: (hour: number) => number
  shareAfter?: number
}

/** The plan starts at five in the morning. */
export const localHour = (hours: number) => Uint8Array.from({ length: hours }, (_, hour) => (hour + 5) % 24)

/** Flags that are on in the given stretches, for all five passes. */
export function fitIn(hours: number, ...stretches: [from: number, to: number][]): Uint8Array[] {
  const flags = Uint8Array.from({ length: hours }, (_, hour) => stretches.some(([from, to]) => hour >= from && hour < to) ? 1 : 0)
  return Array.from({ length: PASS_COUNT }, () => flags)
}

export function planProblem(farm: SmallFarm): PlanProblem {
  const grounds = farm.runs[0]!.length
  const rainAt = new Float64Array(grounds * farm.runs.length)
  const noRain = new Float64Array(farm.hours)
  const workable = Array.from({ length: grounds }, (_, ground) => {
    const builder = new StretchListBuilder()
    for (const [run, places] of farm.runs.entries()) {
      rainAt[ground * farm.runs.length + run] = places[ground]!.rainAt
      for (let pass = 0; pass < PASS_COUNT; pass++) builder.add(places[ground]!.flags[pass]!, noRain, places[ground]!.rainAt, 0, farm.hours)
    }
    return builder.build()
  })
  return {
    hours: farm.hours,
    runs: farm.runs.length,
    fields: farm.fields.map((field, index) => ({
      id: `field-${index}`,
      areaAc: field.areaAc,
      doneAc: Float64Array.from(field.doneAc ?? [0, 0, 0, 0, 0]),
      needed: Uint8Array.from(field.needed ?? [1, 0, 1, 0, 0]),
      ground: field.ground ?? 0,
      heldUntil: field.heldUntil ?? 0,
      shareByHour: Float64Array.from({ length: farm.hours }, (_, hour) => (farm.shareByHour ?? (() => 1))(hour)),
      shareAfter: new Float64Array(farm.runs.length).fill(farm.shareAfter ?? 0.9),
      usdPerAc: field.usdPerAc ?? 500,
    })),
    machines: farm.machines.map((_, index) => planMachine(farm, index)),
    workable,
    rainAt,
  }
}

function planMachine(farm: SmallFarm, index: number): PlanMachine {
  const { pass, rateAcPerHour, fromHour = 6, toHour = 21, downUntil = 0, at = -1 } = farm.machines[index]!
  const count = farm.fields.length
  const moveHours = farm.moveHours ?? 0.25
  return {
    id: `machine-${index}`,
    pass,
    rateAcPerHour,
    working: workingStretches({ fromHour, toHour }, localHour(farm.hours), downUntil),
    firstMoveHours: Float64Array.from({ length: count }, (_, field) => field === at ? 0 : moveHours),
    moveHours: Float64Array.from({ length: count * count }, (_, i) => Math.floor(i / count) === i % count ? 0 : moveHours),
  }
}
