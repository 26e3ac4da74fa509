import { isIP } from 'node:net'
import { z } from 'zod'

/** Values that stand in examples and tests, and so are no secrets. */
const KNOWN_SECRETS = ['only-for-development-never-for-people', 'only-for-the-end-to-end-tests-and-nobody', 'change-me-change-me-change-me-change-me']
const LEAST_SECRET_LENGTH = 32
/** A random text of 32 characters has more different ones than this. */
const LEAST_SECRET_VARIETY = 10

const address = z.url({ protocol: /^https?$/, error: 'must be an address that starts with http:// or https://' })
const addresses = z.string().default('').transform(text => text.split(',').map(part => part.trim()).filter(Boolean))
  .refine(list => list.every(part => isIP(part) !== 0), 'must be IP addresses, separated by commas')
const port = z.string().regex(/^\d{1,5}$/, 'must be a number up to 65535').refine(text => Number(text) <= 65_535, 'must be a number up to 65535').or(z.literal('')).default('')
const SettingsSchema = z.object({
  NODE_ENV: z.string().default('development'),
  SILLION_DEMO: z.enum(['', '0', '1'], { error: 'must be 1 or empty' }).default(''),
  DATA_DIR: z.string().min(1).default('.data'),
  NUXT_SESSION_PASSWORD: z.string({ error: 'is missing: set a random text of 32 characters or more' }).min(LEAST_SECRET_LENGTH, `must be ${LEAST_SECRET_LENGTH} characters or more`),
  NUXT_SESSION_NAME: z.string().regex(/^[\w-]*$/, 'must be letters, digits, - and _').default(''),
  NUXT_SESSION_COOKIE_SECURE: z.enum(['', 'true', 'false'], { error: 'must be true or false' }).default(''),
  PUBLIC_ORIGIN: address.default('http://localhost:3000'),
  TRUSTED_PROXIES: addresses,
  HOST: z.string().default(''),
  PORT: port,
  WEATHER_FORECAST_URL: address.default('https://api.open-meteo.com'),
  WEATHER_RUNS_URL: address.default('https://ensemble-api.open-meteo.com'),
  WEATHER_FORECAST_MODEL: z.string().regex(/^[a-z0-9_]+$/, 'must be the name of a model').default('ncep_gfs_seamless'),
  WEATHER_RUNS_MODEL: z.string().regex(/^[a-z0-9_]+$/, 'must be the name of a model').default('ecmwf_ifs025'),
  WEATHER_API_KEY: z.string().default(''),
})

export interface Settings {
  production: boolean
  demo: boolean
  dataDir: string
  publicOrigin: string
  trustedProxies: string[]
  weather: { forecastUrl: string, runsUrl: string, forecastModel: string, runsModel: string, apiKey: string | null }
}

/**
 * Reads every setting at once.
 *
 * @param env - as the process has it
 * @param process.fakesLoaded - true when a fake of an outside service answers in this process
 * @param process.built - true in a built server, which is production unless it is the demo, whatever NODE_ENV says
 * @throws {Error} with one message that lists every problem
 */
export function readSettings(env: Record<string, string | undefined>, { fakesLoaded, built }: { fakesLoaded: boolean, built: boolean }): Settings {
  const parsed = SettingsSchema.safeParse(env)
  const problems = parsed.success ? [] : parsed.error.issues.map(issue => `${issue.path.join('.')} ${issue.message}`)
  const demo = env.SILLION_DEMO === '1'
  const production = (built || env.NODE_ENV === 'production') && !demo
  if (env.NUXT_SESSION_COOKIE_SECURE === 'false' && (env.NUXT_SESSION_NAME || '__Host-').startsWith('__Host-')) {
    problems.push('NUXT_SESSION_NAME must be another than __Host-sillion where NUXT_SESSION_COOKIE_SECURE is false: browsers drop such a cookie')
  }
  if (production) problems.push(...productionProblems(env, fakesLoaded))
  if (!parsed.success || problems.length > 0) throw new Error(`Sillion can't start with these settings:\n${problems.map(problem => `  - ${problem}`).join('\n')}\n.env.example names them all.`)
  const value = parsed.data
  return {
    production,
    demo,
    dataDir: value.DATA_DIR,
    publicOrigin: new URL(value.PUBLIC_ORIGIN).origin,
    trustedProxies: value.TRUSTED_PROXIES,
    weather: {
      forecastUrl: value.WEATHER_FORECAST_URL,
      runsUrl: value.WEATHER_RUNS_URL,
      forecastModel: value.WEATHER_FORECAST_MODEL,
      runsModel: value.WEATHER_RUNS_MODEL,
      apiKey: value.WEATHER_API_KEY || null,
    },
  }
}

function productionProblems(env: Record<string, string | undefined>, fakesLoaded: boolean): string[] {
  const problems: string[] = []
  const secret = env.NUXT_SESSION_PASSWORD ?? ''
  if (KNOWN_SECRETS.includes(secret)) problems.push('NUXT_SESSION_PASSWORD is one that anybody can read in the source: set a random text')
  else if (secret.length >= LEAST_SECRET_LENGTH && new Set(secret).size < LEAST_SECRET_VARIETY) problems.push('NUXT_SESSION_PASSWORD is too easily guessed: set a random text')
  if (env.NUXT_SESSION_NAME && !env.NUXT_SESSION_NAME.startsWith('__Host-')) problems.push('NUXT_SESSION_NAME must start with __Host-, so that no other site can set the cookie')
  if (env.NUXT_SESSION_COOKIE_SECURE === 'false') problems.push('NUXT_SESSION_COOKIE_SECURE is false: sign-ins would travel in the clear')
  if (!env.PUBLIC_ORIGIN?.startsWith('https://')) problems.push('PUBLIC_ORIGIN must be the https:// address that people use')
  if (fakesLoaded) problems.push('a fake weather service is loaded: start without --import mocks/register.mjs')
  return problems
}
