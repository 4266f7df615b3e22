import { NAME_MAX } from '../../../shared/schemas/common.ts'

/** A name for a room like another: the next free number. "Bedroom" → "Bedroom 2"; "Bedroom 2" → "Bedroom 3". */
export function copyName(name: string, taken: readonly string[]): string {
  const [, stem = name, figures] = /^(.*?)(?:\s+(\d{1,4}))?$/.exec(name) ?? []
  const used = new Set(taken)
  let number = figures ? Number(figures) + 1 : 2
  while (used.has(numbered(stem, number))) number += 1
  return numbered(stem, number)
}

function numbered(stem: string, number: number): string {
  const ending = ` ${number}`
  return stem.slice(0, NAME_MAX - ending.length) + ending
}
