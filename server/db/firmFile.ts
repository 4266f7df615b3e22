import { existsSync, mkdirSync } from 'node:fs'
import { join, resolve } from 'node:path'
import type { Clock } from '../config/clock.ts'
import { backupDatabase } from './backupDatabase.ts'
import type { Database } from './client.ts'
import { migrate, pendingMigrations } from './migrate.ts'
import { closeDatabase, openDatabase } from './openDatabase.ts'

/** One firm, one file. */
export function firmFileIn(dataDir: string): string {
  return join(resolve(dataDir), 'quoinbook.sqlite')
}

export function backupFolderIn(dataDir: string): string {
  return join(resolve(dataDir), 'backups')
}

/** Opens the firm's file, made if it isn't there, and brings it up to date; a file that holds something is backed up before it is altered. */
export async function openFirmFile(dataDir: string, clock: Clock): Promise<Database> {
  // The file holds people and figures: for this user's eyes alone.
  mkdirSync(resolve(dataDir), { recursive: true, mode: 0o700 })
  const file = firmFileIn(dataDir)
  const isNew = !existsSync(file)
  const db = openDatabase(file)
  try {
    const isBehind = pendingMigrations(db).length > 0
    if (isBehind && !isNew) await backupDatabase(db, backupFolderIn(dataDir), 'before-migration', clock())
    migrate(db)
    return db
  } catch (error) {
    closeDatabase(db)
    throw error
  }
}
