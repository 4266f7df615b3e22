import { existsSync } from 'node:fs'
import { resolve } from 'node:path'
import { systemClock } from '../config/clock.ts'
import { readEnv } from '../config/env.ts'
import { StartRefusal } from '../config/StartRefusal.ts'
import { backupDatabase } from '../db/backupDatabase.ts'
import { backupFolderIn, firmFileIn } from '../db/firmFile.ts'
import { openDatabase } from '../db/openDatabase.ts'
import { runCommand } from './runCommand.ts'

/** `npm run backup [-- FOLDER]`: a checked copy of the database, taken while the app may be running. Prints its path. */
await runCommand(async () => {
  const { dataDir } = readEnv(process.env)
  const file = firmFileIn(dataDir)
  if (!existsSync(file)) throw new StartRefusal(`There is nothing to back up: ${file} does not exist. DATA_DIR says where the data stands.`)
  const folder = process.argv[2] ? resolve(process.argv[2]) : backupFolderIn(dataDir)
  const db = openDatabase(file)
  try {
    console.log(await backupDatabase(db, folder, 'backup', systemClock()))
  } finally {
    // Closed without a checkpoint of its own: the app may be writing.
    db.$client.close()
  }
})
