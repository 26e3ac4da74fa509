import { migrations } from '#migrations'
import { stopJobs } from '../services/jobs'
import { log } from '../services/log'
import { closeAllStreams } from '../services/open-streams'
import { startApp } from '../services/start'

/** How long a stop waits for the job that runs: its lease lets the next start take it over. */
const JOB_GRACE_MS = 5000

/** Settings, database and clock, in place before the first request; a problem stops the start in plain words. */
export default defineNitroPlugin((nitro) => {
  dieLoudly()
  try {
    const stop = startApp(process.env, migrations, !import.meta.dev)
    stopQuietly()
    nitro.hooks.hook('close', async () => {
      await Promise.race([stopJobs(), new Promise(resolve => setTimeout(resolve, JOB_GRACE_MS))])
      stop()
    })
  }
  catch (error) {
    console.error(error instanceof Error ? error.message : String(error))
    process.exit(1)
  }
})

/** What nobody caught ends the process, with a line in the log; whoever started it starts it again. */
function dieLoudly(): void {
  process.on('unhandledRejection', (reason) => {
    log('error', 'A promise was rejected and nobody cared.', { reason: String(reason), stack: (reason as Error | undefined)?.stack })
    process.exit(1)
  })
  process.on('uncaughtException', (error: NodeJS.ErrnoException) => {
    if (error.syscall === 'listen') console.error(`Sillion can't start: port ${process.env.PORT || '3000'} ${error.code === 'EADDRINUSE' ? 'is taken' : `can't be used (${error.code})`}. Choose another with PORT.`)
    else log('error', 'An error was thrown and nobody caught it.', { reason: String(error), stack: error.stack })
    process.exit(1)
  })
}

/** On the first signal, lets go of what would keep the server waiting; on the second, goes at once. */
function stopQuietly(): void {
  let signals = 0
  for (const signal of ['SIGTERM', 'SIGINT']) {
    process.on(signal, () => {
      if (++signals > 1) process.exit(1)
      closeAllStreams()
      void stopJobs()
    })
  }
}
