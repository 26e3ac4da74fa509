import { z } from 'zod'

/** Values that stand in examples and tests, and so are no secrets. */
const KNOWN_SECRETS = ['only-for-development-never-for-people', 'only-for-the-end-to-end-tests-and-nobody', 'change-me-change-me-change-me-change-me']
const LEAST_SECRET_LENGTH = 32

const address = z.url({ protocol: /^https?$/, error: 'must be an address that starts with http:// or https://' })
const SettingsSchema = z.object({
  NODE_ENV: z.string().default('development'),
  SILLION_DEMO: z.enum(['', '0', '1'], { error: 'must be 1 or empty' }).default(''),
  DATA_DIR: z.string().min(1).default('.data'),
  NUXT_SESSION_PASSWORD: z.string({ error: 'is missing: set a random text of 32 characters or more' }).min(LEAST_SECRET_LENGTH, `must be ${LEAST_SECRET_LENGTH} characters or more`),
  NUXT_SESSION_COOKIE_SECURE: z.enum(['', 'true', 'false'], { error: 'must be true or false' }).default(''),
  PUBLIC_ORIGIN: address.default('http://localhost:3000'),
  TRUSTED_PROXIES: z.string().default(''),
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
 * @param fakesLoaded - true when a fake of an outside service answers in this process
 * @throws {Error} with one message that lists every problem
 */
export function readSettings(env: Record<string, string | undefined>, fakesLoaded: boolean): Settings {
  const parsed = SettingsSchema.safeParse(env)
  const problems = parsed.success ? [] : parsed.error.issues.map(issue => `${issue.path.join('.')} ${issue.message}`)
  const demo = env.SILLION_DEMO === '1'
  const production = env.NODE_ENV === 'production' && !demo
  if (production) problems.push(...productionProblems(env, fakesLoaded))
  if (!parsed.success || problems.length > 0) throw new Error(`Sillion can't start with these settings:\n${problems.map(problem => `  - ${problem}`).join('\n')}\n.env.example names them all.`)
  const value = parsed.data
  return {
    production,
    demo,
    dataDir: value.DATA_DIR,
    publicOrigin: new URL(value.PUBLIC_ORIGIN).origin,
    trustedProxies: value.TRUSTED_PROXIES.split(',').map(part => part.trim()).filter(Boolean),
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
  if (KNOWN_SECRETS.includes(env.NUXT_SESSION_PASSWORD ?? '')) problems.push('NUXT_SESSION_PASSWORD is one that anybody can read in the source: set a random text')
  if (env.NUXT_SESSION_COOKIE_SECURE === 'false') problems.push('NUXT_SESSION_COOKIE_SECURE is false: sign-ins would travel in the clear')
  if (!env.PUBLIC_ORIGIN?.startsWith('https://')) problems.push('PUBLIC_ORIGIN must be the https:// address that people use')
  if (fakesLoaded) problems.push('a fake weather service is loaded: start without --import mocks/register.mjs')
  return problems
}
