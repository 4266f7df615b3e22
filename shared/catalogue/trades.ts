export const TRADES = [
  { key: 'general', title: 'General' },
  { key: 'demolition', title: 'Demolition and disposal' },
  { key: 'carpentry', title: 'Carpentry' },
  { key: 'masonry', title: 'Masonry and concrete' },
  { key: 'roofing', title: 'Roofing' },
  { key: 'siding', title: 'Siding' },
  { key: 'windows-doors', title: 'Windows and doors' },
  { key: 'insulation', title: 'Insulation' },
  { key: 'drywall', title: 'Wallboard and plaster' },
  { key: 'painting', title: 'Painting' },
  { key: 'flooring', title: 'Flooring' },
  { key: 'tile', title: 'Tile' },
  { key: 'cabinets', title: 'Cabinets and counters' },
  { key: 'plumbing', title: 'Plumbing' },
  { key: 'sewer', title: 'Sewer and excavation' },
  { key: 'electrical', title: 'Electrical' },
  { key: 'heating', title: 'Heating and cooling' },
  { key: 'pest-control', title: 'Pest control' },
  { key: 'abatement', title: 'Hazard abatement' },
  { key: 'site-work', title: 'Site work' },
  { key: 'cleaning', title: 'Cleaning' },
  { key: 'inspection', title: 'Inspection and testing' },
  { key: 'professional', title: 'Design, engineering and permits' },
] as const

export type TradeKey = (typeof TRADES)[number]['key']
export const TRADE_KEYS = TRADES.map((trade) => trade.key) as [TradeKey, ...TradeKey[]]
