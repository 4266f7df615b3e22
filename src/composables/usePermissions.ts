import type { Action } from '../../shared/access/permissions.ts'
import { useSessionStore } from '../stores/session.ts'

/** What the signed-in person may do, by the same table that the server guards with. */
export function usePermissions() {
  const session = useSessionStore()
  return { may: (action: Action): boolean => session.may(action) }
}
