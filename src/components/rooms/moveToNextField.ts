/**
 * Enter as on a calculator: on to the next field of the form. A field that has done its own thing with the key (`defaultPrevented`), a text area and a
 * button keep theirs; a dropdown goes on too, because it opens with the space bar.
 */
export function moveToNextField(form: HTMLElement, event: KeyboardEvent): void {
  const from = event.target
  const isField = from instanceof HTMLInputElement || from instanceof HTMLSelectElement
  if (event.defaultPrevented || event.isComposing || !isField) return
  event.preventDefault()
  const fields = fieldsOf(form)
  const next = fields[fields.indexOf(from) + (event.shiftKey ? -1 : 1)]
  focusField(next)
}

/** Puts the cursor in a field, its content selected so that typing replaces it. */
export function focusField(field: Element | null | undefined): void {
  if (!(field instanceof HTMLElement)) return
  field.focus()
  if (field instanceof HTMLInputElement && field.type !== 'checkbox' && field.type !== 'radio') field.select()
}

/** The fields of a form in order. Radio buttons and switches are passed over, they have their own keys, and so is what is marked `data-passed-over`. */
function fieldsOf(form: HTMLElement): Element[] {
  return [...form.querySelectorAll<HTMLElement>('input, select, textarea')].filter((field) => {
    const isOff = field.matches(':disabled, [tabindex="-1"], [data-passed-over]')
    const isPressed = field.matches('[type="radio"], [type="checkbox"]')
    return !isOff && !isPressed
  })
}
