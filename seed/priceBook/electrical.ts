import { priceTable } from './priceTable.ts'

/** Service and panel. */
export const electricalServiceItems = priceTable(
  { system: 'electrical', trade: 'electrical', priceDate: '2026-01-22' },
  `
  key                     | name                              | unit | uniformat | own hands | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  electrical/service-200  | Service, 200 amp, with panel      | each | D5010     |           | 3400 4500 6200 | 58      | 0       |         | 3400    | 0     |              | 1
    Mast or lateral end, meter base, main panel, ground rods, circuits moved over. Utility's charges apart.
  electrical/service-100  | Service, 100 amp, with panel      | each | D5010     |           | 2300 3100 4300 | 60      | 0       |         | 2300    | 0     |              | 1
    As the larger one.
  electrical/panel        | Main panel replaced               | each | D5010     |           | 1600 2200 3100 | 60      | 0       |         | 1600    | 0     |              | 1
    Same service, new panel and breakers.
  electrical/sub-panel    | Subpanel                          | each | D5010     |           | 850 1250 1850  | 62      | 0       |         | 850     | 0     |              | 1
    Feeder to forty feet, eight to twelve spaces.
  electrical/grounding    | Grounding and bonding made good   | each | D5010     |           | 380 560 850    | 72      | 0       |         | 350     | 0     |              | 1
    Rods, water-pipe bond, jumper at the meter.
  electrical/service-mast | Service mast repaired             | each | D5010     |           | 550 850 1300   | 66      | 0       |         | 550     | 0     |              | 1
    Mast, weather head, strap; the utility reconnects.
  electrical/surge        | Whole-house surge device          | each | D5010     |           | 260 360 520    | 50      | 0       |         | 220     | 0     |              | 1
    In or beside the panel.
  electrical/panel-tidy   | Panel checked, labeled, tightened | each | D5010     |           | 190 290 440    | 92      | 0       |         | 190     | 0     |              | 1
    Every circuit traced and named.
  `,
)

/** Wiring. */
export const electricalWiringItems = priceTable(
  { system: 'electrical', trade: 'electrical', priceDate: '2026-01-22' },
  `
  key                            | name                                    | unit | uniformat | own hands | hired         | labor % | waste % | package | minimum | hours | room formula | house formula
  electrical/rewire              | Rewire, old house with closed walls     | sf   | D5020     |           | 7 9.5 13.5    | 74      | 0       |         | 4500    | 0     | floor_area   | living_area
    All branch circuits to today's spacing, fished; boxes, plain devices. Patching and panel apart.
  electrical/rewire-open         | Rewire, open walls                      | sf   | D5020     |           | 4.2 5.8 8     | 68      | 0       |         | 2500    | 0     | floor_area   | living_area
    While a room is down to the studs.
  electrical/rewire-room         | Rewire, one room                        | each | D5020     |           | 850 1300 1950 | 74      | 0       |         | 850     | 0     | 1            | 3
    A new circuit, up to six outlets and one switched light, fished.
  electrical/old-wiring-retired  | Old open wiring retired, each run       | each | D5020     |           | 220 340 520   | 84      | 0       |         | 600     | 0     | 2            | 10
    Knob-and-tube run cut off at both ends by the electrician and replaced by cable where it is needed.
  electrical/aluminum-connection | Aluminum connection repaired            | each | D5020     |           | 28 42 62      | 76      | 0       |         | 650     | 0     | 12           | 110
    Listed connector at each outlet, switch and splice.
  electrical/circuit-20          | New 20 amp circuit                      | each | D5020     |           | 380 560 820   | 72      | 0       |         | 350     | 0     | 1            | 2
    Breaker, sixty feet of cable, one outlet.
  electrical/circuit-240         | New 240 volt circuit                    | each | D5020     |           | 550 820 1200  | 66      | 0       |         | 500     | 0     | 1            | 1
    For a range, dryer or heat pump, up to fifty feet.
  electrical/outlet-new          | Outlet added on a circuit that is there | each | D5020     |           | 160 240 360   | 82      | 0       |         | 180     | 0     | 2            | 8
    Fished, old-work box.
  electrical/outlet-grounded     | Two-slot outlet made three-slot         | each | D5020     |           | 75 120 190    | 82      | 0       |         | 180     | 0     | 4            | 16
    Grounded, or protected and so marked.
  electrical/switch-three-way    | Three-way switching at a stair          | set  | D5020     |           | 280 420 620   | 84      | 0       |         | 220     | 0     | 1            | 1
    Switch at each end.
  electrical/box-closed          | Open splices boxed                      | each | D5020     |           | 70 110 170    | 86      | 0       |         | 180     | 0     |              | 6
    Splice into a covered box that can be reached.
  electrical/outdoor-outlet      | Outdoor outlet with cover               | each | D5020     |           | 210 310 460   | 74      | 0       |         | 200     | 0     |              | 2
    Protected, in-use cover.
  electrical/car-outlet          | Outlet for a car                        | each | D5020     |           | 650 950 1500  | 62      | 0       |         | 600     | 0     |              | 1
    Fifty amp circuit, up to forty feet.
  electrical/data-outlet         | Data outlet                             | each | D5030     | 14 22 36  | 130 190 280   | 80      | 0       |         | 150     | 1.5   | 1            | 3
    Cable to a shelf by the panel.
  electrical/temporary           | Temporary power for the work            | lump | D5090     |           | 350 550 850   | 74      | 0       |         | 350     | 0     |              | 1
    Board with protected outlets while the panel is down.
  `,
)

/** Lighting, devices, alarms. */
export const lightingItems = priceTable(
  { system: 'lighting', trade: 'electrical', priceDate: '2026-01-29' },
  `
  key                         | name                                  | unit | uniformat | own hands   | hired       | labor % | waste % | package | minimum | hours | room formula | house formula
  light/ceiling               | Ceiling light replaced                | each | D5020     | 35 60 110   | 130 190 300 | 60      | 0       |         | 150     | 0.8   | 1            | sum_rooms(1)
    Plain LED fixture on the box that is there.
  light/ceiling-new           | Ceiling light added                   | each | D5020     |             | 260 390 580 | 72      | 0       |         | 250     | 0     | 1            | 4
    Box, cable, switch, plain fixture.
  light/recessed              | Recessed LED light                    | each | D5020     |             | 120 175 260 | 68      | 0       |         | 350     | 0     | 4            | 8
    Sealed, rated for insulation, fished from one to the next.
  light/vanity                | Vanity light                          | each | D5020     | 55 95 170   | 170 260 400 | 55      | 0       |         | 150     | 1     | 1            | 1
    On the box that is there.
  light/under-cabinet         | Under-cabinet light                   | lf   | D5020     | 14 21 32    | 38 56 82    | 55      | 0       |         | 250     | 0.3   | 8            | 8
    LED strip in a channel, switched.
  light/outdoor               | Outdoor light                         | each | D5020     | 40 70 120   | 150 220 340 | 58      | 0       |         | 150     | 1     |              | 2
    Wall light by a door, with eye for dusk.
  light/closet                | Closet light                          | each | D5020     | 28 45 75    | 140 210 310 | 68      | 0       |         | 150     | 0.8   | 1            | 3
    Enclosed LED, clear of the shelf.
  light/ceiling-fan           | Ceiling fan with light                | each | D5020     | 130 200 320 | 300 430 640 | 48      | 0       |         | 220     | 2     | 1            | 1
    With a box rated for a fan.
  light/devices-room          | Switches and outlets renewed, a room  | set  | D5020     | 30 48 75    | 170 250 370 | 76      | 0       |         | 180     | 2.5   | 1            | 8
    Tamper-resistant outlets, switches, plates. Not where wiring is aluminum.
  light/device-protected      | Protected outlet (GFCI)               | each | D5020     | 19 27 38    | 95 140 210  | 72      | 0       |         | 150     | 0.6   | 2            | 6
    At kitchen, bath, laundry, cellar, garage, outdoors.
  light/breaker-arc-fault     | Arc-fault breaker                     | each | D5020     |             | 95 140 205  | 48      | 0       |         | 180     | 0     | 1            | 8
    For living and sleeping room circuits.
  light/smoke-alarm           | Smoke alarm, ten-year battery         | each | D5030     | 20 28 40    | 60 90 135   | 62      | 0       |         | 120     | 0.3   | 1            | sleeping_rooms + 3
    One in each sleeping room, one outside, one a storey. Interconnection as the local code asks.
  light/smoke-alarm-wired     | Smoke alarm, wired and interconnected | each | D5030     |             | 160 230 340 | 74      | 0       |         | 300     | 0     | 1            | sleeping_rooms + 3
    Cable fished between alarms, battery behind.
  light/carbon-monoxide-alarm | Carbon monoxide alarm                 | each | D5030     | 26 36 52    | 70 100 150  | 55      | 0       |         | 120     | 0.3   | 1            | 2
    Outside each sleeping area and by the burner.
  light/doorbell              | Doorbell renewed                      | each | D5030     | 28 50 95    | 120 180 280 | 66      | 0       |         | 130     | 1.2   |              | 1
    Transformer, chime, button.
  `,
)
