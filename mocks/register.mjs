// node --import ./mocks/register.mjs .output/server/index.mjs: the fakes, in front of a built server.
import { fileURLToPath } from 'node:url'
import { importTypescript } from '../.ci/run-typescript.mjs'

const { registerFakes } = await importTypescript(fileURLToPath(new URL('register.ts', import.meta.url)))
registerFakes()
