// Runs a TypeScript file of this repository outside the build: node .ci/run-typescript.mjs mocks/demo/seed.ts
// The file's default export, when it is a function, is called with the arguments that follow.
import { fileURLToPath, pathToFileURL } from 'node:url'
import { resolve } from 'node:path'
import { runnerImport } from 'vite'

/** Imports a TypeScript module of this repository with its aliases. */
export async function importTypescript(file) {
  const { module } = await runnerImport(pathToFileURL(resolve(file)).pathname, {
    configFile: false,
    logLevel: 'error',
    // Nuxt's own tsconfig says nothing that a run needs, and is not there before Nuxt has prepared.
    esbuild: { tsconfigRaw: {} },
    resolve: { alias: { '#shared': fileURLToPath(new URL('../shared', import.meta.url)) } },
  })
  return module
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const [file, ...args] = process.argv.slice(2)
  const module = await importTypescript(file)
  if (typeof module.default === 'function') await module.default(...args)
}
