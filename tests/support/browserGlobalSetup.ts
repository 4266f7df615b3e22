import { build } from 'vite'

/** The browser tests drive the app as it ships, so it's built once before them. */
export default async function browserGlobalSetup(): Promise<void> {
  await build({ logLevel: 'warn' })
}
