import { execFileSync, spawn, type ChildProcess } from 'node:child_process'
import { once } from 'node:events'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { demoEnv } from '../../.ci/demo-env.mjs'

const root = fileURLToPath(new URL('../..', import.meta.url))

/** The built server with the demo farms, the invented weather and a data folder of its own. */
export interface DemoServer {
  address: string
  dataDir: string
  password: string
  /** Makes the invented weather service fail in one of its ways, until called with null. */
  trouble: (mode: string | null) => void
  /** Refuses any write of the server to a file, as a disk without room does, until called with false. */
  refuseWrites: (refused: boolean) => void
  /** What the server has printed so far. */
  log: () => string
  /** Asks the server to end, and tells with which code it did; its data stay until `stop`. */
  end: () => Promise<number | null>
  stop: () => Promise<void>
}

/** Seeds and starts a demo of its own on a free port, and answers when its first forecasts are in. */
export async function startDemoServer(settings: Record<string, string> = {}): Promise<DemoServer> {
  const dataDir = mkdtempSync(join(tmpdir(), 'sillion-e2e-'))
  const port = String(await freePort())
  const address = `http://localhost:${port}`
  const troubleFile = join(dataDir, 'trouble')
  writeFileSync(troubleFile, '')
  const env = {
    ...process.env,
    ...demoEnv({ port, dataDir, secret: 'only-for-the-end-to-end-tests-and-nobody' }),
    SILLION_WEATHER_TROUBLE: troubleFile,
    ...settings,
  }
  await finish(spawn('node', ['.ci/run-typescript.mjs', 'mocks/demo/seed.ts'], { cwd: root, env, stdio: ['ignore', 'inherit', 'inherit'] }))
  const server = spawn('node', ['--import', './mocks/register.mjs', '.output/server/index.mjs'], { cwd: root, env, stdio: ['ignore', 'pipe', 'pipe'] })
  let printed = ''
  server.stdout.on('data', chunk => printed += chunk)
  server.stderr.on('data', chunk => printed += chunk)
  await untilReady(address, server, () => printed)
  const { password } = JSON.parse(readFileSync(join(dataDir, 'sign-ins.json'), 'utf8')) as { password: string }
  const end = async () => {
    if (server.exitCode !== null) return server.exitCode
    server.kill('SIGTERM')
    await once(server, 'exit')
    return server.exitCode
  }
  return {
    address,
    dataDir,
    password,
    trouble: mode => writeFileSync(troubleFile, mode ?? ''),
    refuseWrites: refused => void execFileSync('prlimit', ['--pid', String(server.pid), `--fsize=${refused ? '0' : 'unlimited'}:unlimited`]),
    log: () => printed,
    end,
    async stop() {
      await end()
      rmSync(dataDir, { recursive: true, force: true })
    },
  }
}

async function finish(child: ChildProcess): Promise<void> {
  const [code] = await once(child, 'exit') as [number | null]
  if (code !== 0) throw new Error('The demo farms could not be seeded.')
}

async function untilReady(address: string, server: ChildProcess, printed: () => string): Promise<void> {
  for (let tries = 0; tries < 300; tries++) {
    if (server.exitCode !== null) throw new Error(`The server stopped before it was ready:\n${printed()}`)
    const answer = await fetch(`${address}/api/health/ready`).catch(() => null)
    if (answer?.ok) return
    await new Promise(resolve => setTimeout(resolve, 200))
  }
  server.kill()
  throw new Error(`The server was not ready within a minute:\n${printed()}`)
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.on('error', reject)
    probe.listen(0, () => {
      const address = probe.address()
      probe.close(() => typeof address === 'object' && address ? resolve(address.port) : reject(new Error('no port')))
    })
  })
}
