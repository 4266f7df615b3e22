import { eq } from 'drizzle-orm'
import type { Queryable } from '../../db/client.ts'
import { firmSettings } from '../../db/schema/firmSettings.ts'

/** The table holds one row. */
const ONLY_ROW = 1

export interface FirmRecord {
  name: string
  isDemo: boolean
}

/** The firm of this file; `null` while nobody has named it. */
export function findFirm(db: Queryable): FirmRecord | null {
  return (
    db.select({ name: firmSettings.name, isDemo: firmSettings.isDemo }).from(firmSettings).where(eq(firmSettings.id, ONLY_ROW)).get() ??
    null
  )
}

export function saveFirm(db: Queryable, firm: FirmRecord): void {
  db.insert(firmSettings)
    .values({ id: ONLY_ROW, ...firm })
    .onConflictDoUpdate({ target: firmSettings.id, set: firm })
    .run()
}
