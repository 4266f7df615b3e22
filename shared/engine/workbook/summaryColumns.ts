/** Columns of the summary sheet, for its tables alike. */
export const SUMMARY_COLUMN = { label: 1, setting: 2, takenOn: 3, low: 4, likely: 5, high: 6, hours: 7 } as const
export const SUMMARY_WIDTHS = [36, 13, 30, 16, 16, 16, 11]
