import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { createServer, type AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startDemoServer, type DemoServer } from './demo-server'

const root = fileURLToPath(new URL('../..', import.meta.url))
const GOOD = { NUXT_SESSION_PASSWORD: 'kJ7#pQ2!vX9$zL4@mN8&wR5^tY1*cB3q', PUBLIC_ORIGIN: 'https://farm.example', PORT: '0' }

/** Starts the built server with these settings and no others, until it ends by itself. */
async function startAndFail(settings: Record<string, string>, preload: string[] = []) {
  const server = spawn(process.execPath, [...preload, '.output/server/index.mjs'], { cwd: root, env: { PATH: process.env.PATH, ...settings }, stdio: ['ignore', 'pipe', 'pipe'], timeout: 20_000 })
  let said = ''
  for (const stream of [server.stdout, server.stderr]) stream.on('data', chunk => said += chunk)
  const [code] = await once(server, 'close') as [number | null]
  return { code, said }
}

describe('the start', () => {
  let folder: string
  beforeAll(() => void (folder = mkdtempSync(join(tmpdir(), 'sillion-start-'))))
  afterAll(() => rmSync(folder, { recursive: true, force: true }))

  it('lists all that is missing for production, though nobody set NODE_ENV', async () => {
    const { code, said } = await startAndFail({ DATA_DIR: folder, PUBLIC_ORIGIN: 'http://farm.example', TRUSTED_PROXIES: 'proxy.example' })
    expect(code).toBe(1)
    expect(said).toMatch(/can't start.*\n.*NUXT_SESSION_PASSWORD is missing.*\n[\s\S]*TRUSTED_PROXIES[\s\S]*PUBLIC_ORIGIN must be the https/)
    expect(said).not.toMatch(/ at .*:\d+:\d+/)
  })

  it('refuses a fake weather service in production', async () => {
    const { code, said } = await startAndFail({ ...GOOD, DATA_DIR: folder }, ['--import', './mocks/register.mjs'])
    expect([code, said]).toEqual([1, expect.stringContaining('a fake weather service is loaded')])
  })

  it('refuses a folder that can’t be written', async () => {
    writeFileSync(join(folder, 'file'), '')
    const { code, said } = await startAndFail({ ...GOOD, DATA_DIR: join(folder, 'file') })
    expect([code, said]).toEqual([1, expect.stringMatching(/^The database .* can't be opened: .*DATA_DIR.*\n$/)])
  })

  it('refuses a damaged database', async () => {
    writeFileSync(join(folder, 'sillion.db'), 'no database at all, though long enough to be read as one. '.repeat(100))
    const { code, said } = await startAndFail({ ...GOOD, DATA_DIR: folder })
    expect([code, said]).toEqual([1, expect.stringMatching(/^The database .*\n$/)])
  })

  it('says so when the port is taken', async () => {
    const other = createServer().listen(0)
    await once(other, 'listening')
    const PORT = String((other.address() as AddressInfo).port)
    const { code, said } = await startAndFail({ ...GOOD, DATA_DIR: join(folder, 'port'), PORT })
    other.close()
    expect([code, said]).toEqual([1, expect.stringContaining(`port ${PORT} is taken`)])
    expect(said).not.toMatch(/ at .*:\d+:\d+/)
  })
})

describe('the stop', () => {
  let server: DemoServer
  beforeAll(async () => void (server = await startDemoServer()))
  afterAll(() => server?.stop())

  it('takes a moment though a page listens, leaves no unfinished log, and production then refuses the demo’s people', async () => {
    const signIn = await fetch(`${server.address}/api/auth/sign-in`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'origin': server.address },
      body: JSON.stringify({ email: 'owner@brindlemarsh.example', password: server.password }),
    })
    const cookie = signIn.headers.getSetCookie()[0]!.split(';')[0]!
    const stream = await fetch(`${server.address}/api/farms/brindle-marsh/changes`, { headers: { cookie } })
    const startedAt = performance.now()
    const [code] = await Promise.all([server.end(), stream.text()])
    expect(code).toBe(0)
    expect(performance.now() - startedAt).toBeLessThan(10_000)
    expect(statSync(join(server.dataDir, 'sillion.db-wal'), { throwIfNoEntry: false })?.size ?? 0).toBe(0)
    const production = await startAndFail({ ...GOOD, DATA_DIR: server.dataDir })
    expect([production.code, production.said]).toEqual([1, expect.stringContaining('the demo\'s people')])
  })
})
