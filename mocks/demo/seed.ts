import { writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { TZDate } from '@date-fns/tz'
import { openDatabase, type Db } from '../../server/db/client'
import { readMigrations } from '../../server/db/migrations-module'
import * as schema from '../../server/db/schema'
import { DEMO_START } from '../../server/services/clock'
import { hashPassword } from '../../server/services/passwords'
import { placeFor } from '../../server/services/weather/places'
import type { CropId, FarmId, FieldId, MachineId, PassRecordId, PersonId, SoilId } from '../../shared/types/ids'
import { CROPS } from '../../shared/agronomy/crop/crops'
import { brindleMarsh } from '../farms/brindle-marsh'
import { cairnFlats } from '../farms/cairn-flats'
import type { DemoFarm, DemoField } from '../farms/demo-farm'

export const DEMO_FARMS = [brindleMarsh, cairnFlats]
/** Printed in the README: a demo's password keeps nobody out. */
export const DEMO_PASSWORD = 'wet ground shines at dawn'
const KM_PER_DEGREE = 111.2

/** Puts the demo farms into an empty database under DATA_DIR, and notes the sign-ins beside it. */
export default async function seedDemo(): Promise<void> {
  const dataDir = process.env.DATA_DIR || '.data'
  const opened = openDatabase(join(dataDir, 'sillion.db'), readMigrations())
  const passwordHash = await hashPassword(DEMO_PASSWORD)
  opened.db.transaction((tx) => {
    if (tx.select().from(schema.farms).all().length > 0) return
    for (const farm of DEMO_FARMS) seedFarm(tx, farm, passwordHash)
  }, { behavior: 'immediate' })
  opened.close()
  writeFileSync(join(dataDir, 'sign-ins.json'), JSON.stringify({
    password: DEMO_PASSWORD,
    farms: DEMO_FARMS.map(({ name, slug, people }) => ({ name, slug, people })),
  }, null, 2))
}

type Transaction = Parameters<Parameters<Db['transaction']>[0]>[0]

function seedFarm(tx: Transaction, farm: DemoFarm, passwordHash: string): void {
  const farmId = farm.slug as FarmId
  const { slug, name, zone, units, latitude, longitude } = farm
  tx.insert(schema.farms).values({ id: farmId, slug, name, zone, units, latitude, longitude, invented: true, createdAt: DEMO_START }).run()
  for (const { email, name: person, role } of farm.people) {
    const id = `person-${person.toLowerCase()}` as PersonId
    tx.insert(schema.people).values({ id, email, name: person, passwordHash, demo: true, createdAt: DEMO_START }).onConflictDoNothing().run()
    tx.insert(schema.memberships).values({ farmId, personId: id, role, createdAt: DEMO_START }).run()
  }
  for (const [key, soil] of Object.entries(farm.soils)) {
    tx.insert(schema.soils).values({ id: idOf<SoilId>(farm, key), farmId, ...soil }).run()
  }
  for (const [key, { chain: _, ...crop }] of Object.entries(farm.crops)) {
    const { minimumSoilC, plantingTable } = CROPS[crop.kind]
    tx.insert(schema.crops).values({ id: idOf<CropId>(farm, key), farmId, minimumSoilC, plantingTable, ...crop }).run()
  }
  for (const field of farm.fields) seedField(tx, farm, field)
  for (const { at, down, ...machine } of farm.machines) {
    tx.insert(schema.machines).values({
      id: idOf<MachineId>(farm, machine.name),
      farmId,
      ...machine,
      atFieldId: idOf<FieldId>(farm, at),
      downUntil: down ? new Date(down.until) : null,
      downReason: down?.reason ?? null,
    }).run()
  }
}

function seedField(tx: Transaction, farm: DemoFarm, field: DemoField): void {
  const farmId = farm.slug as FarmId
  const id = idOf<FieldId>(farm, field.name)
  const latitude = farm.latitude + field.northKm / KM_PER_DEGREE
  const longitude = farm.longitude + field.eastKm / (KM_PER_DEGREE * Math.cos(farm.latitude * Math.PI / 180))
  const place = placeFor(latitude, longitude)
  tx.insert(schema.places).values({ ...place, createdAt: DEMO_START }).onConflictDoNothing().run()
  tx.insert(schema.fields).values({
    id,
    farmId,
    name: field.name,
    areaAc: field.areaAc,
    latitude,
    longitude,
    placeId: place.id,
    soilId: idOf<SoilId>(farm, field.soil),
    cropId: idOf<CropId>(farm, field.crop),
    drainage: field.drainage,
    residuePct: field.residuePct,
    chain: farm.crops[field.crop]!.chain,
    createdAt: DEMO_START,
  }).run()
  for (const [index, work] of (field.worked ?? []).entries()) {
    const startedAt = atLocal(work.localDay, work.fromHour, farm.zone)
    const endedAt = new Date(startedAt.getTime() + work.hours * 3_600_000)
    tx.insert(schema.passRecords).values({
      id: `${id}-${index}` as PassRecordId,
      farmId,
      fieldId: id,
      pass: work.pass,
      areaAc: work.areaAc,
      startedAt,
      endedAt,
      note: 'Invented: done before the demo starts.',
      enteredAt: endedAt,
    }).run()
  }
}

/** Ids of the demo read like what they name, so that an address in the demo does too. */
function idOf<Id extends string>(farm: DemoFarm, name: string): Id {
  return `${farm.slug}-${name.toLowerCase().replace(/[^a-z0-9]+/g, '-')}` as Id
}

function atLocal(localDay: string, hour: number, zone: string): Date {
  const [year, month, day] = localDay.split('-').map(Number) as [number, number, number]
  return new Date(new TZDate(year, month - 1, day, hour, 0, 0, zone).getTime())
}
