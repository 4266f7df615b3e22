import { randomBytes } from 'node:crypto'
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import type { Env } from './env.ts'
import { StartRefusal } from './StartRefusal.ts'

const HOW_TO_MAKE_ONE = `node -e "console.log(require('node:crypto').randomBytes(32).toString('base64url'))"`

/**
 * The secret that links are signed with. In production it must be given; on a developer's machine one is made
 * and kept beside the data, so that links outlive a restart.
 */
export function sessionSecretOf({ sessionSecret, isProduction, dataDir }: Env): string {
  if (sessionSecret !== null) return sessionSecret
  if (isProduction) {
    throw new StartRefusal(
      `In production SESSION_SECRET must be set: there is no default, because anyone could read it.\nMake one and keep it with your other secrets:\n\n  ${HOW_TO_MAKE_ONE}\n`,
    )
  }
  const file = join(dataDir, 'session-secret')
  mkdirSync(dataDir, { recursive: true, mode: 0o700 })
  try {
    writeFileSync(file, randomBytes(32).toString('base64url'), { flag: 'wx', mode: 0o600 })
  } catch (error) {
    const isThereAlready = error instanceof Error && 'code' in error && error.code === 'EEXIST'
    if (!isThereAlready) throw error
  }
  return readFileSync(file, 'utf8').trim()
}
