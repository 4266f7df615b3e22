import { regionTable, type RegionItem } from './regionTable.ts'

const harborItems = regionTable(
  'merrow-harbor',
  '2026-04-21',
  `
  key                           | own hands     | hired
  roof/shingles-laminated       | 132 158 195   | 430 525 670
    Harbor: six nails a shingle and sealed edges against the wind.
  roof/shingles-three-tab       | 110 130 156   | 365 445 560
    Harbor: six nails a shingle.
  roof/strip-one-layer          | 9 13 19       | 72 98 138
    Harbor: lowered to the street, little room for a dumpster.
  roof/flat-membrane            | 280 355 465   | 1050 1330 1750
    Harbor: hoisted over the street front.
  roof/ice-barrier              | 1.8 2.3 2.9   | 3.9 5.1 6.8
    Harbor: taken up the rakes as well.
  roof/drip-edge                | 1.1 1.5 2     | 2.8 3.9 5.4
    Harbor: heavier metal against salt.
  roof/gutter                   | 3.8 5.2 7.1   | 9.2 12.4 17.2
    Harbor: coated hangers and screws.
  roof/chimney-repoint          |               | 850 1450 2500
    Harbor: staged from the street.
  siding/paint                  | 0.15 0.2 0.27 | 0.95 1.35 1.95
    Harbor: salt washed off first.
  siding/paint-lead-safe        |               | 4.1 5.9 8.6
    Harbor: netting on the street front.
  siding/wood-lap-part          | 4.1 5.7 8     | 14.5 20.5 29.5
    Harbor: cedar, stainless nails.
  siding/brick-repoint          | 0.9 1.3 2     | 11.5 17 25.5
    Harbor: staged from the street.
  siding/stucco-patch           | 1.7 2.8 4.5   | 13.5 21 34
    Harbor: galvanized lath.
  window/double-hung-vinyl      | 300 395 520   | 700 890 1190
    Harbor: rated for wind.
  window/double-hung-wood       | 590 770 1020  | 1180 1540 2100
    Harbor: matched to the street's old fronts.
  outside-door/steel-entry      | 340 460 640   | 930 1250 1730
    Harbor: coated against salt.
  crawl-space/sump-pump         | 280 395 555   | 1150 1640 2300
    Harbor: high ground water.
  crawl-space/drain-inside      |               | 68 96 136
    Harbor: high ground water.
  foundation/waterproof-outside |               | 165 240 355
    Harbor: dug by hand between row houses.
  sewer/replace-trench          |               | 165 245 370
    Harbor: narrow lots, ledge and tide.
  sewer/street-part             |               | 5800 9000 14500
    Harbor: cobbled streets, night work.
  site/deck-boards              | 5.1 7.2 10.2  | 13.5 19 27
    Harbor: stainless screws.
  job/dumpster-20               | 610 790 1080  | 610 790 1080
    Harbor: with the street permit.
  job/scaffold                  |               | 390 580 880
    Harbor: with the sidewalk shed.
  permit/building               |               | 380 620 1100
    Harbor: the old-town board reads it as well.
  electrical/service-200        |               | 4300 5700 7800
    Harbor: underground feed.
  `,
)

const valleyItems = regionTable(
  'merrow-valley',
  '2026-04-28',
  `
  key                  | own hands   | hired
  foundation/pier      |             | 1700 2300 3300
    Valley: deep clay.
  foundation/wall-beam |             | 800 1120 1600
    Valley: clay pushes.
  heat/central-air     |             | 1650 2200 3050
    Valley: hot summers keep the trade busy.
  site/regrade         | 2.8 4.5 7.2 | 12.5 19 29
    Valley: clay, wheeled in.
  hazard/radon-system  |             | 1350 1850 2700
    Valley: two suction points are usual.
  sewer/reline         |             | 88 126 182
    Valley: two firms compete.
  `,
)

const uplandsItems = regionTable(
  'merrow-uplands',
  '2026-05-05',
  `
  key                              | own hands     | hired
  heat/boiler-gas                  |               | 6600 8800 12200
    Uplands: bottled gas, with regulator.
  heat/furnace-gas                 |               | 4500 5900 8000
    Uplands: bottled gas, with regulator.
  heat/baseboard-electric          | 18 26 37      | 56 80 117
    Uplands: heavier for the cold.
  heat/tune-up                     |               | 150 220 330
    Uplands: with the drive.
  insulation/attic-blown-cellulose | 0.95 1.2 1.5  | 1.8 2.4 3.2
    Uplands: blown to R-60.
  insulation/attic-blown-glass     | 1.05 1.3 1.65 | 1.95 2.55 3.5
    Uplands: blown to R-60.
  roof/ice-barrier                 | 1.9 2.4 3     | 3.3 4.3 5.8
    Uplands: two courses as a rule, key twice the eave.
  roof/metal-panel                 | 225 285 365   | 540 700 920
    Uplands: the usual roof, many crews.
  supply-pipe/service-line         |               | 70 98 145
    Uplands: five feet deep against frost.
  sewer/replace-trench             |               | 118 178 275
    Uplands: ledge.
  site/drive-gravel                | 0.4 0.6 0.9   | 1 1.5 2.3
    Uplands: the pit is near.
  job/dumpster-20                  | 540 700 960   | 540 700 960
    Uplands: long haul.
  inspection/whole-house           |               | 420 530 700
    Uplands: with the drive.
  `,
)

/** Rows that a region prices by itself: what its weather, ground and streets make dearer or cheaper than the factors say. */
export const regionItems: readonly RegionItem[] = [...harborItems, ...valleyItems, ...uplandsItems]
