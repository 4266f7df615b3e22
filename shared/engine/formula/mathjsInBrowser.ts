import { create, parseDependencies } from 'mathjs/number'

/** In a browser mathjs comes with the module that asks for it, cut down to what its parser needs. */
export function loadMathjs() {
  return { create, parseDependencies }
}
