// Makes a migration from the schema, and makes its tables STRICT, which drizzle-kit can't say.
// drizzle-kit exits 0 when it wanted to ask a question and could not, so a missing file is the failure.
import { spawnSync } from 'node:child_process'
import { existsSync, mkdirSync, readFileSync, readdirSync, writeFileSync } from 'node:fs'

const folder = new URL('../drizzle/', import.meta.url)
mkdirSync(folder, { recursive: true })
const sqlFiles = () => new Set(existsSync(folder) ? readdirSync(folder).filter(name => name.endsWith('.sql')) : [])

const before = sqlFiles()
const run = spawnSync('npx', ['drizzle-kit', 'generate', ...process.argv.slice(2)], { encoding: 'utf8', cwd: new URL('..', import.meta.url) })
process.stdout.write(run.stdout + run.stderr)
if (/No schema changes/.test(run.stdout)) process.exit(0)

const made = [...sqlFiles()].filter(name => !before.has(name))
if (made.length !== 1) {
  console.error('No migration was made. If a column was renamed, run drizzle-kit in a terminal, where it can ask.')
  process.exit(1)
}
const file = new URL(made[0], folder)
writeFileSync(file, readFileSync(file, 'utf8').replace(/^\);$/gm, ') STRICT;'))
