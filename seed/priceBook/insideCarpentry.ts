import { priceTable } from './priceTable.ts'

/** Inside walls and openings. */
export const insideWallItems = priceTable(
  { system: 'inside-walls', trade: 'carpentry', priceDate: '2026-01-15' },
  `
  key                         | name                                     | unit | uniformat | own hands     | hired          | labor % | waste % | package      | minimum | hours | room formula     | house formula
  inside-wall/partition       | Partition, framed and boarded both sides | lf   | C1010     | 13 17 23      | 62 85 120      | 70      | 8       |              | 600     | 1     | length           | 12
    Eight feet high, studs, board, finish; doors, trim, wiring apart.
  inside-wall/partition-out   | Non-bearing wall taken out               | lf   | F2010     | 0.8 1.4 2.4   | 28 42 65       | 90      | 0       |              | 450     | 0.6   | length           | 12
    Only a wall that an engineer or the plans show not to bear. Wiring and heat moved by their trades first.
  inside-wall/bearing-opening | Opening in a bearing wall, with beam     | each | B1010     |               | 3600 5400 8500 | 62      | 0       |              | 3600    | 0     | 1                | 1
    To ten feet: shoring, beam, posts down to footings, made good. Engineer and permit apart.
  inside-wall/opening-cased   | Opening in a non-bearing wall            | each | C1010     | 85 130 200    | 550 820 1250   | 76      | 0       |              | 500     | 9     | 1                | 1
    Framed and cased, to four feet.
  inside-wall/opening-closed  | Doorway closed up                        | each | C1010     | 48 70 105     | 320 480 720    | 78      | 0       |              | 320     | 6     | 1                | 1
    Studs, board both sides, base run through.
  inside-wall/door-widened    | Doorway widened to three feet            | each | C1010     | 90 140 210    | 520 780 1150   | 76      | 0       |              | 480     | 8     | 1                | 1
    Non-bearing; door apart.
  inside-wall/half-wall       | Half wall with cap                       | lf   | C1010     | 11 16 23      | 55 80 118      | 70      | 8       |              | 350     | 0.9   | 6                | 6
    Framed, boarded, wood cap.
  inside-wall/closet-framed   | Closet framed in                         | each | C1010     | 190 270 380   | 950 1400 2050  | 70      | 0       |              | 850     | 16    | 1                | 1
    To eight feet, board and finish; doors and shelf apart.
  inside-wall/soffit-box      | Pipe or duct boxed in                    | lf   | C1010     | 4.5 6.5 9.5   | 26 38 56       | 76      | 8       |              | 280     | 0.5   | 8                | 12
    Framed, boarded, finished.
  inside-wall/blocking-behind | Blocking for rails and cabinets          | each | C1010     | 4 7 11        | 32 48 75       | 82      | 0       |              | 150     | 0.6   | 3                | 6
    Set while the wall is open.
  inside-wall/fire-separation | Fire-rated board at the garage           | sf   | C1010     | 0.7 0.92 1.25 | 2.7 3.6 5      | 70      | 10      | 32 4×8 sheet | 450     | 0.05  | wall_area * 0.25 | 160
    Five-eighths board on the garage side, joints taped. The local code says which rating.
  `,
)

/** Inside doors. */
export const insideDoorItems = priceTable(
  { system: 'inside-doors', trade: 'carpentry', priceDate: '2026-01-15' },
  `
  key                        | name                            | unit | uniformat | own hands   | hired        | labor % | waste % | package | minimum | hours | room formula | house formula
  inside-door/hollow-prehung | Hollow door, prehung            | each | C1020     | 95 130 180  | 290 390 540  | 58      | 0       |         | 350     | 2.5   | doors        | 8
    Door, frame, casing both sides, hinges; lock apart.
  inside-door/solid-prehung  | Solid-core door, prehung        | each | C1020     | 170 240 340 | 400 540 750  | 52      | 0       |         | 350     | 2.8   | doors        | 8
    As the hollow one.
  inside-door/slab           | Door leaf hung in the old frame | each | C1020     | 65 100 155  | 230 330 480  | 64      | 0       |         | 250     | 2.5   | doors        | 4
    Mortised, bored, hung.
  inside-door/lock-set       | Inside lock set                 | each | C1020     | 16 26 42    | 55 82 120    | 58      | 0       |         | 150     | 0.5   | doors        | 8
    Passage or privacy.
  inside-door/adjust         | Inside door eased and adjusted  | each | C1020     | 4 8 14      | 60 92 140    | 90      | 0       |         | 150     | 0.8   | doors        | 8
    Hinges, strike, edge planed. Old paint is tested before it is planed.
  inside-door/paint          | Inside door painted, both faces | each | C1020     | 7 11 17     | 85 125 190   | 88      | 0       |         | 180     | 1.6   | doors        | 8
    Sound modern paint, two coats with frame and casing.
  inside-door/bifold         | Bifold closet doors             | set  | C1020     | 85 130 195  | 240 340 490  | 54      | 0       |         | 250     | 2.2   | 1            | 3
    To five feet, track and pulls.
  inside-door/sliding-closet | Sliding closet doors            | set  | C1020     | 120 180 270 | 280 390 550  | 48      | 0       |         | 250     | 2.2   | 1            | 2
    To six feet.
  inside-door/fire-rated     | Fire-rated door to the garage   | each | C1020     | 240 330 460 | 560 760 1050 | 50      | 0       |         | 450     | 4     | 1            | 1
    Steel, self-closing hinges, threshold.
  `,
)

/** Trim, stairs, closets. */
export const trimItems = priceTable(
  { system: 'inside-doors', trade: 'carpentry', priceDate: '2026-02-02' },
  `
  key                  | name                              | unit | uniformat | own hands      | hired       | labor % | waste % | package  | minimum | hours | room formula    | house formula
  trim/base            | Base trim                         | lf   | C3010     | 1.1 1.6 2.3    | 3.8 5.2 7.4 | 64      | 10      | 16 stick | 250     | 0.07  | base_length     | sum_rooms(base_length)
    Primed, to five inches, coped, caulked.
  trim/base-paint      | Base trim painted                 | lf   | C3010     | 0.12 0.18 0.27 | 1 1.5 2.2   | 88      | 5       |          | 180     | 0.03  | base_length     | sum_rooms(base_length)
    Sound modern paint, two coats.
  trim/casing          | Casing, door or window            | each | C1020     | 22 34 52       | 95 140 205  | 66      | 0       |          | 220     | 1.4   | doors + windows | 12
    One side, with sill and apron at a window.
  trim/casing-paint    | Casing painted, door or window    | each | C1020     | 4 6 10         | 48 72 108   | 90      | 0       |          | 180     | 0.9   | doors + windows | 20
    One side, two coats, sound modern paint.
  trim/trim-lead-safe  | Failing old trim paint, lead-safe | lf   | C3010     |                | 5.5 8 12    | 86      | 0       |          | 600     | 0     | base_length     | 120
    Certified firm, wet work, clean-up checked, two coats.
  trim/picture-rail    | Picture rail matched              | lf   | C3010     | 2.2 3.2 4.8    | 7.5 11 16   | 68      | 10      | 12 stick | 250     | 0.12  | perimeter       | 40
    Milled to the old profile.
  trim/stair-rail      | Stair handrail                    | lf   | C2010     | 7 11 17        | 32 47 70    | 64      | 5       |          | 220     | 0.5   | 14              | 14
    Graspable rail, brackets to blocking.
  trim/stair-balusters | Balusters replaced                | each | C2010     | 7 11 18        | 38 56 84    | 72      | 0       |          | 220     | 0.6   | 6               | 6
    Matched as near as stock allows.
  trim/closet-shelf    | Closet shelf and rod              | each | C1030     | 22 35 55       | 90 135 200  | 66      | 0       |          | 180     | 1.5   | 1               | 4
    Twelve-inch shelf, cleats, rod.
  `,
)
