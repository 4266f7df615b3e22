import { priceTable } from './priceTable.ts'

/** Inspections. */
export const inspectionItems = priceTable(
  { system: 'inspections', trade: 'inspection', priceDate: '2026-01-08' },
  `
  key                          | name                          | unit | uniformat | own hands | hired       | labor % | waste % | package | minimum | hours | room formula | house formula
  inspection/whole-house       | Whole-house inspection        | each | B1010     |           | 380 480 640 | 100     | 0       |         | 380     | 0     |              | 1
    Licensed inspector, report. Tells what else is there to price.
  inspection/roof              | Roof inspection               | each | B3010     |           | 150 230 360 | 100     | 0       |         | 150     | 0     |              | 1
    On the roof or by camera; tells years left, and whether a layer may be laid over.
  inspection/sewer-camera      | Sewer lateral by camera       | each | G3020     |           | 220 320 470 | 100     | 0       |         | 220     | 0     |              | 1
    Video and a map; tells between nothing, a spot repair and a new line.
  inspection/structural        | Structural engineer's visit   | each | A1010     |           | 450 650 980 | 100     | 0       |         | 450     | 0     |              | 1
    Visit and letter; tells whether a crack or a sag is old or moving.
  inspection/electrical        | Electrician's inspection      | each | D5010     |           | 190 290 430 | 100     | 0       |         | 190     | 0     |              | 1
    Panel, sample of boxes, old wiring traced; tells between a part and a rewire.
  inspection/heating           | Heating inspection            | each | D3070     |           | 150 220 340 | 100     | 0       |         | 150     | 0     |              | 1
    Combustion, heat exchanger, flue; tells between a service and a new plant.
  inspection/chimney           | Chimney by camera             | each | D3020     |           | 190 290 430 | 100     | 0       |         | 190     | 0     |              | 1
    Each flue; tells whether a liner is needed.
  inspection/pest              | Pest and termite inspection   | each | B1010     |           | 95 150 230  | 100     | 0       |         | 95      | 0     |              | 1
    Report for the lender as well.
  inspection/moisture          | Moisture readings, a wet room | each | C3010     | 30 45 70  | 120 180 280 | 100     | 0       |         | 150     | 1     | 1            | 2
    Pin and pinless readings at tub, toilet, window and below; tells how far the rot goes.
  inspection/plumbing-pressure | Water pressure and drain test | each | D2020     |           | 160 240 360 | 100     | 0       |         | 160     | 0     |              | 1
    Static and flow at fixtures, drains loaded.
  inspection/blower-door       | Blower door test              | each | D3070     |           | 260 380 560 | 100     | 0       |         | 260     | 0     |              | 1
    Leaks found with smoke or camera; draft tested.
  inspection/tank-sweep        | Oil tank sweep                | each | G1040     |           | 220 320 480 | 100     | 0       |         | 220     | 0     |              | 1
    Tells whether a tank lies in the yard.
  `,
)

/** Tests. */
export const testItems = priceTable(
  { system: 'inspections', trade: 'inspection', priceDate: '2026-01-08' },
  `
  key                   | name                            | unit | uniformat | own hands | hired       | labor % | waste % | package | minimum | hours | room formula | house formula
  test/asbestos-samples | Asbestos samples and laboratory | each | F2020     |           | 65 95 140   | 60      | 0       |         | 250     | 0     | 1            | 4
    Each sample, taken by an accredited inspector.
  test/lead-survey      | Lead paint survey               | each | F2020     |           | 380 550 820 | 90      | 0       |         | 380     | 0     |              | 1
    Certified inspector, every kind of painted part.
  test/lead-water       | Lead in water, laboratory       | each | D2020     | 22 35 55  | 75 115 170  | 60      | 0       |         | 75      | 0.5   |              | 1
    First draw and flushed.
  test/radon            | Radon test                      | each | F2020     | 16 25 40  | 130 180 260 | 60      | 0       |         | 130     | 0.5   |              | 1
    Two to four days, closed house, lowest lived-in level.
  test/growth           | Suspected growth, samples       | each | F2020     |           | 190 290 440 | 70      | 0       |         | 250     | 0     | 1            | 2
    Surface or air sample with laboratory report.
  test/soil             | Soil sample                     | each | G1040     |           | 160 250 390 | 60      | 0       |         | 250     | 0     |              | 2
    Oil or lead, laboratory report.
  `,
)
