import { existsSync, mkdirSync, renameSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import BetterSqlite3 from 'better-sqlite3'
import type { Database } from './client.ts'

/**
 * Copies the database while it is in use (SQLite's online backup), checks the copy and gives its path.
 * Throws when the copy is not sound; nothing is left under its final name then.
 * @param label what it is for, part of the name: `backup`, `before-migration`
 */
export async function backupDatabase(db: Database, folder: string, label: string, at: Date): Promise<string> {
  mkdirSync(folder, { recursive: true })
  const file = freeName(folder, `${label}-${at.toISOString().slice(0, 19).replace(/[:T]/g, '-')}`)
  const unfinished = `${file}.unfinished`
  try {
    await db.$client.backup(unfinished)
    const fault = faultOf(unfinished)
    if (fault !== null) throw new Error(`The copy is not sound: ${fault}`)
    renameSync(unfinished, file)
  } finally {
    for (const ending of ['', '-wal', '-shm', '-journal']) rmSync(unfinished + ending, { force: true })
  }
  return file
}

/** What is wrong with a database file, `null` when it is sound: SQLite's own check of pages and indexes, then of references. */
export function faultOf(file: string): string | null {
  try {
    const copy = new BetterSqlite3(file, { fileMustExist: true })
    try {
      // One file without a log beside it: what is moved about stays whole.
      copy.pragma('journal_mode = DELETE')
      const verdict = String(copy.pragma('integrity_check', { simple: true }))
      if (verdict !== 'ok') return verdict
      const orphans = copy.pragma('foreign_key_check') as unknown[]
      return orphans.length === 0 ? null : `${orphans.length} rows point at nothing`
    } finally {
      copy.close()
    }
  } catch (error) {
    return error instanceof Error ? error.message : String(error)
  }
}

function freeName(folder: string, name: string): string {
  for (let number = 1; ; number += 1) {
    const file = join(folder, `${name}${number === 1 ? '' : `-${number}`}.sqlite`)
    if (!existsSync(file)) return file
  }
}
