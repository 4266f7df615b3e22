/** 7.09 → "7 h", 0.4 → "0.4 h": nobody plans their own work in minutes. */
export function hoursText(hours: number): string {
  const figure = hours < 1 ? Math.max(0.1, Math.round(hours * 10) / 10) : Math.round(hours)
  return `${figure.toLocaleString('en-US')} h`
}
