import { onScopeDispose, toValue, watchEffect, type MaybeRefOrGetter } from 'vue'

/**
 * The running head and foot of the printed pages: what this is on the left, the page of pages on the right. It is a style sheet of its own,
 * because only a style sheet can write into the margin of a page, and none that is fixed can know the house's name.
 */
export function usePrintHead(words: MaybeRefOrGetter<string>): void {
  if (!('adoptedStyleSheets' in document)) return
  const sheet = new CSSStyleSheet()
  document.adoptedStyleSheets = [...document.adoptedStyleSheets, sheet]
  watchEffect(() => {
    const box = 'font: 8pt Inter, sans-serif; color: #555'
    sheet.replaceSync(`@page {
      @top-left { content: ${cssText(toValue(words))}; ${box} }
      @bottom-right { content: "Page " counter(page) " of " counter(pages); ${box} }
    }`)
  })
  onScopeDispose(() => {
    document.adoptedStyleSheets = document.adoptedStyleSheets.filter((adopted) => adopted !== sheet)
  })
}

/** A CSS string: what could end it early is written as its code point. */
function cssText(words: string): string {
  return `"${words.replace(/[^\p{L}\p{N} .,·:–-]/gu, (character) => `\\${(character.codePointAt(0) ?? 32).toString(16)} `)}"`
}
