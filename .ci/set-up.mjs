// What demo, test, dev and bench need before they start: packages and a build, each made only when it is out
// of date. Uses nothing but Node.js, so that it runs before anything is installed.
import { spawn } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { dirname, join, relative } from 'node:path'
import { fileURLToPath } from 'node:url'

export const root = fileURLToPath(new URL('..', import.meta.url))

/** Ends the program with a plain sentence. */
export function stop(sentence) {
  console.error(`\n${sentence}`)
  process.exit(1)
}

/** Runs a command, its output shown or kept for the failure. Answers its exit code. */
export function run(command, args, { env = {}, quiet = false } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, {
      cwd: root,
      env: { ...process.env, ...env },
      stdio: ['ignore', quiet ? 'pipe' : 'inherit', quiet ? 'pipe' : 'inherit'],
    })
    let kept = ''
    child.stdout?.on('data', chunk => kept += chunk)
    child.stderr?.on('data', chunk => kept += chunk)
    child.on('error', error => resolve({ code: 1, output: String(error) }))
    child.on('close', code => resolve({ code: code ?? 1, output: kept }))
  })
}

/** Runs one step with its name and time on a line, and a sign of life while it lasts. */
export async function step(name, work) {
  const started = performance.now()
  const seconds = () => `${((performance.now() - started) / 1000).toFixed(0)} s`
  const alive = setInterval(() => console.log(`  … ${name}, ${seconds()} so far`), 15_000)
  console.log(`• ${name}`)
  try {
    const result = await work()
    console.log(`  done in ${seconds()}`)
    return result
  }
  finally {
    clearInterval(alive)
  }
}

/** Installs the packages of the lockfile, when they aren't. */
export async function installWhenNeeded() {
  const [major, minor] = process.versions.node.split('.').map(Number)
  if (major !== 20 || minor < 19) stop(`This is Node.js ${process.versions.node}; Sillion runs on Node.js 20, from 20.19 on.`)
  const stamp = join(root, 'node_modules/.sillion-installed')
  const wanted = hashOf([join(root, 'package-lock.json'), join(root, 'package.json')], process.version)
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return
  await step('Installing the packages (two to four minutes: the database driver is compiled)', async () => {
    const { code, output } = await run('npm', ['ci', '--no-progress'], { quiet: true, env: headersEnv() })
    if (code !== 0) stop(`${output.slice(-2000)}\nThe packages could not be installed. Check that the npm registry can be reached and that python3, make and g++ are there, then run the command again.`)
  })
  writeFileSync(stamp, wanted)
}

/** node-gyp must be told where Node's headers are when it can't fetch them. Prefixes differ between machines. */
function headersEnv() {
  const prefix = dirname(dirname(process.execPath))
  return existsSync(join(prefix, 'include/node/node.h')) ? { npm_config_nodedir: prefix } : {}
}

/** Builds the server and the pages, when a source is newer than the build. */
export async function buildWhenNeeded() {
  const stamp = join(root, '.output/.sillion-built')
  const wanted = hashOf(sources(), process.version)
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return
  await step('Building (about half a minute)', async () => {
    rmSync(stamp, { force: true })
    const { code, output } = await run('npx', ['nuxt', 'build'], { quiet: true })
    if (code !== 0) stop(`${output.slice(-4000)}\nThe build failed; the lines above say where.`)
  })
  mkdirSync(dirname(stamp), { recursive: true })
  writeFileSync(stamp, wanted)
}

function sources() {
  const files = ['nuxt.config.ts', 'tailwind.config.ts', 'package-lock.json'].map(name => join(root, name))
  for (const folder of ['app', 'server', 'shared', 'drizzle', 'public']) files.push(...filesUnder(join(root, folder)))
  return files
}

function filesUnder(folder) {
  if (!existsSync(folder)) return []
  return readdirSync(folder).sort().flatMap((name) => {
    const path = join(folder, name)
    return statSync(path).isDirectory() ? filesUnder(path) : [path]
  })
}

function hashOf(files, salt) {
  const hash = createHash('sha256').update(salt)
  for (const file of files) hash.update(relative(root, file)).update(readFileSync(file))
  return hash.digest('hex')
}
