import { strFromU8, unzipSync } from 'fflate'

/** The parts of an .xlsx package: text by name, and each as a strictly parsed XML document. Needs a DOM: run the test in jsdom. */
export function xlsxParts(bytes: Uint8Array) {
  const text = new Map(Object.entries(unzipSync(new Uint8Array(bytes))).map(([name, content]) => [name, strFromU8(content)]))
  const parser = new DOMParser()

  function xml(name: string): XMLDocument {
    const content = text.get(name)
    if (content === undefined) throw new RangeError(`The package has no part ${name}`)
    const parsed = parser.parseFromString(content, 'application/xml')
    const problem = parsed.querySelector('parsererror')
    if (problem) throw new SyntaxError(`${name}: ${problem.textContent ?? ''}`)
    return parsed
  }

  return { names: [...text.keys()], text: (name: string) => text.get(name) ?? '', xml }
}
