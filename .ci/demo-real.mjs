// npm run demo:real: the soil model on weather that nobody here invented.
import { installWhenNeeded } from './set-up.mjs'

await installWhenNeeded()
const { importTypescript } = await import('./run-typescript.mjs')
const { printSeattle } = await importTypescript('mocks/real/seattle.ts')
await printSeattle(line => console.log(line))
