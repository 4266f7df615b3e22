import { priceTable } from './priceTable.ts'

/** Windows. */
export const windowItems = priceTable(
  { system: 'windows', trade: 'windows-doors', priceDate: '2026-01-20' },
  `
  key                      | name                           | unit | uniformat | own hands      | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  window/double-hung-vinyl | Double-hung vinyl, replacement | each | B2020     | 260 340 450    | 560 720 960    | 42      | 0       |         | 450     | 2.6   | windows      | windows
    Up to sixteen square feet of opening, set in the old frame, foam, caulk and stops.
  window/double-hung-wood  | Double-hung wood-clad          | each | B2020     | 520 680 900    | 950 1250 1700  | 38      | 0       |         | 600     | 3.2   | windows      | windows
    Wood inside, clad outside, whole unit with new casing.
  window/full-frame        | Whole window with new frame    | each | B2020     | 360 470 620    | 820 1080 1450  | 48      | 0       |         | 600     | 4.5   | windows      | windows
    Old frame out, sill pan, flashing tape, inside and outside casing.
  window/slider            | Sliding window, vinyl          | each | B2020     | 250 330 440    | 560 720 950    | 44      | 0       |         | 450     | 2.6   | windows      | windows
    Up to sixteen square feet.
  window/casement          | Casement window, vinyl         | each | B2020     | 330 430 570    | 650 850 1150   | 42      | 0       |         | 450     | 2.8   | windows      | windows
    One crank-out sash with screen.
  window/picture           | Picture window, fixed          | each | B2020     | 420 580 820    | 850 1150 1600  | 40      | 0       |         | 600     | 4     | 1            | 1
    Up to thirty-two square feet, insulated glass.
  window/bay               | Bay window, unit replaced      | each | B2020     | 1600 2200 3000 | 3400 4600 6400 | 42      | 0       |         | 2500    | 16    | 1            | 1
    Three-part unit on the old seat; roof and seat insulated.
  window/cellar-hopper     | Cellar window, hopper          | each | B2020     | 95 140 200     | 320 450 650    | 60      | 0       |         | 300     | 2.8   | windows      | 4
    Set in the old masonry opening with new buck and sealant.
  window/glass-block       | Cellar window, glass block     | each | B2020     | 110 150 210    | 330 450 620    | 58      | 0       |         | 350     | 3     | windows      | 4
    Ready-made panel with vent, mortared in.
  `,
)

/** Window repair. */
export const windowRepairItems = priceTable(
  { system: 'windows', trade: 'windows-doors', priceDate: '2026-01-27' },
  `
  key                     | name                           | unit | uniformat | own hands   | hired       | labor % | waste % | package | minimum | hours | room formula | house formula
  window/glass-unit       | New insulated glass unit       | each | B2020     | 75 120 180  | 210 300 440 | 50      | 0       |         | 220     | 1.5   | windows      | 2
    For a fogged pane in a sound sash.
  window/sash-pair        | New sash pair and tracks       | each | B2020     | 190 260 350 | 390 520 720 | 44      | 0       |         | 350     | 2     | windows      | windows
    New sashes in the old frame, compression tracks.
  window/pane-reglaze     | Single pane reglazed           | each | B2020     | 14 22 36    | 75 115 170  | 80      | 0       |         | 180     | 1.4   | 2            | 6
    Glass, points and putty. Old putty and paint are for a lead-safe firm.
  window/cord-and-lock    | Cords, locks and lifts renewed | each | B2020     | 12 20 32    | 90 140 210  | 85      | 0       |         | 180     | 1.6   | windows      | windows
    Both sashes freed, corded, made to lock.
  window/storm            | Storm window                   | each | B2020     | 95 135 190  | 190 260 370 | 42      | 0       |         | 220     | 1     | windows      | windows
    Three-track aluminum over a sound wood window.
  window/weatherstrip     | Weatherstrip                   | each | B2020     | 9 15 24     | 55 85 130   | 80      | 0       |         | 150     | 0.8   | windows      | windows
    Spring or tube strip on all meeting edges.
  window/screen           | Screen                         | each | B2020     | 18 28 42    | 45 68 100   | 45      | 0       |         | 90      | 0.5   | windows      | windows
    New frame and mesh, made to size.
  window/sill-repair      | Sill repaired                  | each | B2020     | 25 42 70    | 170 260 400 | 80      | 0       |         | 220     | 3     | 1            | 2
    Rotted part cut back, filled or spliced, primed.
  window/lead-safe-set-up | Lead-safe set-up, each window  | each | F2020     |             | 55 85 140   | 85      | 0       |         | 250     | 0     | windows      | windows
    Certified firm's containment and clean-up check, added to each old window replaced.
  `,
)

/** Egress in sleeping rooms. */
export const egressItems = priceTable(
  { system: 'egress', trade: 'windows-doors', priceDate: '2026-02-03' },
  `
  key                          | name                               | unit | uniformat | own hands   | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  egress/casement-same-opening | Egress casement in the old opening | each | B2020     | 420 560 760 | 850 1150 1550  | 45      | 0       |         | 600     | 4     | 1            | sleeping_rooms
    Crank-out with a wide-opening hinge. Key its clear opening before ordering; the local code decides.
  egress/enlarge-frame-wall    | Opening enlarged, frame wall       | each | B2010     |             | 1600 2300 3300 | 66      | 0       |         | 1400    | 0     | 1            | 1
    Sill cut down or header widened, framed, flashed, siding and inside wall made good. Window apart.
  egress/enlarge-masonry       | Opening enlarged, masonry wall     | each | B2010     |             | 2600 3700 5400 | 70      | 0       |         | 2200    | 0     | 1            | 1
    Sawn opening, lintel, buck, made good both sides. Engineer and permit apart.
  egress/well-with-ladder      | Window well with ladder            | each | G2040     | 380 560 820 | 1500 2200 3200 | 62      | 0       |         | 1200    | 14    | 1            | 1
    Dug, gravel and drain, steel or composite well, ladder rungs.
  egress/well-cover            | Window well cover                  | each | G2040     | 60 95 150   | 140 210 320    | 40      | 0       |         | 120     | 0.8   | 1            | 1
    Clear cover that lifts from inside without a tool.
  egress/step                  | Fixed step below a high sill       | each | C1030     | 25 45 75    | 140 210 320    | 70      | 0       |         | 150     | 1.5   | 1            | 1
    Built-in step. Whether a step may count is for the local code.
  egress/bars-release          | Quick release on window bars       | each | B2020     | 45 75 120   | 190 290 430    | 65      | 0       |         | 180     | 1.5   | windows      | 2
    Inside release without key or tool, or the bars taken off.
  egress/lower-door            | Outside door from a lower bedroom  | each | B2030     |             | 4200 6200 9500 | 66      | 0       |         | 3500    | 0     | 1            | 1
    Cut, lintel, areaway steps and drain, door and lock.
  `,
)

/** Outside doors. */
export const outsideDoorItems = priceTable(
  { system: 'outside-doors', trade: 'windows-doors', priceDate: '2026-02-03' },
  `
  key                           | name                              | unit | uniformat | own hands     | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  outside-door/steel-entry      | Steel entry door, prehung         | each | B2030     | 310 420 580   | 780 1050 1450  | 46      | 0       |         | 500     | 6     | 1            | 2
    Insulated door, frame, sill, weatherstrip, casing; lock apart.
  outside-door/fiberglass-entry | Fiberglass entry door, prehung    | each | B2030     | 480 680 980   | 1050 1450 2100 | 40      | 0       |         | 500     | 6     | 1            | 1
    With half light; lock apart.
  outside-door/wood-refinish    | Wood entry door refinished        | each | B2030     | 35 55 85      | 280 420 640    | 88      | 0       |         | 250     | 7     | 1            | 1
    Sound modern finish only; old paint is for a lead-safe firm.
  outside-door/patio-slider     | Sliding patio door, six feet      | each | B2030     | 750 1050 1500 | 1700 2300 3200 | 40      | 0       |         | 1000    | 8     | 1            | 1
    Insulated glass, pan, flashing, casing both sides.
  outside-door/storm            | Storm door                        | each | B2030     | 170 240 340   | 340 470 660    | 42      | 0       |         | 250     | 2.5   | 1            | 2
    Full view with closer.
  outside-door/adjust           | Door adjusted and weatherstripped | each | B2030     | 18 30 48      | 120 180 270    | 82      | 0       |         | 150     | 1.6   | 1            | 2
    Hinges set, strike moved, strip and sweep renewed.
  outside-door/sill             | Door sill and threshold replaced  | each | B2030     | 40 65 105     | 230 350 540    | 76      | 0       |         | 250     | 3.5   | 1            | 1
    Rot cut out below the sill, pan flashing, new threshold.
  outside-door/lock-set         | Lock and dead bolt                | set  | B2030     | 55 85 130     | 140 200 290    | 45      | 0       |         | 120     | 1     | 1            | 2
    Keyed alike; deadlock without a key on the inside.
  outside-door/cellar-hatch     | Steel cellar hatch                | each | B2030     | 620 820 1100  | 1250 1700 2400 | 48      | 0       |         | 900     | 8     |              | 1
    Sloped steel doors on the old curb.
  outside-door/garage-overhead  | Overhead garage door              | each | B2030     | 620 850 1200  | 1150 1550 2150 | 38      | 0       |         | 650     | 8     |              | 1
    Sectional steel, nine by seven, springs and tracks.
  outside-door/garage-opener    | Garage door opener                | each | B2030     | 190 260 360   | 390 520 700    | 45      | 0       |         | 250     | 3.5   |              | 1
    With edge sensors and key pad.
  `,
)
