import { priceTable } from './priceTable.ts'

/** Laundry. */
export const laundryItems = priceTable(
  { system: 'laundry', trade: 'plumbing', priceDate: '2026-02-16' },
  `
  key                    | name                       | unit | uniformat | own hands   | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  laundry/hook-up-new    | Laundry hook-up added      | each | D2020     |             | 1250 1850 2800 | 72      | 0       |         | 1250    | 0     | 1            | 1
    Box with valves, standpipe, trap and vent near an existing stack; circuits apart.
  laundry/hook-up-moved  | Laundry hook-up moved      | each | D2020     |             | 950 1450 2200  | 76      | 0       |         | 950     | 0     | 1            | 1
    To fifteen feet in open framing.
  laundry/valve-box      | Valves and hoses renewed   | each | D2020     | 38 58 85    | 180 260 380    | 68      | 0       |         | 180     | 1.8   | 1            | 1
    Quarter-turn valves, braided hoses.
  laundry/dryer-vent     | Dryer vent to the outdoors | each | D3040     | 32 50 78    | 190 280 410    | 74      | 0       |         | 190     | 2.5   | 1            | 1
    Smooth metal, shortest way, hooded cap.
  laundry/utility-sink   | Laundry sink               | each | D2010     | 130 190 280 | 390 540 760    | 54      | 0       |         | 300     | 3.5   | 1            | 1
    Floor-standing, faucet, trap.
  laundry/washer         | Washer                     | each | E1090     | 520 690 950 | 590 780 1050   | 10      | 0       |         | 90      | 1     | 1            | 1
    Front or top loading, set and leveled.
  laundry/dryer-electric | Electric dryer             | each | E1090     | 500 660 900 | 570 750 1000   | 10      | 0       |         | 90      | 1     | 1            | 1
    With cord; circuit apart.
  laundry/pan-and-alarm  | Washer pan and leak alarm  | each | D2090     | 38 58 90    | 150 220 330    | 66      | 0       |         | 130     | 1.2   | 1            | 1
    Above a finished room, with a drain where one can be had.
  `,
)

/** Smells and stains. */
export const smellItems = priceTable(
  { system: 'smells', trade: 'cleaning', priceDate: '2026-02-23' },
  `
  key                | name                                | unit | uniformat | own hands      | hired          | labor % | waste % | package    | minimum | hours | room formula | house formula
  smell/deep-clean   | Whole-house deep clean              | sf   | C3010     | 0.05 0.08 0.13 | 0.45 0.65 0.95 | 90      | 0       |            | 300     | 0.01  | floor_area   | living_area
    Measured by floor area: washed down top to bottom, appliances, windows inside.
  smell/seal-floor   | Subfloor sealed for pet stains      | sf   | C3020     | 0.22 0.32 0.46 | 0.95 1.4 2.1   | 72      | 5       | 150 gallon | 250     | 0.018 | floor_area   | 200
    Enzyme wash, dried, two coats of shellac primer.
  smell/seal-walls   | Walls sealed for smoke              | sf   | C3010     | 0.16 0.23 0.33 | 0.75 1.1 1.6   | 74      | 5       | 250 gallon | 300     | 0.014 | wall_area    | sum_rooms(wall_area)
    Washed first, one coat of shellac or oil primer.
  smell/seal-ceiling | Ceiling sealed for smoke            | sf   | C3030     | 0.16 0.23 0.33 | 0.8 1.2 1.75   | 76      | 5       | 250 gallon | 280     | 0.015 | ceiling_area | sum_rooms(ceiling_area)
    Unbroken, sound surfaces only.
  smell/dry-fog      | Smell treatment, dry fog            | lump | C3010     |                | 450 700 1150   | 82      | 0       |            | 450     | 0     |              | 1
    House empty, aired afterwards; by a cleaning firm.
  smell/haul-out     | Contents hauled out                 | load | F2010     | 45 75 120      | 380 540 780    | 78      | 0       |            | 300     | 6     |              | 2
    A truck of fifteen yards, dump fee in.
  smell/drain-traps  | Dry traps and open drains put right | each | D2030     | 6 10 18        | 95 145 220     | 88      | 0       |            | 140     | 0.7   |              | 3
    Filled, capped or fitted with a trap insert.
  `,
)
