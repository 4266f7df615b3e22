import { createRequire } from 'node:module'
import type * as Mathjs from 'mathjs/number'

const require = createRequire(import.meta.url)

/** On a server mathjs is loaded with the first formula that needs it: its hundreds of files would be most of a start. Takes a few tenths of a second, once. */
export function loadMathjs(): Pick<typeof Mathjs, 'create' | 'parseDependencies'> {
  return require('mathjs/number') as typeof Mathjs
}
