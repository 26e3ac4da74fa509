import { migrations } from '#migrations'
import { startApp } from '../services/start'
import { log } from '../services/log'

/** Settings, database and clock, in place before the first request; a problem stops the start in plain words. */
export default defineNitroPlugin((nitro) => {
  process.on('unhandledRejection', (reason) => {
    log('error', 'A promise was rejected and nobody cared.', { reason: String(reason) })
    process.exit(1)
  })
  try {
    const stop = startApp(process.env, migrations)
    nitro.hooks.hook('close', stop)
  }
  catch (error) {
    console.error(error instanceof Error ? error.message : String(error))
    process.exit(1)
  }
})
