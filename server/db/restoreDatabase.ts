import { copyFileSync, existsSync, mkdirSync, mkdtempSync, renameSync, rmSync } from 'node:fs'
import { join, resolve } from 'node:path'
import BetterSqlite3 from 'better-sqlite3'
import { StartRefusal } from '../config/StartRefusal.ts'
import { faultOf } from './backupDatabase.ts'
import { backupFolderIn, firmFileIn } from './firmFile.ts'

/**
 * Puts a backup in the place of the firm's file. The backup is checked first and stays where it is; the file that it replaces
 * is kept among the backups. Throws a `StartRefusal` when the backup is not sound or the app is still running.
 * @returns where the replaced file is kept, `null` when there was none
 */
export function restoreDatabase(backup: string, dataDir: string, at: Date): { file: string; replaced: string | null } {
  if (!existsSync(backup)) throw new StartRefusal(`There is no file ${backup}.`)
  const file = firmFileIn(dataDir)
  if (resolve(backup) === file) throw new StartRefusal('That is the file in use, not a backup of it.')
  mkdirSync(backupFolderIn(dataDir), { recursive: true })

  const workshop = mkdtempSync(join(resolve(dataDir), 'restore-'))
  try {
    const copy = join(workshop, 'copy.sqlite')
    copyFileSync(backup, copy)
    refuseUnsound(copy, backup)
    const replaced = setAside(file, join(backupFolderIn(dataDir), `replaced-${at.toISOString().slice(0, 19).replace(/[:T]/g, '-')}.sqlite`))
    renameSync(copy, file)
    return { file, replaced }
  } finally {
    rmSync(workshop, { recursive: true, force: true })
  }
}

function refuseUnsound(copy: string, backup: string): void {
  const fault = faultOf(copy)
  if (fault !== null) throw new StartRefusal(`${backup} can't be restored: ${fault}.`)
  const connection = new BetterSqlite3(copy, { readonly: true })
  const isOurs = connection.prepare("SELECT 1 FROM sqlite_schema WHERE type = 'table' AND name = 'audit_entries'").get() !== undefined
  connection.close()
  if (!isOurs) throw new StartRefusal(`${backup} is a database, but not one of Quoinbook's.`)
}

function setAside(file: string, aside: string): string | null {
  if (!existsSync(file)) return null
  const connection = new BetterSqlite3(file, { timeout: 0 })
  try {
    // Leaving WAL needs the file to oneself: it fails while the app has it open, and otherwise brings the log in.
    connection.pragma('journal_mode = DELETE')
  } catch {
    throw new StartRefusal('Quoinbook is still running on this data. Stop it, then restore.')
  } finally {
    connection.close()
  }
  renameSync(file, aside)
  return aside
}
