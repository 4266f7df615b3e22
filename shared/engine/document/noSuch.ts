/** Words for a thing of several forms whose form is none of them; any other fault keeps its own words. */
export function noSuch(discriminator: string, forms: string) {
  return (issue: { code?: string | undefined; input?: unknown }): string | undefined => {
    if (issue.code !== 'invalid_union') return undefined
    const given =
      issue.input !== null && typeof issue.input === 'object' ? (issue.input as Record<string, unknown>)[discriminator] : undefined
    return given === undefined ? `is missing: one of ${forms}` : `must be one of ${forms}`
  }
}
