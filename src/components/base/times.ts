const day = new Intl.DateTimeFormat('en-US', { dateStyle: 'medium' })
const dayAndTime = new Intl.DateTimeFormat('en-US', { dateStyle: 'medium', timeStyle: 'short' })

/** "Mar 4, 2025", in the reader's own time zone. */
export function dayText(iso: string): string {
  return day.format(new Date(iso))
}

/** "Mar 4, 2025, 10:20 AM", in the reader's own time zone. */
export function timeText(iso: string): string {
  return dayAndTime.format(new Date(iso))
}
