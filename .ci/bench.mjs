// npm run bench: speed as ratios to a control in the same run, and bytes. Absolute figures are only reported:
// they differ between machines.
import { buildWhenNeeded, installWhenNeeded } from './set-up.mjs'

await installWhenNeeded()
await buildWhenNeeded()
const { importTypescript } = await import('./run-typescript.mjs')
for (const name of ['field-hours', 'ground-order', 'page-bytes']) {
  const { default: bench } = await importTypescript(`tests/bench/${name}.ts`)
  await bench(line => console.log(line))
}
