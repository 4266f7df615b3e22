/** Nobody types more words than this for one item; the rest of a pasted text is let go. */
const WORDS_MAX = 8

/** The words of a search in letters and digits alone, which is also all that the index holds. */
export function searchWords(search: string): string[] {
  return (search.toLowerCase().match(/[\p{L}\p{N}]+/gu) ?? []).slice(0, WORDS_MAX)
}
