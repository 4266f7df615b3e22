import { priceTable } from './priceTable.ts'

/** Siding. */
export const sidingItems = priceTable(
  { system: 'siding', trade: 'siding', priceDate: '2026-02-18' },
  `
  key                       | name                              | unit | uniformat | own hands      | hired          | labor % | waste % | package    | minimum | hours | room formula | house formula
  siding/wash               | Outside walls washed              | sf   | B2010     | 0.02 0.03 0.05 | 0.22 0.32 0.48 | 88      | 0       |            | 250     | 0.006 |              | outside_wall_area
    Soft wash with cleaner. No high pressure on old wood, brick or suspect board.
  siding/vinyl              | Vinyl siding                      | sf   | B2010     | 1.7 2.2 2.9    | 5.2 6.8 9      | 58      | 10      | 200 carton | 1200    | 0.07  |              | outside_wall_area
    Siding, starter, corners and J-channel over house wrap.
  siding/fiber-cement       | Fiber-cement lap siding           | sf   | B2010     | 2.4 3.1 4.1    | 8.5 11 14.5    | 62      | 10      |            | 1800    | 0.11  |              | outside_wall_area
    Primed lap, trim boards at corners, caulk. Paint is its own line.
  siding/engineered-wood    | Engineered wood lap siding        | sf   | B2010     | 2.2 2.9 3.8    | 7.4 9.6 12.5   | 60      | 10      |            | 1500    | 0.09  |              | outside_wall_area
    Pre-finished lap with trims.
  siding/wood-lap-part      | Wood lap siding, part replaced    | sf   | B2010     | 3.6 5 7        | 12 17 24       | 66      | 12      |            | 450     | 0.2   |              | outside_wall_area * 0.05
    Matching boards, primed on all sides, laced into the old.
  siding/shingles-part      | Wood wall shingles, part replaced | sf   | B2010     | 4 5.6 7.8      | 13 18 26       | 66      | 10      | 25 bundle  | 450     | 0.18  |              | outside_wall_area * 0.05
    Matching shingles laced into the old courses.
  siding/cover-cement-board | Old cement-board siding covered   | sf   | B2010     |                | 7.5 10 14      | 56      | 10      |            | 2500    | 0     |              | outside_wall_area
    Suspect siding is left undisturbed; foam board and new siding hung over it by a firm that knows the rules.
  siding/house-wrap         | House wrap                        | sf   | B2010     | 0.14 0.19 0.26 | 0.45 0.62 0.9  | 64      | 8       | 900 roll   | 250     | 0.008 |              | outside_wall_area
    Wrap and tape, laps shingled.
  siding/gable-boards       | Gable boards replaced             | sf   | B2010     | 3 4.2 6        | 11 15.5 22     | 66      | 10      |            | 500     | 0.18  |              | gable_area
    Boards, wrap and a new frieze from a staging.
  siding/stucco-patch       | Stucco patched                    | sf   | B2010     | 1.6 2.6 4.2    | 11 17 28       | 82      | 5       |            | 450     | 0.3   |              | 30
    Loose stucco off, lath, three coats, texture near to the old.
  siding/shutters           | Shutters, pair                    | set  | B2010     | 60 95 150      | 150 220 330    | 45      | 0       |            | 180     | 1     |              | 4
    Composite pair, fixed.
  `,
)

/** Outside paint and masonry face. */
export const outsidePaintItems = priceTable(
  { system: 'siding', trade: 'painting', priceDate: '2026-02-25' },
  `
  key                    | name                                 | unit | uniformat | own hands      | hired         | labor % | waste % | package    | minimum | hours | room formula | house formula
  siding/paint           | Outside walls painted, one coat      | sf   | B2010     | 0.13 0.17 0.23 | 0.75 1.05 1.5 | 80      | 5       | 300 gallon | 600     | 0.012 |              | outside_wall_area * 2
    Key the area times the coats. Light preparation of sound paint; failing old paint is the lead-safe line.
  siding/paint-lead-safe | Failing old paint, lead-safe repaint | sf   | B2010     |                | 3.2 4.6 6.8   | 84      | 0       |            | 2500    | 0     |              | outside_wall_area
    Certified firm: ground cover, wet work, clean-up checked, prime and two coats.
  siding/prime-bare-wood | Bare wood primed                     | sf   | B2010     | 0.14 0.19 0.26 | 0.7 1 1.4     | 78      | 5       | 300 gallon | 300     | 0.012 |              | outside_wall_area * 0.1
    Oil or bonding primer on new or weathered wood.
  siding/trim-paint      | Outside trim painted                 | lf   | B2010     | 0.2 0.3 0.45   | 1.6 2.3 3.4   | 88      | 5       |            | 350     | 0.05  |              | outside_perimeter
    Corner, frieze and casing boards up to ten inches, two coats.
  siding/eaves-paint     | Eaves and fascia painted             | lf   | B2010     | 0.4 0.6 0.9    | 2.6 3.8 5.6   | 86      | 5       |            | 400     | 0.07  |              | eave_length
    Soffit, fascia and rafter tails, two coats.
  siding/caulk           | Outside joints caulked               | lf   | B2010     | 0.25 0.38 0.55 | 1.4 2 3       | 85      | 5       | 30 tube    | 180     | 0.03  |              | outside_perimeter
    Old bead cut out, backer where deep, paintable sealant.
  siding/trim-boards     | Outside trim replaced                | lf   | B2010     | 2.6 3.6 5      | 8.5 12 17     | 66      | 10      | 16 stick   | 300     | 0.15  |              | outside_perimeter * 0.2
    Primed or composite board, nailed, caulked, ready for paint.
  siding/brick-repoint   | Brick repointed                      | sf   | B2010     | 0.8 1.2 1.9    | 9 13.5 20     | 90      | 0       |            | 700     | 0.4   |              | outside_wall_area * 0.05
    Joints raked to three quarters of an inch, soft mortar that suits old brick.
  siding/brick-rebuild   | Brick rebuilt, small area            | sf   | B2010     |                | 28 42 65      | 80      | 5       |            | 900     | 0     |              | 20
    Taken down, cleaned, relaid with new ties.
  siding/brick-lintel    | Steel lintel over an opening         | each | B2010     |                | 450 720 1150  | 78      | 0       |            | 600     | 0     |              | 1
    Shored, rusted angle out, new angle with flashing, brick relaid.
  `,
)
