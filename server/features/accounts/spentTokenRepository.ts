import { lt } from 'drizzle-orm'
import type { Queryable } from '../../db/client.ts'
import { spentTokens } from '../../db/schema/spentTokens.ts'

/** Notes that a token was used. Gives `false` when it had been used before. */
export function insertSpentToken(tx: Queryable, token: { idHash: string; spentAt: string; expiresAt: string }): boolean {
  return tx.insert(spentTokens).values(token).onConflictDoNothing().run().changes === 1
}

/** Tokens past their time are refused by that alone. */
export function deleteExpiredTokens(tx: Queryable, before: string): void {
  tx.delete(spentTokens).where(lt(spentTokens.expiresAt, before)).run()
}
