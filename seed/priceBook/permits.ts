import { priceTable } from './priceTable.ts'

/** Permits, design, engineering. */
export const feeItems = priceTable(
  { system: 'permits', trade: 'professional', priceDate: '2026-01-06' },
  `
  key                    | name                        | unit | uniformat | own hands | hired        | labor % | waste % | package | minimum | hours | room formula | house formula
  permit/building        | Building permit             | lump | B1010     |           | 280 450 800  | 0       | 0       |         | 0       | 0     |              | 1
    The town's fee for work of this size; plan review in.
  permit/electrical      | Electrical permit           | lump | D5010     |           | 90 150 260   | 0       | 0       |         | 0       | 0     |              | 1
    Fee and inspections.
  permit/plumbing        | Plumbing and gas permit     | lump | D2020     |           | 90 150 260   | 0       | 0       |         | 0       | 0     |              | 1
    Fee and inspections.
  permit/mechanical      | Heating permit              | lump | D3020     |           | 80 130 220   | 0       | 0       |         | 0       | 0     |              | 1
    Fee and inspections.
  permit/sewer           | Sewer and street permit     | lump | G3020     |           | 180 320 600  | 0       | 0       |         | 0       | 0     |              | 1
    With the bond where the street is opened.
  permit/drawings        | Measured drawings and plans | sf   | B1010     |           | 1 1.6 2.6    | 100     | 0       |         | 900     | 0     |              | living_area
    Plans enough for the permit.
  permit/engineer-design | Engineer's design, one item | each | B1010     |           | 650 950 1500 | 100     | 0       |         | 650     | 0     |              | 1
    A beam, a foundation repair or an opening, sealed drawing.
  `,
)

/** Disposal, protection, running the job. */
export const jobItems = priceTable(
  { system: 'permits', trade: 'demolition', priceDate: '2026-01-13' },
  `
  key                   | name                            | unit  | uniformat | own hands      | hired          | labor % | waste % | package  | minimum | hours | room formula | house formula
  job/dumpster-20       | Dumpster, twenty yards          | load  | F2010     | 480 620 850    | 480 620 850    | 10      | 0       |          | 0       | 0     |              | 2
    Ten days, three tons; heavy plaster and masonry count extra.
  job/dumpster-10-heavy | Dumpster for masonry, ten yards | load  | F2010     | 420 560 780    | 420 560 780    | 10      | 0       |          | 0       | 0     |              | 1
    Clean masonry or soil.
  job/dump-run          | Dump run, pick-up load          | load  | F2010     | 45 70 110      | 170 250 370    | 62      | 0       |          | 120     | 2.5   |              | 3
    Fee and fuel.
  job/floor-protection  | Floors protected                | sf    | C3020     | 0.12 0.18 0.28 | 0.35 0.52 0.8  | 55      | 10      | 100 roll | 150     | 0.006 | floor_area   | living_area
    Board or paper, taped, on what stays.
  job/dust-walls        | Dust walls and covers, a room   | each  | F2010     | 22 36 58       | 110 165 250    | 72      | 0       |          | 150     | 1.5   | 1            | 4
    Sheeting with a zipper door.
  job/scaffold          | Scaffold for one side           | week  | B2010     |                | 280 420 640    | 35      | 0       |          | 450     | 0     |              | 2
    Set up, rent, taken down.
  job/toilet-portable   | Portable toilet                 | month | D2010     |                | 110 150 210    | 10      | 0       |          | 130     | 0     |              | 2
    Weekly service.
  job/storage-box       | Storage box in the drive        | month | E2020     |                | 130 180 260    | 15      | 0       |          | 180     | 0     |              | 2
    Delivered, rent, taken away.
  job/final-clean       | Clean-up after the work         | sf    | F2010     | 0.04 0.07 0.12 | 0.28 0.42 0.64 | 90      | 0       |          | 220     | 0.008 | floor_area   | living_area
    Measured by floor area: dust, windows, stickers.
  job/supervision       | Supervision, small job          | week  | F2010     |                | 750 1100 1700  | 100     | 0       |          | 750     | 0     |              | 3
    Where no one contractor runs the job.
  `,
)
