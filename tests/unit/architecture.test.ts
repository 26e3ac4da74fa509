import { readFileSync, readdirSync, statSync, existsSync } from 'node:fs'
import { dirname, join, relative, resolve } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'

const root = fileURLToPath(new URL('../..', import.meta.url))

function filesUnder(folder: string): string[] {
  const path = join(root, folder)
  if (!existsSync(path)) return []
  return readdirSync(path).flatMap((name) => {
    const inside = join(folder, name)
    return statSync(join(root, inside)).isDirectory() ? filesUnder(inside) : /\.(ts|vue|mjs)$/.test(name) ? [inside] : []
  })
}

/** What a file imports: paths from the root for our own files, package names for the rest. */
function importsOf(file: string): string[] {
  const text = readFileSync(join(root, file), 'utf8')
  return [...text.matchAll(/(?:from\s+|import\s*\(?\s*)['"]([^'"]+)['"]/g)].map(([, path]) => {
    if (path!.startsWith('.')) return relative(root, resolve(root, dirname(file), path!))
    return path!.replace(/^#shared\//, 'shared/').replace(/^~~\//, '').replace(/^[~@]\//, 'app/')
  })
}

function offenders(folder: string, allowed: (path: string) => boolean): string[] {
  return filesUnder(folder).flatMap(file => importsOf(file).filter(path => !allowed(path)).map(path => `${file} imports ${path}`))
}

describe('the layers', () => {
  it('keep the domain to itself and small numeric libraries', () => {
    expect(offenders('shared/agronomy', path => path.startsWith('shared/agronomy/') || path === 'suncalc')).toEqual([])
  })

  it('keep shared code away from server and app', () => {
    expect(offenders('shared', path => !/^(server|app|mocks)\//.test(path))).toEqual([])
  })

  it('keep the server, its database and the mocks out of the browser', () => {
    expect(offenders('app', path => !/^(server|mocks)\//.test(path) && !/^(drizzle-orm|better-sqlite3|node:)/.test(path))).toEqual([])
  })

  it('keep mocks out of the product', () => {
    expect(offenders('server', path => !/^(mocks|tests)\//.test(path))).toEqual([])
  })

  it('keep SQL in the queries', () => {
    const above = ['api', 'routes', 'services', 'tasks', 'gateways', 'plugins', 'middleware', 'utils'].flatMap(folder => offenders(`server/${folder}`, path => !/^drizzle-orm|^server\/db\/schema/.test(path)))
    expect(above).toEqual([])
  })

  it('keep vendors behind their gateways', () => {
    const outside = filesUnder('server').filter(file => !/^server\/(gateways|utils\/settings)/.test(file))
    expect(outside.filter(file => /temperature_2m|shortwave_radiation/.test(readFileSync(join(root, file), 'utf8')))).toEqual([])
  })
})

describe('the domain', () => {
  it('has a test beside every file that computes', () => {
    const computes = filesUnder('shared/agronomy').filter(file => /^export (async )?function|^export class/m.test(readFileSync(join(root, file), 'utf8')))
    expect(computes.length).toBeGreaterThan(10)
    expect(computes.filter(file => !existsSync(join(root, 'tests/unit', file.replace(/\.ts$/, '.test.ts'))))).toEqual([])
  })
})

describe('the text of the repository', () => {
  const sources = ['app', 'server', 'shared', 'mocks', 'tests', '.ci'].flatMap(filesUnder).filter(file => file !== 'tests/unit/architecture.test.ts')

  it('has no paths of one machine and no unfinished marks', () => {
    const odd = /\/(root|home)\/[a-z]|\b(TODO|FIXME|XXX)\b|@ts-(ignore|nocheck)|eslint-disable|\.(only|todo)\(/
    expect(sources.filter(file => odd.test(readFileSync(join(root, file), 'utf8')))).toEqual([])
  })

  it('never sends a person to an address that they typed', () => {
    const open = /navigateTo\(\s*(route\.query|useRoute\(\)\.query)|open:\s*\{/
    expect(filesUnder('app').filter(file => open.test(readFileSync(join(root, file), 'utf8')))).toEqual([])
  })

  it('names every setting that the code reads in .env.example', () => {
    const example = readFileSync(join(root, '.env.example'), 'utf8')
    const read = ['server', 'nuxt.config.ts'].flatMap(path => path.endsWith('.ts') ? [path] : filesUnder(path))
      .flatMap(file => [...readFileSync(join(root, file), 'utf8').matchAll(/process\.env\.([A-Z_]+)/g)].map(match => match[1]!))
    expect([...new Set(read)].filter(name => name !== 'NODE_ENV' && !new RegExp(`^#? ?${name}=`, 'm').test(example))).toEqual([])
  })
})
