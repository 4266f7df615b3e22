/** An element of the grid's own drawing: cells are plain DOM, because a component for each would cost a frame while scrolling. */
export function element<Tag extends keyof HTMLElementTagNameMap>(tag: Tag, className: string, text = ''): HTMLElementTagNameMap[Tag] {
  const made = document.createElement(tag)
  made.className = className
  made.textContent = text
  return made
}

/** Puts text in, leaving the DOM alone where it says the same already. */
export function setText(target: HTMLElement, text: string): void {
  if (target.textContent !== text) target.textContent = text
}
