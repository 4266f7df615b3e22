import type { Queryable } from './client.ts'
import { auditEntries } from './schema/auditEntries.ts'

export interface AuditEntry {
  /** Who did it; `null` for a command on the server or the app itself. */
  actorId: string | null
  /** The noun: `room`, `person`. */
  what: string
  id: string
  /** `add`, `update`, `remove`, `restore`, `publish` … */
  action: string
  before: unknown
  after: unknown
  at: Date
}

/** Leaves the audit row of a write. Call it in the write's own transaction, so that neither is there without the other. */
export function recordAudit(tx: Queryable, { actorId, what, id, action, before, after, at }: AuditEntry): void {
  tx.insert(auditEntries)
    .values({ at: at.toISOString(), actorId, what, whatId: id, action, before: before ?? null, after: after ?? null })
    .run()
}
