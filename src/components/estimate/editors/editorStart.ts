/** What an editor begins with: a printable key replaces what stood there, any other way in keeps it. */
export function editorStart(value: string, eventKey: string | null): { text: string; isReplacing: boolean } {
  const isReplacing = eventKey !== null && [...eventKey].length === 1
  return isReplacing ? { text: eventKey, isReplacing } : { text: value, isReplacing }
}
