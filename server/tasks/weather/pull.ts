import { useApp } from '../../services/app'
import { runDueJobs } from '../../services/jobs'

/** The minute's tick. Nitro neither catches up missed runs nor tells the time, so this only asks what is due. */
export default defineTask({
  meta: { name: 'weather:pull', description: 'Runs the jobs that are due: the forecasts first of all.' },
  async run() {
    await runDueJobs(useApp())
    return { result: 'asked' }
  },
})
