/** Has the browser save a file that the server made, under its name. */
export function saveFile({ content, fileName }: { content: Blob; fileName: string }): void {
  const address = URL.createObjectURL(content)
  const link = document.createElement('a')
  link.href = address
  link.download = fileName
  link.click()
  // Some browsers read the address only after the click has been handled.
  setTimeout(() => URL.revokeObjectURL(address), 10_000)
}
