// npm run bench: speed as ratios to a control in the same run, and bytes. Absolute figures are only reported:
// they differ between machines.
import { buildWhenNeeded, installWhenNeeded } from './set-up.mjs'

await installWhenNeeded()
await buildWhenNeeded()
const { importBundled, importTypescript } = await import('./run-typescript.mjs')
for (const name of ['field-hours', 'particles', 'ground-order', 'page-bytes']) {
  const own = name === 'field-hours' || name === 'particles'
  const { default: bench } = await (own ? importBundled : importTypescript)(`tests/bench/${name}.ts`)
  await bench(line => console.log(line))
}
