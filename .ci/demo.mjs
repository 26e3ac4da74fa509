// npm run demo: from a fresh clone to a working page. Starts the built server with local fakes and the demo
// clock. `-- --fresh` starts the season over.
import { spawn } from 'node:child_process'
import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { demoEnv } from './demo-env.mjs'
import { buildWhenNeeded, installWhenNeeded, root, run, step, stop } from './set-up.mjs'

const port = process.env.PORT || '3000'
const address = `http://localhost:${port}`
const dataDir = process.env.DATA_DIR || join(root, '.data/demo')

await installWhenNeeded()
await buildWhenNeeded()
if (process.argv.includes('--fresh')) rmSync(dataDir, { recursive: true, force: true })
mkdirSync(dataDir, { recursive: true })
const env = demoEnv({ port, dataDir, secret: demoSecret() })
await step('Setting up the demo farms', async () => {
  const { code, output } = await run('node', ['.ci/run-typescript.mjs', 'mocks/demo/seed.ts'], { quiet: true, env })
  if (code !== 0) stop(`${output.slice(0, 1500)}\nThe demo farms could not be set up. Remove ${dataDir} and run the command again.`)
})
const server = spawn('node', ['--import', './mocks/register.mjs', '.output/server/index.mjs'], {
  cwd: root,
  env: { ...process.env, ...env },
  stdio: ['ignore', 'pipe', 'inherit'],
})
let log = ''
server.stdout.on('data', chunk => log = (log + chunk).slice(-4000))
server.on('exit', code => code ? stop(`${log}\nThe server stopped. If port ${port} is taken, choose another: PORT=3001 npm run demo`) : process.exit(0))
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal))
await step('Starting, and pulling the first forecasts', untilReady)
server.stdout.on('data', chunk => process.env.DEMO_LOG && process.stdout.write(chunk))
console.log(signIns())

/** The demo's own secret, made once a data folder. */
function demoSecret() {
  const file = join(dataDir, 'session-secret')
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600 })
  return readFileSync(file, 'utf8')
}

async function untilReady() {
  for (let tries = 0; tries < 240; tries++) {
    const answer = await fetch(`${address}/api/health/ready`).catch(() => null)
    if (answer?.ok) return
    await new Promise(resolve => setTimeout(resolve, 250))
  }
  server.kill()
  stop(`${log}\nThe server did not become ready within a minute.`)
}

function signIns() {
  const { farms, password } = JSON.parse(readFileSync(join(dataDir, 'sign-ins.json'), 'utf8'))
  const lines = farms.flatMap(farm => [
    `  ${farm.name} (invented)`,
    ...farm.people.map(person => `    ${person.email.padEnd(36)} ${person.role}`),
  ])
  return `\nSillion runs at ${address}\n\nSign in with the password '${password}' as\n${lines.join('\n')}\n\nCtrl-C stops it. The demo goes on where it was left; npm run demo -- --fresh starts it over.`
}
