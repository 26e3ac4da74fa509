import { openDatabase } from '../../../server/db/client'
import { readMigrations } from '../../../server/db/migrations-module'
import { pullWeather } from '../../../server/services/weather/pull-weather'
import { fakeService } from './fake-service'

/** One pull in a process of its own, for the test that kills it. */
export default async function pullOnce(file: string, at: string): Promise<void> {
  const service = fakeService()
  service.start()
  service.at(new Date(at))
  const { db } = openDatabase(file, readMigrations())
  process.stdout.write('pulling\n')
  await pullWeather({ db, now: new Date(at), gateway: service.gateway(), model: service.model })
  process.stdout.write('pulled\n')
}
