import { readdirSync, readFileSync, statSync } from 'node:fs'
import { join, relative } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import { FIGURES } from '../../../../../shared/agronomy/figures'
import { run } from '../../../../../shared/agronomy/figures/figure'

const root = fileURLToPath(new URL('../../../../../shared/agronomy', import.meta.url))

/** Why a file's functions have no published figure of their own, and what holds them instead. */
const EXCUSED: Record<string, string> = {
  'figures/figure': 'compares the rows themselves',
  'machine/road': 'a straight line with a detour factor; common practice, no source',
  'machine/working-hours': 'clock arithmetic, held by cases',
  'plan/assign-machines': 'our own plan, held by properties',
  'plan/dry-spell': 'our own stand-in for days behind the forecast, held by cases',
  'plan/greedy-order': 'our own plan, held by properties',
  'plan/leave-undug': 'our own plan, held by cases',
  'plan/order-figures': 'our own plan, held by properties',
  'plan/problem': 'our own plan, held by cases',
  'plan/rain-line': 'from rain-onset and chance, which have their figures; held by spray.md 8.4 as well',
  'plan/rain-onset': 'shareStarted is the row F of spray.md 8.4, in its own test',
  'plan/rank-fields': 'our own plan, held by properties',
  'plan/reason': 'words, held by cases',
  'plan/simulate': 'our own plan, held by properties',
  'plan/spray-hours': 'a stand-in for the labels, held by cases',
  'plan/timeline': 'our own plan, held by properties',
  'plan/work-pass': 'our own plan, held by properties',
  'plan/workable': 'our own plan, held by cases',
  'plan/worth': 'from yield tables, which have their figures; held by cases',
  'soil/cold-rain': 'the chill rule by hour; its published cases stand under planting-advice',
  'soil/daily-weather': 'spreads days over hours; held by soil.md 11.1',
  'soil/evaporation': 'residueFactor is a setting without a source',
  'soil/field-soil': 'puts published parts together; held by soil.md 11.6',
  'soil/field-state': 'state of the whole model; held by soil.md 11.6 and a closed balance',
  'soil/field-trace': 'arrays of the whole model',
  'soil/fit': 'the whole model’s rule; held by soil.md 11.6 and 8.5',
  'soil/fit-rule': 'the whole model’s rule; held by soil.md 8.5',
  'soil/fit-chance': 'counts over runs and versions; held by soil.md 11.6 and by calibration',
  'soil/particles': 'versions of the whole model; held by soil.md 11.6 and by calibration',
  'soil/random': 'repeatable numbers, held by their distribution',
  'soil/season': 'runs the whole model over a real record; held by what must hold there',
  'soil/soil-temperature': 'swingByHour puts published parts together',
  'soil/storm': 'groups hours into storms for the curve number; held by cases',
  'soil/warmth-hour': 'the hour of the whole model; held by soil.md 11.6',
  'soil/water-balance': 'the whole model; held by soil.md 11.6 to the printed decimals',
  'soil/water-hour': 'the hour of the whole model; held by soil.md 11.6',
  'weather/bridge-gaps': 'common practice, no source; held by cases and properties',
  'weather/daily-estimate': 'FAO-56’s missing-data rules; figures in its own test',
  'weather/diurnal-temperature': 'held by soil.md 11.1',
  'weather/humidity': 'FAO-56 examples 3 and 5 in its own test',
  'weather/radiation': 'FAO-56 examples 7 to 12 in its own test',
  'weather/reference-evapotranspiration': 'FAO-56 examples 17 to 20 in its own test',
}

function filesUnder(folder: string): string[] {
  return readdirSync(folder).flatMap((name) => {
    const path = join(folder, name)
    return statSync(path).isDirectory() ? filesUnder(path) : [path]
  })
}

const files = filesUnder(root).map(path => ({ file: relative(root, path).replace(/\.ts$/, ''), text: readFileSync(path, 'utf8') }))
const functions = files.flatMap(({ file, text }) => [...text.matchAll(/^export function (\w+)/gm)].map(([, name]) => ({ file, name: name!, text })))
const covered = new Set(FIGURES.flatMap(({ covers }) => covers))

describe('the figures', () => {
  it('speak for every function of the domain, or say why not', () => {
    const silent = functions.filter(({ file, name }) => !covered.has(`${file}#${name}`) && !EXCUSED[file]).map(({ file, name }) => `${file}#${name}`)
    expect(silent).toEqual([])
  })

  it('name only functions that are there, and excuse only files that need it', () => {
    const there = new Set(functions.map(({ file, name }) => `${file}#${name}`))
    expect([...covered].filter(name => !there.has(name))).toEqual([])
    const needed = new Set(functions.filter(({ file, name }) => !covered.has(`${file}#${name}`)).map(({ file }) => file))
    expect(Object.keys(EXCUSED).filter(file => !needed.has(file))).toEqual([])
  })

  it('each have a docstring before every function that they speak for', () => {
    const bare = functions.filter(({ text, name }) => !new RegExp(`\\*/\\nexport function ${name}\\b`).test(text)).map(({ file, name }) => `${file}#${name}`)
    expect(bare).toEqual([])
  })

  it('have an address each, a source and a row', () => {
    expect(new Set(FIGURES.map(({ id }) => id)).size).toBe(FIGURES.length)
    expect(FIGURES.filter(({ sources, checks }) => sources.length === 0 || checks.length === 0).map(({ id }) => id)).toEqual([])
    expect(FIGURES.flatMap(({ checks }) => checks).filter(({ cite }) => !cite)).toEqual([])
  })

  it('print methods, rows, worst relative error and sources', () => {
    const table = FIGURES.map(({ id, checks, sources }) => {
      const worst = Math.max(...checks.map(row => run(row).relativeError))
      return { id, rows: checks.length, worst, sources: sources.length }
    })
    console.log(table.map(({ id, rows, worst, sources }) => `${id.padEnd(30)} ${String(rows).padStart(4)} rows  worst ${worst.toExponential(1)}  ${sources} source${sources === 1 ? '' : 's'}`).join('\n'))
    expect(table.length).toBeGreaterThan(25)
  })
})
