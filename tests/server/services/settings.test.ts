import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { readSettings } from '../../../server/services/settings'

const GOOD = { NODE_ENV: 'production', NUXT_SESSION_PASSWORD: 'kJ7#pQ2!vX9$zL4@mN8&wR5^tY1*cB3q', PUBLIC_ORIGIN: 'https://farm.example' }

describe('readSettings', () => {
  it('takes a complete production set', () => {
    expect(readSettings(GOOD, false)).toMatchObject({ production: true, demo: false, publicOrigin: 'https://farm.example' })
  })

  it('lists every problem at once', () => {
    const all = () => readSettings({ NODE_ENV: 'production', NUXT_SESSION_PASSWORD: 'short', PUBLIC_ORIGIN: 'nowhere', WEATHER_FORECAST_URL: 'ftp://x' }, true)
    expect(all).toThrow(/NUXT_SESSION_PASSWORD must be 32/)
    expect(all).toThrow(/PUBLIC_ORIGIN/)
    expect(all).toThrow(/WEATHER_FORECAST_URL/)
    expect(all).toThrow(/fake weather service/)
  })

  it.each([
    ['a secret from the source', { NUXT_SESSION_PASSWORD: 'only-for-development-never-for-people' }, false, /anybody can read/],
    ['no secret', { NUXT_SESSION_PASSWORD: undefined }, false, /is missing/],
    ['a cookie without TLS', { NUXT_SESSION_COOKIE_SECURE: 'false' }, false, /in the clear/],
    ['plain http', { PUBLIC_ORIGIN: 'http://farm.example' }, false, /https/],
    ['loaded fakes', {}, true, /fake/],
  ])('refuses %s in production', (_, change, fakes, message) => {
    expect(() => readSettings({ ...GOOD, ...change }, fakes)).toThrow(message)
  })

  it('allows fakes in the demo', () => {
    expect(readSettings({ ...GOOD, SILLION_DEMO: '1', PUBLIC_ORIGIN: 'http://localhost:3000' }, true)).toMatchObject({ demo: true, production: false })
  })

  it('knows every name in .env.example, and only those', () => {
    const named = [...readFileSync('.env.example', 'utf8').matchAll(/^#? ?([A-Z_]+)=/gm)].map(match => match[1]!)
    const source = readFileSync('server/services/settings.ts', 'utf8')
    const checked = [...source.matchAll(/^ {2}([A-Z_]+): /gm)].map(match => match[1]!).filter(name => name !== 'NODE_ENV')
    expect(checked.filter(name => !named.includes(name))).toEqual([])
  })
})
