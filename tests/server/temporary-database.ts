import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { openDatabase, type Db, type OpenDatabase } from '../../server/db/client'
import { readMigrations } from '../../server/db/migrations-module'
import { farms, fields, memberships, people, places } from '../../server/db/schema'
import { hashPassword } from '../../server/services/passwords'
import { placeFor } from '../../server/services/weather/places'
import type { FarmId, FieldId, PersonId } from '../../shared/types/ids'

/** A real database with the real migrations, in a folder of its own. */
export interface TemporaryDatabase extends OpenDatabase { file: string, folder: string }

export function temporaryDatabase(): TemporaryDatabase {
  const folder = mkdtempSync(join(tmpdir(), 'sillion-db-'))
  const file = join(folder, 'sillion.db')
  const opened = openDatabase(file, readMigrations())
  return {
    ...opened,
    file,
    folder,
    close() {
      opened.close()
      rmSync(folder, { recursive: true, force: true })
    },
  }
}

export const NOW = new Date('2025-05-06T10:00:00Z')

/** A farm with two fields in one place and one in another. */
export function seedFarm(db: Db, slug: string, zone = 'America/Chicago', at = { latitude: 46.9, longitude: -96.8 }): FarmId {
  const farmId = slug as FarmId
  db.insert(farms).values({ id: farmId, slug, name: slug, zone, units: 'us', ...at, invented: true, createdAt: NOW }).run()
  for (const [index, north] of [0, 0.001, 0.2].entries()) {
    const place = placeFor(at.latitude + north, at.longitude)
    db.insert(places).values({ ...place, createdAt: NOW }).onConflictDoNothing().run()
    db.insert(fields).values({
      id: `${slug}-${index}` as FieldId, farmId, name: `Field ${index}`, areaAc: 100, latitude: at.latitude + north, longitude: at.longitude,
      placeId: place.id, drainage: 'tiled', chain: ['dig', 'plant'], createdAt: NOW,
    }).run()
  }
  return farmId
}

export const PASSWORD = 'a plain sentence about ground'

export async function seedPerson(db: Db, email: string, farmId: FarmId, role: 'owner' | 'crew'): Promise<PersonId> {
  const id = email as string as PersonId
  db.insert(people).values({ id, email, name: email, passwordHash: await hashPassword(PASSWORD), createdAt: NOW }).run()
  db.insert(memberships).values({ farmId, personId: id, role, createdAt: NOW }).run()
  return id
}
