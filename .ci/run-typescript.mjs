// Runs a TypeScript file of this repository outside the build: node .ci/run-typescript.mjs mocks/demo/seed.ts
// The file's default export, when it is a function, is called with the arguments that follow.
import { fileURLToPath, pathToFileURL } from 'node:url'
import { resolve, join } from 'node:path'
import { mkdtempSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { build, runnerImport } from 'vite'

const resolving = { alias: { '#shared': fileURLToPath(new URL('../shared', import.meta.url)) } }

/** Imports a TypeScript module of this repository with its aliases. */
export async function importTypescript(file) {
  const { module } = await runnerImport(pathToFileURL(resolve(file)).pathname, {
    configFile: false,
    logLevel: 'error',
    // Nuxt's own tsconfig says nothing that a run needs, and is not there before Nuxt has prepared.
    esbuild: { tsconfigRaw: {} },
    resolve: resolving,
  })
  return module
}

/** The same, bundled first as the server is: what is timed must not pay for the runner's own way of importing. */
export async function importBundled(file) {
  const outDir = mkdtempSync(join(tmpdir(), 'sillion-bench-'))
  await build({
    configFile: false,
    logLevel: 'error',
    esbuild: { tsconfigRaw: {} },
    resolve: resolving,
    build: { ssr: resolve(file), outDir, minify: false, target: 'node20', rollupOptions: { output: { entryFileNames: 'bench.mjs' } } },
  })
  return import(pathToFileURL(join(outDir, 'bench.mjs')).href)
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const [file, ...args] = process.argv.slice(2)
  const module = await importTypescript(file)
  if (typeof module.default === 'function') await module.default(...args)
}
