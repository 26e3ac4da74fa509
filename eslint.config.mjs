// @ts-check
import withNuxt from './.nuxt/eslint.config.mjs'

/** Asking the machine for the time, which only the clock service may. */
const MACHINE_TIME = [
  { selector: 'CallExpression[callee.object.name="Date"][callee.property.name="now"]', message: 'Ask the clock service, or take the instant as an argument.' },
  { selector: 'NewExpression[callee.name="Date"][arguments.length=0]', message: 'Ask the clock service, or take the instant as an argument.' },
]
const UNSAFE_SQL = [
  { selector: 'CallExpression[callee.property.name="transaction"] > ArrowFunctionExpression[async=true]', message: 'Transactions on better-sqlite3 are synchronous; an async callback commits early.' },
  { selector: 'MemberExpression[object.name="sql"][property.name="raw"]', message: 'Bind values; never build SQL from text.' },
]
const RANDOMNESS = { selector: 'CallExpression[callee.object.name="Math"][callee.property.name="random"]', message: 'Take a generator as an argument.' }

/** @param {{ group: string[], message: string }[]} patterns */
const forbid = patterns => ['error', { patterns }]
const NO_MOCKS = { group: ['**/mocks/**', '~~/mocks/**'], message: 'Only tests import mocks.' }

export default withNuxt(
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      'vue/no-v-html': 'error',
      'vue/max-attributes-per-line': 'off',
    },
  },
  {
    name: 'app: reaches the server over HTTP only, and draws without inline styles',
    files: ['app/**'],
    rules: {
      'no-restricted-imports': forbid([
        NO_MOCKS,
        { group: ['**/server/**', '~~/server/**', 'drizzle-orm*', 'better-sqlite3', 'h3'], message: 'Pages reach the server over HTTP.' },
      ]),
      'no-restricted-syntax': ['error', ...MACHINE_TIME],
      'vue/no-restricted-static-attribute': ['error', { key: 'style', message: 'The content policy blocks inline styles.' }],
      'vue/no-restricted-v-bind': ['error', { argument: 'style', message: 'The content policy blocks inline styles.' }],
    },
  },
  {
    name: 'server: asks the clock service for the time',
    files: ['server/**'],
    rules: {
      'no-restricted-imports': forbid([NO_MOCKS]),
      'no-restricted-syntax': ['error', ...MACHINE_TIME, ...UNSAFE_SQL],
    },
  },
  {
    name: 'server above the queries: no SQL',
    files: ['server/{api,routes,services,tasks,gateways,plugins,middleware,utils}/**'],
    rules: {
      'no-restricted-imports': forbid([NO_MOCKS, { group: ['drizzle-orm*'], message: 'SQL lives in server/db/queries.' }]),
    },
  },
  {
    name: 'the clock service',
    files: ['server/services/clock.ts'],
    rules: { 'no-restricted-syntax': 'off' },
  },
  {
    name: 'shared: neither server nor browser',
    files: ['shared/**'],
    rules: {
      'no-restricted-imports': forbid([NO_MOCKS, { group: ['**/server/**', '**/app/**', 'vue', 'h3', 'drizzle-orm*'], message: 'Shared code runs on both sides.' }]),
      'no-restricted-syntax': ['error', ...MACHINE_TIME],
    },
  },
  {
    name: 'the domain: pure',
    files: ['shared/agronomy/**'],
    rules: {
      'no-restricted-imports': forbid([
        NO_MOCKS,
        { group: ['vue', 'h3', 'zod', 'drizzle-orm*', 'ofetch', 'date-fns*', '@date-fns/*', '**/schemas/**', '**/types/**', '**/utils/**', '#shared/**'], message: 'The domain imports only itself and small numeric libraries.' },
      ]),
      'no-restricted-syntax': ['error', ...MACHINE_TIME, RANDOMNESS],
    },
  },
)
