import { priceTable } from './priceTable.ts'

/** Supply piping. */
export const supplyPipingItems = priceTable(
  { system: 'supply-piping', trade: 'plumbing', priceDate: '2026-02-05' },
  `
  key                         | name                                     | unit | uniformat | own hands   | hired          | labor % | waste % | package   | minimum | hours | room formula | house formula
  supply-pipe/repipe-fixture  | Repipe, each fixture                     | each | D2020     | 75 110 165  | 420 560 760    | 72      | 0       |           | 900     | 5     | 3            | 8
    New plastic tube hot and cold from the main to the stop, old pipe left dead in the wall; wall patching apart.
  supply-pipe/plastic-tube    | Plastic tube, half or three-quarter      | lf   | D2020     | 0.9 1.3 1.9 | 8 11.5 17      | 80      | 10      | 100 roll  | 350     | 0.1   | 20           | 60
    With supports and fittings, in open framing.
  supply-pipe/copper          | Copper pipe, half or three-quarter       | lf   | D2020     | 4.2 5.6 7.6 | 17 24 34       | 70      | 8       | 10 length | 350     | 0.25  | 20           | 40
    Soldered or pressed, in open framing.
  supply-pipe/galvanized-part | Old steel pipe, part replaced            | lf   | D2020     |             | 24 34 50       | 74      | 5       |           | 450     | 0     | 12           | 20
    Cut out to sound thread, tube and adapters. Old steel breaks where it is touched: take more than seems needed.
  supply-pipe/main-shut-off   | Main shut-off valve                      | each | D2020     |             | 280 420 650    | 74      | 0       |           | 250     | 0     |              | 1
    Full-port ball valve at the meter, bonded around.
  supply-pipe/service-line    | Water service line, meter to house       | lf   | G3010     |             | 62 88 130      | 66      | 0       |           | 2200    | 0     |              | 45
    Plastic or copper in a trench or pulled; utility's fees and street work apart.
  supply-pipe/lead-service    | Lead service line replaced, owner's side | each | G3010     |             | 3200 4800 7500 | 68      | 0       |           | 3200    | 0     |              | 1
    By a licensed plumber with the utility; filter jug and flushing afterwards.
  supply-pipe/hose-bibb       | Frost-proof hose bibb                    | each | D2020     | 28 42 62    | 190 280 410    | 78      | 0       |           | 180     | 2     |              | 2
    With vacuum breaker.
  supply-pipe/regulator       | Pressure regulator                       | each | D2020     |             | 320 450 640    | 62      | 0       |           | 250     | 0     |              | 1
    Where street pressure is over 80 psi.
  supply-pipe/stop-valve      | Fixture stop and connector               | each | D2020     | 11 17 26    | 75 115 170     | 80      | 0       |           | 180     | 0.6   | 2            | 8
    Quarter-turn stop, braided connector.
  supply-pipe/expansion-tank  | Expansion tank                           | each | D2020     |             | 190 280 410    | 64      | 0       |           | 180     | 0     |              | 1
    Where a check valve or regulator closes the system.
  supply-pipe/filter          | Whole-house filter                       | each | D2020     | 95 150 240  | 380 540 780    | 62      | 0       |           | 280     | 3.5   |              | 1
    Housing, by-pass, first cartridges.
  supply-pipe/leak-search     | Leak found and stopped                   | each | D2020     |             | 220 380 650    | 88      | 0       |           | 220     | 0     | 1            | 1
    Call-out, opening and one repair; closing the wall apart.
  `,
)

/** Drain, waste and vent piping. */
export const drainPipingItems = priceTable(
  { system: 'drain-piping', trade: 'plumbing', priceDate: '2026-02-05' },
  `
  key                          | name                                 | unit | uniformat | own hands | hired           | labor % | waste % | package | minimum | hours | room formula | house formula
  drain-pipe/renew-small-house | Old drain lines renewed, small house | lump | D2030     |           | 5000 7200 10000 | 74      | 0       |         | 5000    | 0     |              | 1
    Stack and branches to kitchen, one bath and laundry in plastic, from above or from an open cellar or crawl space; closing walls apart.
  drain-pipe/fixture-branch    | Drain and vent branch, each fixture  | each | D2030     | 55 85 130 | 480 680 980     | 78      | 0       |         | 600     | 7     | 1            | 8
    Plastic from fixture to stack, vented.
  drain-pipe/stack             | Soil stack replaced                  | lf   | D2030     |           | 110 160 235     | 72      | 0       |         | 1400    | 0     | 10           | 20
    Old iron cut out in lengths, carried, plastic or new iron hung.
  drain-pipe/vent-through-roof | Vent through the roof                | each | D2030     | 45 70 110 | 380 560 820     | 76      | 0       |         | 350     | 5     | 1            | 1
    With boot.
  drain-pipe/trap              | Trap and tail piece renewed          | each | D2030     | 14 22 34  | 110 165 245     | 82      | 0       |         | 160     | 0.9   | 1            | 3
    S-traps and flexible drains out.
  drain-pipe/toilet-flange     | Toilet flange repaired               | each | D2030     | 22 38 62  | 220 340 520     | 82      | 0       |         | 200     | 2.5   | 1            | 1
    New flange or repair ring, wax, bolts. Floor below apart.
  drain-pipe/clean-out         | Clean-out added inside               | each | D2030     |           | 260 390 590     | 74      | 0       |         | 250     | 0     |              | 1
    At the foot of the stack.
  drain-pipe/under-slab        | Drain renewed under the slab         | lf   | D2030     |           | 125 185 280     | 76      | 0       |         | 2200    | 0     |              | 20
    Slab sawn, dug, pipe, tested, filled, patched.
  drain-pipe/floor-drain       | Floor drain and trap                 | each | D2030     |           | 550 850 1300    | 74      | 0       |         | 550     | 0     | 1            | 1
    With trap primer where it stands dry.
  drain-pipe/snake             | Branch drain cleared                 | each | D2030     | 22 35 55  | 170 260 400     | 92      | 0       |         | 170     | 1.5   | 1            | 1
    Cable machine, one branch.
  drain-pipe/hanger            | Pipe hangers and slope corrected     | lf   | D2030     | 1.2 1.9 3 | 9 14 21         | 84      | 0       |         | 220     | 0.2   |              | 30
    Rehung at a quarter inch a foot.
  drain-pipe/ejector           | Sewage ejector pit and pump          | each | D2030     |           | 1900 2700 3900  | 56      | 0       |         | 1900    | 0     | 1            | 1
    Sealed pit, vent, check valve, alarm.
  `,
)

/** Sewer lateral. */
export const sewerItems = priceTable(
  { system: 'sewer', trade: 'sewer', priceDate: '2026-03-12' },
  `
  key                    | name                            | unit | uniformat | own hands   | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  sewer/spot-repair      | Lateral, spot repair            | each | G3020     |             | 2200 3400 5400 | 70      | 0       |         | 2200    | 0     |              | 1
    One dig to six feet, a length replaced, filled and seeded. By camera first.
  sewer/reline           | Lateral relined                 | lf   | G3020     |             | 95 135 195     | 55      | 0       |         | 4200    | 0     |              | 60
    Cured liner after cleaning; the pipe must still be round.
  sewer/replace-trench   | Lateral replaced in open trench | lf   | G3020     |             | 110 165 250    | 72      | 0       |         | 4500    | 0     |              | 60
    To six feet deep in lawn; paving, trees and street apart.
  sewer/burst            | Lateral replaced by bursting    | lf   | G3020     |             | 120 170 250    | 62      | 0       |         | 5500    | 0     |              | 60
    Two pits, new pipe pulled through the old.
  sewer/street-part      | Street opening and tap          | each | G3020     |             | 3800 6000 9800 | 66      | 0       |         | 3800    | 0     |              | 1
    Traffic control, opening, tap, paving, the town's fee.
  sewer/clean-out        | Two-way clean-out outside       | each | G3020     |             | 850 1250 1850  | 70      | 0       |         | 850     | 0     |              | 1
    Dug at the house wall, brought to grade.
  sewer/backwater-valve  | Backwater valve                 | each | G3020     |             | 1200 1800 2700 | 68      | 0       |         | 1200    | 0     |              | 1
    In an accessible box, for a cellar below street level.
  sewer/root-clearing    | Roots cut and line washed       | each | G3020     |             | 320 480 720    | 90      | 0       |         | 320     | 0     |              | 1
    Cutter head and water, then camera again.
  sewer/surface-restored | Lawn or paving restored         | sf   | G2050     | 0.5 0.9 1.5 | 2.5 4 6.5      | 70      | 5       |         | 350     | 0.03  |              | 200
    Topsoil and seed, or base and patch.
  `,
)

/** Water heater. */
export const waterHeaterItems = priceTable(
  { system: 'water-heater', trade: 'plumbing', priceDate: '2026-02-12' },
  `
  key                        | name                               | unit | uniformat | own hands   | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  water-heater/gas-40        | Gas water heater, 40 gallons       | each | D2020     |             | 1450 1850 2450 | 48      | 0       |         | 1450    | 0     |              | 1
    Heater, pan, valve, connectors, old one away. Licensed trade; draft tested.
  water-heater/gas-50        | Gas water heater, 50 gallons       | each | D2020     |             | 1600 2050 2700 | 46      | 0       |         | 1600    | 0     |              | 1
    As the smaller one.
  water-heater/electric-50   | Electric water heater, 50 gallons  | each | D2020     | 520 680 900 | 1300 1700 2250 | 52      | 0       |         | 1100    | 6     |              | 1
    Heater, pan, valve, connectors on a circuit that is there.
  water-heater/heat-pump-50  | Heat-pump water heater, 50 gallons | each | D2020     |             | 2700 3500 4600 | 40      | 0       |         | 2700    | 0     |              | 1
    With condensate drain; circuit apart.
  water-heater/tankless-gas  | Tankless gas water heater          | each | D2020     |             | 3200 4300 5900 | 46      | 0       |         | 3200    | 0     |              | 1
    With vent and isolation valves; larger gas pipe apart.
  water-heater/flush         | Heater flushed and checked         | each | D2020     | 8 14 24     | 120 180 270    | 92      | 0       |         | 120     | 1.5   |              | 1
    Drained, flushed, anode looked at.
  water-heater/relief-valve  | Relief valve and discharge pipe    | each | D2020     |             | 150 230 350    | 76      | 0       |         | 150     | 0     |              | 1
    New valve, full-size pipe to a safe place.
  water-heater/vent-liner    | Chimney liner for the heater       | lf   | D3020     |             | 48 70 102      | 55      | 0       |         | 900     | 0     |              | 25
    Stainless or aluminum liner with cap, sized for what is left on it.
  water-heater/pan-and-drain | Pan and drain line                 | each | D2020     | 35 55 85    | 180 270 400    | 72      | 0       |         | 160     | 2     |              | 1
    For a heater above finished rooms.
  `,
)
