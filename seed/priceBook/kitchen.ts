import { priceTable } from './priceTable.ts'

/** Cabinets, counters, sink. */
export const kitchenCabinetItems = priceTable(
  { system: 'kitchen', trade: 'cabinets', priceDate: '2026-01-12' },
  `
  key                        | name                                        | unit | uniformat | own hands   | hired        | labor % | waste % | package | minimum | hours | room formula | house formula
  kitchen/base-cabinet-stock | Base cabinets, stock                        | lf   | C1030     | 120 165 230 | 230 310 430  | 34      | 0       |         | 900     | 0.9   | 12           | 12
    Ready-made boxes, set, leveled, filler and toe kick; counter apart.
  kitchen/wall-cabinet-stock | Wall cabinets, stock                        | lf   | C1030     | 95 130 185  | 185 250 350  | 36      | 0       |         | 900     | 0.9   | 10           | 10
    Thirty inches high, on blocking or studs.
  kitchen/base-cabinet-made  | Base cabinets, made to order                | lf   | C1030     | 290 400 560 | 460 620 860  | 28      | 0       |         | 1500    | 1     | 12           | 12
    Plywood boxes, soft closing.
  kitchen/wall-cabinet-made  | Wall cabinets, made to order                | lf   | C1030     | 230 320 450 | 380 510 700  | 28      | 0       |         | 1500    | 1     | 10           | 10
    As the base cabinets.
  kitchen/tall-cabinet       | Tall cabinet, pantry                        | each | C1030     | 380 540 780 | 650 900 1250 | 32      | 0       |         | 450     | 3     | 1            | 1
    Eighteen to twenty-four inches wide.
  kitchen/cabinet-reface     | Cabinets refaced                            | lf   | C1030     | 70 105 155  | 190 265 380  | 52      | 0       |         | 1800    | 1.6   | 20           | 20
    New doors, drawer fronts, skins on sound boxes.
  kitchen/cabinet-paint      | Cabinets painted                            | lf   | C1030     | 5 8 12      | 62 90 135    | 88      | 0       |         | 900     | 1.4   | 20           | 20
    Cleaned, bonding primer, two sprayed coats. Old paint is tested first.
  kitchen/cabinet-repair     | Cabinet doors, hinges and drawers put right | each | C1030     | 9 15 26     | 42 65 100    | 78      | 0       |         | 180     | 0.6   | 8            | 8
    One door or drawer.
  kitchen/cabinet-pulls      | Cabinet pulls                               | each | C1030     | 3 5 9       | 9 14 22      | 62      | 0       |         | 150     | 0.15  | 24           | 24
    Drilled with a jig.
  kitchen/cabinets-out       | Old cabinets and counter out                | lf   | F2010     | 0.5 1 2     | 24 36 55     | 92      | 0       |         | 350     | 0.5   | 20           | 20
    Capped water, drain, gas and wires by their trades first.
  kitchen/counter-laminate   | Laminate counter                            | lf   | E2010     | 24 34 48    | 52 72 104    | 44      | 5       |         | 450     | 0.6   | 12           | 12
    Ready-formed with back splash, end caps, sink cut-out.
  kitchen/counter-wood       | Wood block counter                          | sf   | E2010     | 26 36 52    | 58 78 110    | 42      | 5       |         | 600     | 0.5   | 24           | 24
    Inch and a half, oiled.
  kitchen/counter-stone      | Stone or quartz counter                     | sf   | E2010     |             | 68 92 130    | 40      | 5       |         | 1800    | 0     | 26           | 26
    Measured, cut, polished edge, sink cut-out, set.
  kitchen/splash-tile        | Back-splash tile                            | sf   | C3010     | 5 8 13      | 19 27 40     | 64      | 10      | 10 box  | 500     | 0.45  | 28           | 28
    Ceramic tile, thin-set, grout, outlets extended.
  kitchen/shelf-open         | Open shelf                                  | lf   | C1030     | 9 14 22     | 30 44 66     | 60      | 0       |         | 150     | 0.4   | 6            | 6
    Hardwood on brackets.
  `,
)

/** Kitchen plumbing. */
export const kitchenFixtureItems = priceTable(
  { system: 'kitchen', trade: 'plumbing', priceDate: '2026-01-12' },
  `
  key                    | name                        | unit | uniformat | own hands   | hired         | labor % | waste % | package | minimum | hours | room formula | house formula
  kitchen/sink-steel     | Stainless sink, drop-in     | each | D2010     | 130 190 280 | 360 490 690   | 48      | 0       |         | 280     | 3     | 1            | 1
    Double bowl, strainers, trap; faucet apart.
  kitchen/faucet         | Kitchen faucet              | each | D2010     | 85 140 230  | 240 350 520   | 48      | 0       |         | 220     | 1.5   | 1            | 1
    Pull-down, connectors.
  kitchen/disposer       | Waste disposer              | each | D2010     | 95 140 210  | 270 370 530   | 50      | 0       |         | 220     | 1.8   | 1            | 1
    Half horse; outlet apart.
  kitchen/rough-in-moved | Sink moved, pipes and drain | each | D2030     |             | 950 1450 2200 | 76      | 0       |         | 950     | 0     | 1            | 1
    To eight feet, with vent.
  `,
)

/** Appliances. */
export const applianceItems = priceTable(
  { system: 'kitchen', trade: 'general', priceDate: '2026-01-19' },
  `
  key                    | name                        | unit | uniformat | own hands     | hired         | labor % | waste % | package | minimum | hours | room formula | house formula
  kitchen/range-electric | Electric range              | each | E1090     | 580 760 1050  | 680 880 1200  | 12      | 0       |         | 120     | 1.5   | 1            | 1
    Thirty inches, cord, anti-tip bracket.
  kitchen/range-gas      | Gas range                   | each | E1090     |               | 850 1100 1500 | 18      | 0       |         | 200     | 0     | 1            | 1
    Thirty inches, connector and leak test by the licensed trade, anti-tip bracket.
  kitchen/range-hood     | Range hood, ducted outdoors | each | E1090     | 130 210 340   | 430 620 900   | 54      | 0       |         | 300     | 5     | 1            | 1
    Hood, duct, wall or roof cap.
  kitchen/refrigerator   | Refrigerator                | each | E1090     | 780 1050 1450 | 830 1120 1550 | 6       | 0       |         | 80      | 1     | 1            | 1
    Eighteen to twenty-one cubic feet.
  kitchen/dishwasher     | Dishwasher                  | each | E1090     | 430 580 800   | 620 810 1100  | 24      | 0       |         | 200     | 3     | 1            | 1
    Connected to water, drain and a circuit that is there.
  kitchen/microwave      | Microwave over the range    | each | E1090     | 210 290 410   | 340 450 620   | 30      | 0       |         | 180     | 2.5   | 1            | 1
    Vented outdoors where a duct is there.
  `,
)
