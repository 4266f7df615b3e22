import { and, asc, eq } from 'drizzle-orm'
import type { Database } from '../../server/db/client.ts'
import { auditEntries } from '../../server/db/schema/auditEntries.ts'

/** The audit rows about a noun, or about one thing of it, oldest first. */
export function auditOf(db: Database, what: string, id?: string) {
  const isMeant = and(eq(auditEntries.what, what), id === undefined ? undefined : eq(auditEntries.whatId, id))
  return db.select().from(auditEntries).where(isMeant).orderBy(asc(auditEntries.id)).all()
}
