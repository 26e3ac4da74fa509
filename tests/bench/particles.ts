import { fieldSoil } from '../../shared/agronomy/soil/field-soil'
import { advanceParticles, drawParticles, particleRoom } from '../../shared/agronomy/soil/particles'
import { seededRandom } from '../../shared/agronomy/soil/random'
import { benchWeather } from './bench-weather'

const VERSIONS = 300
const FIELDS = 40
const DAYS = 90

/** The history of a farm through all its versions once, and what one more hour costs afterwards. */
export default async function benchParticles(log: (line: string) => void): Promise<void> {
  const soil = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 30)
  const history = benchWeather(DAYS * 24)
  const hour = benchWeather(1)
  const [room, small] = [particleRoom(DAYS * 24), particleRoom(1)]
  let [whole, more] = [0, 0]
  for (let field = 0; field < FIELDS; field++) {
    const particles = drawParticles(soil, VERSIONS, seededRandom(field), 'grid', 8)
    let started = performance.now()
    advanceParticles(particles, history.weather, history.etoMm, history.localHour, room)
    whole += performance.now() - started
    started = performance.now()
    advanceParticles(particles, hour.weather, hour.etoMm, hour.localHour, small)
    more += performance.now() - started
  }
  log(`particles, ${VERSIONS} × ${FIELDS} fields × ${DAYS} days: ${(whole / 1000).toFixed(1)} s on one core; one more hour ${more.toFixed(0)} ms, 1/${(whole / more).toFixed(0)} of the history`)
}
