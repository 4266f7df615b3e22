import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import BetterSqlite3 from 'better-sqlite3'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { systemClock } from '../../server/config/clock.ts'
import { backupDatabase } from '../../server/db/backupDatabase.ts'
import { backupFolderIn, firmFileIn, openFirmFile } from '../../server/db/firmFile.ts'
import type { Database } from '../../server/db/client.ts'
import { migrate, pendingMigrations } from '../../server/db/migrate.ts'
import { closeDatabase, openDatabase } from '../../server/db/openDatabase.ts'
import { restoreDatabase } from '../../server/db/restoreDatabase.ts'
import { listPeople } from '../../server/features/accounts/personRepository.ts'
import { buildUser } from '../support/buildUser.ts'

const AT = new Date('2026-03-02T09:00:00Z')

let dataDir: string

beforeEach(() => {
  dataDir = mkdtempSync(join(tmpdir(), 'quoinbook-data-'))
})
afterEach(() => rmSync(dataDir, { recursive: true }))

const open = () => openFirmFile(dataDir, systemClock)

describe("the firm's file", () => {
  it('is made up to date, durable and with its references checked', async () => {
    const db = await open()
    expect(pendingMigrations(db)).toEqual([])
    const setting = (name: string) => db.$client.pragma(name, { simple: true })
    expect([setting('journal_mode'), setting('synchronous'), setting('foreign_keys')]).toEqual(['wal', 2, 1])
    expect(setting('busy_timeout')).toBeGreaterThanOrEqual(1000)
    closeDatabase(db)
  })

  it('is not made for others to read', async () => {
    const inner = join(dataDir, 'inner')
    closeDatabase(await openFirmFile(inner, systemClock))
    expect(statSync(inner).mode & 0o077).toBe(0)
  })

  it('is one file once it is closed, log and all', async () => {
    const db = await open()
    buildUser(db)
    closeDatabase(db)
    expect(readdirSync(dataDir)).toEqual(['quoinbook.sqlite'])
  })

  it('is left as it is when it is up to date: no backup, no change', async () => {
    closeDatabase(await open())
    closeDatabase(await open())
    expect(existsSync(backupFolderIn(dataDir))).toBe(false)
  })

  describe('when it is behind', () => {
    it('is backed up, then brought up to date with all that it held', async () => {
      const db = openDatabase(firmFileIn(dataDir))
      applyFirstMigration(db)
      const user = buildUser(db)
      closeDatabase(db)

      const migrated = await open()
      const [backup = ''] = readdirSync(backupFolderIn(dataDir))
      expect(backup).toMatch(/^before-migration-\d{4}-.*\.sqlite$/)
      const copy = openDatabase(join(backupFolderIn(dataDir), backup))
      expect(listPeople(copy).map(({ id }) => id)).toEqual([user.id])
      expect(pendingMigrations(copy)).not.toEqual([])
      closeDatabase(copy)
      expect(listPeople(migrated).map(({ id }) => id)).toEqual([user.id])
      expect(pendingMigrations(migrated)).toEqual([])
      closeDatabase(migrated)
    })
  })

  describe('when a migration fails half-way', () => {
    it('keeps nothing of it and has its references checked again', () => {
      const db = openDatabase(join(dataDir, 'broken.sqlite'))
      db.$client.exec('CREATE TABLE users (id TEXT)')
      expect(() => migrate(db)).toThrow('already exists')
      expect(tablesBut(db.$client, ['users', '__drizzle_migrations'])).toEqual([])
      expect(db.$client.prepare('SELECT count(*) FROM __drizzle_migrations').pluck().get()).toBe(0)
      expect(db.$client.pragma('foreign_keys', { simple: true })).toBe(1)
      db.$client.close()
    })
  })
})

/** The file as the first version of the app left it. */
function applyFirstMigration(db: Database): void {
  const [first] = pendingMigrations(db)
  for (const statement of first?.sql ?? []) db.$client.exec(statement)
  db.$client.prepare('INSERT INTO __drizzle_migrations (hash, created_at) VALUES (?, ?)').run(first?.hash, first?.folderMillis)
}

function tablesBut(connection: BetterSqlite3.Database, others: string[]): string[] {
  const tables = connection
    .prepare("SELECT name FROM sqlite_schema WHERE type = 'table' AND name NOT LIKE 'sqlite_%'")
    .pluck()
    .all() as string[]
  return tables.filter((name) => !others.includes(name))
}

describe('a backup', () => {
  it('holds what is committed at the time, while the file stays in use, and is one sound file', async () => {
    const db = await open()
    const user = buildUser(db)
    const file = await backupDatabase(db, backupFolderIn(dataDir), 'backup', AT)
    buildUser(db)
    expect(file).toBe(join(backupFolderIn(dataDir), 'backup-2026-03-02-09-00-00.sqlite'))
    expect(readdirSync(backupFolderIn(dataDir))).toEqual(['backup-2026-03-02-09-00-00.sqlite'])
    const copy = openDatabase(file)
    expect(listPeople(copy).map(({ id }) => id)).toEqual([user.id])
    closeDatabase(copy)
    closeDatabase(db)
  })

  it('never takes the place of an earlier one', async () => {
    const db = await open()
    const files = [await backupDatabase(db, dataDir, 'backup', AT), await backupDatabase(db, dataDir, 'backup', AT)]
    expect(new Set(files).size).toBe(2)
    closeDatabase(db)
  })
})

describe('restoring a backup', () => {
  it('puts it in place, keeps the backup, and keeps what was there', async () => {
    const db = await open()
    const user = buildUser(db)
    const backup = await backupDatabase(db, backupFolderIn(dataDir), 'backup', AT)
    const later = buildUser(db)
    closeDatabase(db)

    const { replaced } = restoreDatabase(backup, dataDir, AT)
    const restored = await open()
    expect(listPeople(restored).map(({ id }) => id)).toEqual([user.id])
    closeDatabase(restored)
    expect(existsSync(backup)).toBe(true)
    const before = openDatabase(String(replaced))
    expect(listPeople(before).map(({ id }) => id)).toContain(later.id)
    closeDatabase(before)
  })

  it('works into an empty folder', async () => {
    const db = await open()
    const backup = await backupDatabase(db, dataDir, 'backup', AT)
    closeDatabase(db)
    const elsewhere = join(dataDir, 'elsewhere')
    expect(restoreDatabase(backup, elsewhere, AT)).toEqual({ file: firmFileIn(elsewhere), replaced: null })
    closeDatabase(await openFirmFile(elsewhere, systemClock))
  })

  it('refuses while the app has the file open, and changes nothing', async () => {
    const db = await open()
    const backup = await backupDatabase(db, dataDir, 'backup', AT)
    const user = buildUser(db)
    expect(() => restoreDatabase(backup, dataDir, AT)).toThrow('Stop it, then restore')
    expect(listPeople(db).map(({ id }) => id)).toEqual([user.id])
    closeDatabase(db)
  })

  it('refuses what is missing, damaged, no database, or no file of ours', async () => {
    const db = await open()
    for (let number = 0; number < 200; number += 1) buildUser(db)
    closeDatabase(db)
    const file = (name: string) => join(dataDir, name)
    writeFileSync(file('text.sqlite'), 'not a database at all, but long enough to look like one'.repeat(50))
    const foreign = new BetterSqlite3(file('foreign.sqlite'))
    foreign.exec('CREATE TABLE other (id TEXT)')
    foreign.close()
    const damaged = damagedCopyOf(firmFileIn(dataDir), file('damaged.sqlite'))
    for (const [name, words] of [
      [file('missing.sqlite'), 'There is no file'],
      [file('text.sqlite'), "can't be restored: file is not a database"],
      [file('foreign.sqlite'), "not one of Quoinbook's"],
      [damaged, "can't be restored"],
      [firmFileIn(dataDir), 'the file in use'],
    ] as const) {
      expect(() => restoreDatabase(name, dataDir, AT), name).toThrow(words)
    }
    expect(readdirSync(dataDir).filter((name) => name.startsWith('restore-'))).toEqual([])
    const untouched = await open()
    expect(listPeople(untouched)).toHaveLength(200)
    closeDatabase(untouched)
  })
})

/** A copy with the middle of it overwritten, as a failing disk would leave it. */
function damagedCopyOf(file: string, copy: string): string {
  const content = readFileSync(file)
  const pageSize = 4096
  for (let page = 2; page < content.length / pageSize - 1; page += 1) content.fill(0xff, page * pageSize, page * pageSize + 200)
  writeFileSync(copy, content)
  return copy
}
