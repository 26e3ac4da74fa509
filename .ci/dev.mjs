// npm run dev: the demo farms and fakes, with pages that reload as files change.
import { spawn } from 'node:child_process'
import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import { installWhenNeeded, root, run, stop } from './set-up.mjs'

const port = process.env.PORT || '3000'
const env = {
  SILLION_DEMO: '1',
  DATA_DIR: process.env.DATA_DIR || join(root, '.data/dev'),
  PUBLIC_ORIGIN: `http://localhost:${port}`,
  NUXT_SESSION_NAME: 'sillion',
  NUXT_SESSION_COOKIE_SECURE: 'false',
  NUXT_SESSION_PASSWORD: 'only-for-development-never-for-people',
}
await installWhenNeeded()
mkdirSync(env.DATA_DIR, { recursive: true })
const { code, output } = await run('node', ['.ci/run-typescript.mjs', 'mocks/demo/seed.ts'], { quiet: true, env })
if (code !== 0) stop(`${output.slice(0, 1500)}\nThe demo farms could not be set up. Remove ${env.DATA_DIR} and run the command again.`)
spawn('npx', ['nuxt', 'dev', '--port', port], {
  cwd: root,
  stdio: 'inherit',
  env: { ...process.env, ...env },
}).on('exit', exit => process.exit(exit ?? 0))
