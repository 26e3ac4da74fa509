import { useApp } from '../../services/app'
import { runDueJobs } from '../../services/jobs'
import { log } from '../../services/log'

/** The minute's tick. Nitro neither catches up missed runs nor tells the time, so this only asks what is due. */
export default defineTask({
  meta: { name: 'weather:pull', description: 'Runs the jobs that are due: the forecasts first of all.' },
  async run() {
    try {
      await runDueJobs(useApp())
      return { result: 'asked' }
    }
    catch (error) {
      log('error', 'What is due could not be asked.', { reason: String(error) })
      return { result: 'failed' }
    }
  },
})
