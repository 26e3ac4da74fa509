import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { abandonPulls } from '../../../server/db/queries/weather-pulls'
import { NOW, seedFarm, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

/** 100 on demand: KILLS=100 npx vitest run --project server tests/server/weather/kill.test.ts */
const KILLS = Number(process.env.KILLS ?? 6)

describe('a pull that is killed at a random moment', () => {
  let temporary: TemporaryDatabase
  beforeAll(() => {
    temporary = temporaryDatabase()
    seedFarm(temporary.db, 'a')
  })
  afterAll(() => temporary.close())
  const one = (sql: string) => temporary.sqlite.prepare(sql).pluck().get() as number

  async function pull(hour: number, killAfterMs: number | null): Promise<void> {
    const at = new Date(NOW.getTime() + hour * 3_600_000).toISOString()
    const child = spawn('node', ['.ci/run-typescript.mjs', 'tests/server/weather/pull-once.ts', temporary.file, at], { stdio: ['ignore', 'pipe', 'inherit'] })
    const ended = once(child, 'exit')
    child.stdout.on('data', (chunk: Buffer) => {
      if (killAfterMs !== null && chunk.toString().includes('pulling')) setTimeout(() => child.kill('SIGKILL'), killAfterMs)
    })
    const [code] = await ended as [number | null]
    if (killAfterMs === null) expect(code).toBe(0)
  }

  it(`leaves all of it or nothing, ${KILLS} times`, async () => {
    for (let kill = 0; kill < KILLS; kill++) {
      const before = { forecasts: one('select count(*) from forecasts'), done: one('select count(*) from weather_pulls where outcome = \'done\'') }
      // Spread evenly over the time that a pull takes, so that each part of it is hit.
      await pull(kill, 20 + (kill * 997) % 900)
      const stored = one('select count(*) from forecasts') - before.forecasts
      const done = one('select count(*) from weather_pulls where outcome = \'done\'') - before.done
      expect([0, 2, 4]).toContain(stored)
      expect(stored > 0).toBe(done === 1)
      expect(temporary.sqlite.pragma('integrity_check', { simple: true })).toBe('ok')
      expect(temporary.sqlite.pragma('foreign_key_check')).toEqual([])
    }
    await pull(KILLS, null)
    abandonPulls(temporary.db, NOW)
    expect(one('select count(*) from weather_pulls where outcome = \'running\'')).toBe(0)
    expect(one('select count(*) from hourly_weather')).toBe(2 * one('select count(distinct starts_at) from hourly_weather'))
  }, 20_000 + KILLS * 8000)
})
