import { resolve } from 'node:path'
import { systemClock } from '../config/clock.ts'
import { readEnv } from '../config/env.ts'
import { StartRefusal } from '../config/StartRefusal.ts'
import { restoreDatabase } from '../db/restoreDatabase.ts'
import { runCommand } from './runCommand.ts'

/** `npm run restore -- FILE`: puts a backup in place while the app is stopped; what it replaces is kept. */
await runCommand(async () => {
  const [, , backup] = process.argv
  if (!backup) throw new StartRefusal('Name the backup to restore: npm run restore -- data/backups/backup-….sqlite')
  const { file, replaced } = restoreDatabase(resolve(backup), readEnv(process.env).dataDir, systemClock())
  console.log(`Restored to ${file}.`)
  if (replaced) console.log(`What was there before is kept in ${replaced}.`)
})
