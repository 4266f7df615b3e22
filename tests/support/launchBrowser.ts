import { existsSync } from 'node:fs'
import { chromium, type Browser } from 'playwright-core'

const USUAL_PLACES = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
]

/** Starts the Chromium of the machine, headless. `CHROMIUM_PATH` names one in an unusual place. */
export async function launchBrowser(): Promise<Browser> {
  const executablePath = [process.env.CHROMIUM_PATH, ...USUAL_PLACES].find((path) => path && existsSync(path))
  if (!executablePath) {
    throw new Error('The browser tests need Chromium: install it (Debian: apt-get install chromium) or set CHROMIUM_PATH to its program.')
  }
  return chromium.launch({
    executablePath,
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  })
}
