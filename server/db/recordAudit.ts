import { databaseOf, type Queryable } from './client.ts'
import { placeholders, prepared } from './prepared.ts'
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

const insertQuery = prepared((db) =>
  db
    .insert(auditEntries)
    .values(placeholders(['at', 'actorId', 'what', 'whatId', 'action', 'before', 'after']))
    .prepare(),
)

/** Leaves the audit row of a write. Call it in the write's own transaction, so that neither is there without the other. */
export function recordAudit(tx: Queryable, { actorId, what, id, action, before, after, at }: AuditEntry): void {
  insertQuery(databaseOf(tx)).run({
    at: at.toISOString(),
    actorId,
    what,
    whatId: id,
    action,
    before: jsonOrNull(before),
    after: jsonOrNull(after),
  })
}

function jsonOrNull(value: unknown): string | null {
  return value === null || value === undefined ? null : JSON.stringify(value)
}
