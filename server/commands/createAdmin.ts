import { randomBytes } from 'node:crypto'
import { parseArgs } from 'node:util'
import type { z } from 'zod'
import { emailSchema, newPasswordSchema } from '../../shared/schemas/account.ts'
import { nameSchema } from '../../shared/schemas/common.ts'
import { fieldProblems, issueWords } from '../../shared/schemas/fieldProblems.ts'
import { systemClock } from '../config/clock.ts'
import { readEnv } from '../config/env.ts'
import { sessionSecretOf } from '../config/sessionSecret.ts'
import { StartRefusal } from '../config/StartRefusal.ts'
import { openFirmFile } from '../db/firmFile.ts'
import { closeDatabase } from '../db/openDatabase.ts'
import { AppError } from '../errors/AppError.ts'
import { createAdmin } from '../features/accounts/createAdmin.ts'
import { createLinkTokens } from '../features/accounts/linkTokens.ts'
import { createPasswordHasherHere } from '../features/accounts/passwordHasher.ts'
import { PASSWORD_COST } from '../features/accounts/passwordCost.ts'
import { refuseGuessable } from '../features/accounts/passwordRules.ts'
import { askPassword } from './askPassword.ts'
import { runCommand } from './runCommand.ts'

const USAGE = `npm run create-admin -- EMAIL "FULL NAME" [--invite]

On a terminal it asks for the password; elsewhere it makes one and prints it once.
--invite prints a link instead, where the admin sets a password within seven days.`

/** The first admin, or another one when nobody can sign in any more. */
await runCommand(async () => {
  // What isn't an option here is taken as one more word, and so is answered with the usage.
  const { positionals, values } = parseArgs({ allowPositionals: true, strict: false, options: { invite: { type: 'boolean' } } })
  const [emailText, nameText] = positionals
  if (!emailText || !nameText) throw new StartRefusal(USAGE)
  const email = checked(emailSchema, emailText, 'The e-mail')
  const name = checked(nameSchema, nameText, 'The name')
  const env = readEnv(process.env)
  const db = await openFirmFile(env.dataDir, systemClock)
  try {
    if (values.invite) {
      const links = createLinkTokens({ secret: sessionSecretOf(env), clock: systemClock })
      const id = createAdmin(db, systemClock, { email, name, passwordHash: null })
      console.log(
        `${name} sets a password here, once, within seven days:\n\n  ${env.appUrl}/accept-invitation?token=${await links.issue('invitation', id, null)}\n`,
      )
      return
    }
    const { password, isMade } = await choosePassword({ email, name })
    createAdmin(db, systemClock, { email, name, passwordHash: await createPasswordHasherHere(PASSWORD_COST).hash(password) })
    console.log(`${name} is an admin and signs in as ${email}.`)
    if (isMade) console.log(`The password, shown this once:\n\n  ${password}\n`)
  } finally {
    closeDatabase(db)
  }
})

async function choosePassword(person: { email: string; name: string }): Promise<{ password: string; isMade: boolean }> {
  if (!process.stdin.isTTY) return { password: randomBytes(15).toString('base64url'), isMade: true }
  const password = checked(newPasswordSchema, await askPassword(`Password for ${person.email}: `), 'The password')
  try {
    refuseGuessable(password, person)
  } catch (error) {
    throw error instanceof AppError ? new StartRefusal(`The password ${error.errors?.[0]?.message ?? 'was refused'}.`) : error
  }
  const isSame = (await askPassword('The same once more: ')) === password
  if (!isSame) throw new StartRefusal('The two are not the same. Nothing was saved.')
  return { password, isMade: false }
}

function checked(schema: z.ZodType<string>, text: string, what: string): string {
  const parsed = schema.safeParse(text, { error: issueWords })
  if (parsed.success) return parsed.data
  throw new StartRefusal(`${what} ${fieldProblems(parsed.error)[0]?.message ?? 'was refused'}.`)
}
