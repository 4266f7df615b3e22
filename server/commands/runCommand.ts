import { StartRefusal } from '../config/StartRefusal.ts'

/** Runs a command of the command line: a refusal is printed in words and ends it with 1, a bug keeps its stack. */
export async function runCommand(command: () => Promise<void>): Promise<void> {
  try {
    await command()
  } catch (error) {
    console.error(error instanceof StartRefusal ? error.message : error)
    process.exitCode = 1
  }
}
