import type { Firm } from '../../shared/schemas/account.ts'

interface Welcome {
  /** Where the app is reached. */
  url: string
  demoAccounts: Firm['demoAccounts']
  /** Whether anybody can sign in at all. */
  hasPeople: boolean
}

/** What the terminal shows once the app listens: one address, and who can sign in. */
export function welcomeText({ url, demoAccounts, hasPeople }: Welcome): string {
  const lines = ['', `  Quoinbook is open at ${url}`, '']
  if (demoAccounts.length > 0) {
    const width = Math.max(...demoAccounts.map(({ role }) => role.length))
    lines.push('  This is the demo: all of it is invented. Sign in as', '')
    for (const { role, email, password } of demoAccounts) lines.push(`    ${role.padEnd(width)}  ${email}  ${password}`)
    lines.push('')
  }
  if (!hasPeople) lines.push('  Nobody can sign in yet. Make the first admin:', '', '    npm run create-admin -- EMAIL "FULL NAME"', '')
  return lines.join('\n') + '\n'
}
