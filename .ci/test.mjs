// npm test: installs what is missing, then runs every check, the quick ones first, and stops at the first stage
// that fails. Ends with one line 'N passed, N failed, N skipped' over all of them.
import { spawnSync } from 'node:child_process'
import { existsSync, mkdtempSync, readFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { buildWhenNeeded, installWhenNeeded, run, step, stop } from './set-up.mjs'

const reports = mkdtempSync(join(tmpdir(), 'sillion-test-'))
const totals = { passed: 0, failed: 0, skipped: 0 }

await installWhenNeeded()
await chromiumWhenNeeded()
const stages = [
  ['lint', () => command('npx', ['eslint', '.', '--max-warnings', '0'])],
  ['type check', () => command('npx', ['nuxt', 'typecheck'])],
  ['unit tests', () => vitest('unit')],
  ['server tests', () => vitest('server')],
  ['component tests', () => vitest('nuxt')],
  ['end-to-end tests', async () => {
    await buildWhenNeeded()
    await vitest('e2e')
  }],
]
const { code: prepared, output } = await run('npx', ['nuxt', 'prepare'], { quiet: true })
if (prepared !== 0) stop(`${output.slice(-2000)}\nNuxt could not prepare its types.`)

for (const [index, [name, check]] of stages.entries()) {
  await step(name, check)
  if (totals.failed === 0) continue
  const left = stages.slice(index + 1).map(([other]) => other)
  if (left.length > 0) console.log(`\nNot run, because ${name} failed: ${left.join(', ')}.`)
  break
}
console.log(`\n${totals.passed} passed, ${totals.failed} failed, ${totals.skipped} skipped`)
process.exit(totals.failed === 0 && totals.passed > 0 ? 0 : 1)

async function command(name, args) {
  const { code } = await run(name, args)
  if (code === 0) totals.passed++
  else totals.failed++
}

async function vitest(project) {
  const file = join(reports, `${project}.json`)
  const { code } = await run('npx', ['vitest', 'run', '--project', project, '--reporter=default', '--reporter=json', `--outputFile=${file}`])
  const report = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null
  if (!report || report.numTotalTests === 0) {
    console.error(`The ${project} tests did not report; that counts as one failure.`)
    totals.failed++
    return
  }
  totals.passed += report.numPassedTests
  totals.skipped += report.numPendingTests + report.numTodoTests
  // A file that fails to load, or an error outside any test, fails without a failed test to count.
  totals.failed += report.numFailedTests || (code === 0 ? 0 : 1)
}

/** The end-to-end tests drive Debian's Chromium. */
async function chromiumWhenNeeded() {
  if (existsSync(process.env.CHROMIUM || '/usr/bin/chromium')) return
  const isRoot = process.getuid?.() === 0
  if (!isRoot || spawnSync('apt-get', ['--version']).status !== 0) {
    stop('The end-to-end tests need Chromium. Install it (on Debian: sudo apt-get install chromium), or set CHROMIUM to where it is.')
  }
  await step('Installing Chromium', async () => {
    const env = { DEBIAN_FRONTEND: 'noninteractive' }
    const update = await run('apt-get', ['update', '-qq'], { quiet: true, env })
    const install = await run('apt-get', ['install', '-y', '-qq', 'chromium'], { quiet: true, env })
    if (install.code !== 0) stop(`${(update.output + install.output).slice(-2000)}\nChromium could not be installed with apt-get.`)
  })
}
