export interface MessagePart {
  text: string
  /** Where in this app the text leads, where it is a link to one of its pages. */
  to: string | null
}

const LINK = /https?:\/\/[^\s<>"]+/g
const OWN_PATHS = ['/accept-invitation', '/reset-password']

/**
 * The text of a message, cut at its links. A link to a page of the app opens in the app, whatever address the server thinks it has;
 * any other stays text, because nothing that was mailed should lead out of here by a click.
 */
export function messageParts(text: string): MessagePart[] {
  const parts: MessagePart[] = []
  let end = 0
  for (const match of text.matchAll(LINK)) {
    parts.push({ text: text.slice(end, match.index), to: null }, { text: match[0], to: ownPath(match[0]) })
    end = match.index + match[0].length
  }
  parts.push({ text: text.slice(end), to: null })
  return parts.filter((part) => part.text !== '')
}

function ownPath(link: string): string | null {
  if (!URL.canParse(link)) return null
  const { pathname, search } = new URL(link)
  return OWN_PATHS.includes(pathname) ? pathname + search : null
}
