import { abandonPulls } from '../db/queries/weather-pulls'
import { useApp } from '../services/app'
import { demoWorkJob } from '../services/demo-work'
import { registerJob, runDueJobs } from '../services/jobs'
import { log } from '../services/log'
import { registerWeatherPull } from '../services/weather/pull-job'

/** Registers the jobs, tidies up after a stop, and catches up at once. */
export default defineNitroPlugin(() => {
  const app = useApp()
  abandonPulls(app.db, app.clock.now())
  registerWeatherPull()
  if (app.demoClock) registerJob(demoWorkJob)
  runDueJobs(app).catch(error => log('error', 'Catching up failed.', { reason: String(error) }))
})
