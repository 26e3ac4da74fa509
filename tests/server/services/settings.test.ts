import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { readSettings } from '../../../server/services/settings'

const GOOD = { NODE_ENV: 'production', NUXT_SESSION_PASSWORD: 'kJ7#pQ2!vX9$zL4@mN8&wR5^tY1*cB3q', PUBLIC_ORIGIN: 'https://farm.example' }

const read = (env: Record<string, string | undefined>, loaded: { fakesLoaded?: boolean, built?: boolean } = {}) => readSettings(env, { fakesLoaded: false, built: false, ...loaded })

describe('readSettings', () => {
  it('takes a complete production set', () => {
    expect(read(GOOD)).toMatchObject({ production: true, demo: false, publicOrigin: 'https://farm.example' })
  })

  it('lists every problem at once', () => {
    const all = () => read({ NODE_ENV: 'production', NUXT_SESSION_PASSWORD: 'short', PUBLIC_ORIGIN: 'nowhere', WEATHER_FORECAST_URL: 'ftp://x', PORT: '99999' }, { fakesLoaded: true })
    expect(all).toThrow(/NUXT_SESSION_PASSWORD must be 32/)
    expect(all).toThrow(/PUBLIC_ORIGIN/)
    expect(all).toThrow(/WEATHER_FORECAST_URL/)
    expect(all).toThrow(/PORT must be a number/)
    expect(all).toThrow(/fake weather service/)
  })

  it.each([
    ['a secret from the source', { NUXT_SESSION_PASSWORD: 'only-for-development-never-for-people' }, false, /anybody can read/],
    ['no secret', { NUXT_SESSION_PASSWORD: undefined }, false, /is missing/],
    ['a cookie without TLS', { NUXT_SESSION_COOKIE_SECURE: 'false' }, false, /in the clear/],
    ['plain http', { PUBLIC_ORIGIN: 'http://farm.example' }, false, /https/],
    ['a secret of one letter', { NUXT_SESSION_PASSWORD: 'x'.repeat(64) }, false, /too easily guessed/],
    ['a cookie that other sites may set', { NUXT_SESSION_NAME: 'sillion' }, false, /__Host-/],
    ['loaded fakes', {}, true, /fake/],
  ])('refuses %s in production', (_, change, fakesLoaded, message) => {
    expect(() => read({ ...GOOD, ...change }, { fakesLoaded })).toThrow(message)
  })

  it('takes a built server for production, whatever NODE_ENV says', () => {
    expect(read({ ...GOOD, NODE_ENV: undefined }, { built: true }).production).toBe(true)
    expect(() => read({ ...GOOD, NODE_ENV: 'development' }, { built: true, fakesLoaded: true })).toThrow(/fake/)
  })

  it.each([
    ['a proxy that is no address', { TRUSTED_PROXIES: '10.0.0.1, proxy.example' }, /TRUSTED_PROXIES/],
    ['a demo that is neither on nor off', { SILLION_DEMO: 'yes' }, /SILLION_DEMO/],
    ['a cookie that browsers drop', { SILLION_DEMO: '1', NUXT_SESSION_COOKIE_SECURE: 'false' }, /NUXT_SESSION_NAME/],
  ])('refuses %s anywhere', (_, change, message) => {
    expect(() => read({ ...GOOD, ...change })).toThrow(message)
  })

  it('takes several proxies', () => {
    expect(read({ ...GOOD, TRUSTED_PROXIES: '10.0.0.1, ::1' }).trustedProxies).toEqual(['10.0.0.1', '::1'])
  })

  it('allows fakes in the demo', () => {
    expect(read({ ...GOOD, SILLION_DEMO: '1', PUBLIC_ORIGIN: 'http://localhost:3000' }, { fakesLoaded: true, built: true })).toMatchObject({ demo: true, production: false })
  })

  it('knows every name in .env.example, and only those', () => {
    const named = [...readFileSync('.env.example', 'utf8').matchAll(/^#? ?([A-Z_]+)=/gm)].map(match => match[1]!)
    const source = readFileSync('server/services/settings.ts', 'utf8')
    const checked = [...source.matchAll(/^ {2}([A-Z_]+): /gm)].map(match => match[1]!).filter(name => name !== 'NODE_ENV')
    expect(checked.sort()).toEqual(named.sort())
  })
})
