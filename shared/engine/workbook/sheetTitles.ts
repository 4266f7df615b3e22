/** The five sheets, in the order that a reader turns them. */
export const SHEET_TITLES = {
  summary: 'Summary',
  estimate: 'Estimate',
  rooms: 'Rooms',
  prices: 'Prices used',
  assumptions: 'Assumptions and cautions',
} as const
