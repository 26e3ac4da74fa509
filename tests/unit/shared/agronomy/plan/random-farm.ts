import fc from 'fast-check'
import type { SmallFarm } from './small-farm'

const HOURS = 96

/** Flags hour by hour as blocks of fit and unfit. */
const flags = fc.array(fc.integer({ min: 1, max: 30 }), { minLength: 1, maxLength: 8 }).chain(blocks => fc.boolean().map((first) => {
  const hours = new Uint8Array(HOURS)
  let hour = 0
  let fit = first
  for (const length of [...blocks, HOURS]) {
    hours.fill(fit ? 1 : 0, hour, Math.min(HOURS, hour + length))
    hour += length
    fit = !fit
  }
  return hours
}))

const field = fc.record({
  areaAc: fc.integer({ min: 5, max: 400 }),
  needed: fc.constantFrom<number[]>([1, 0, 1, 0, 0], [1, 1, 1, 0, 0], [1, 1, 1, 1, 0], [0, 0, 1, 0, 0]),
  progress: fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 5, maxLength: 5 }),
  ground: fc.nat(1),
  usdPerAc: fc.integer({ min: 100, max: 900 }),
}).map(({ progress, ...rest }) => ({
  ...rest,
  // What was done before never has a later pass ahead of an earlier one.
  doneAc: progress.map((share, pass) => rest.needed[pass] ? Math.min(...progress.slice(0, pass + 1)) * rest.areaAc * (share > 0.5 ? 1 : 0) : 0),
}))

const machine = (pass: number) => fc.record({
  pass: fc.constant(pass),
  rateAcPerHour: fc.integer({ min: 5, max: 60 }),
  fromHour: fc.constantFrom(0, 5, 6.5, 8),
  toHour: fc.constantFrom(18, 20.25, 24),
  downUntil: fc.constantFrom(0, 0, 0, 13.5, 40),
  at: fc.integer({ min: -1, max: 2 }),
})

/** Farms of one to five fields on two grounds, with one or two machines for each pass and one to three runs. */
export const randomFarm: fc.Arbitrary<SmallFarm> = fc.record({
  hours: fc.constant(HOURS),
  fields: fc.array(field, { minLength: 1, maxLength: 5 }),
  machines: fc.tuple(...[0, 0, 1, 2, 2, 3].map(machine)),
  runs: fc.array(fc.tuple(...[0, 1].map(() => fc.record({
    rainAt: fc.oneof(fc.nat(HOURS - 1), fc.constant(Infinity)),
    flags: fc.array(flags, { minLength: 5, maxLength: 5 }),
  }))), { minLength: 1, maxLength: 3 }),
  moveHours: fc.constantFrom(0, 0.25, 1.1),
})
