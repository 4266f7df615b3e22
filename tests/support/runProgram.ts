import { spawn } from 'node:child_process'

/** Runs one of the app's programs to its end, as npm would, without a terminal. */
export async function runProgram(
  file: string,
  args: string[],
  env: Record<string, string>,
): Promise<{ code: number | null; out: string; err: string }> {
  const program = spawn(process.execPath, ['--import', 'tsx', file, ...args], {
    env: { ...process.env, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  let out = ''
  let err = ''
  program.stdout.on('data', (chunk: Buffer) => (out += chunk.toString()))
  program.stderr.on('data', (chunk: Buffer) => (err += chunk.toString()))
  const code = await new Promise<number | null>((resolve) => program.once('close', resolve))
  return { code, out, err }
}
