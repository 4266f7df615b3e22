import { createInterface } from 'node:readline/promises'
import { Writable } from 'node:stream'

/** Asks for a password on the terminal without showing what is typed. */
export async function askPassword(question: string): Promise<string> {
  process.stdout.write(question)
  const silence = new Writable({ write: (_chunk, _encoding, done) => done() })
  const terminal = createInterface({ input: process.stdin, output: silence, terminal: true })
  try {
    return await terminal.question('')
  } finally {
    terminal.close()
    process.stdout.write('\n')
  }
}
