import { priceTable } from './priceTable.ts'

/** Abatement and mitigation. */
export const abatementItems = priceTable(
  { system: 'hazards', trade: 'abatement', priceDate: '2026-03-30' },
  `
  key                             | name                                         | unit | uniformat | own hands | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  hazard/ceiling-texture-abated   | Textured ceiling abated                      | sf   | F2020     |           | 6 8.5 12.5     | 78      | 0       |         | 2200    | 0     | ceiling_area | sum_rooms(ceiling_area)
    Licensed firm, containment, air tests, disposal. Refinishing apart.
  hazard/ceiling-texture-enclosed | Textured ceiling enclosed                    | sf   | F2020     |           | 4.4 6.2 9      | 70      | 0       |         | 1500    | 0     | ceiling_area | sum_rooms(ceiling_area)
    Licensed firm fixes board below the undisturbed texture; marked in the house file.
  hazard/floor-tile-abated        | Old resilient floor and mastic abated        | sf   | F2020     |           | 5.5 8 12       | 78      | 0       |         | 1800    | 0     | floor_area   | 120
    Licensed firm; covering it undisturbed usually costs less.
  hazard/pipe-wrap-abated         | Pipe insulation abated                       | lf   | F2020     |           | 18 27 42       | 80      | 0       |         | 1500    | 0     |              | 40
    Glove-bag by a licensed firm, new wrap apart.
  hazard/pipe-wrap-encapsulated   | Sound pipe insulation encapsulated           | lf   | F2020     |           | 9 14 21        | 76      | 0       |         | 900     | 0     |              | 40
    Licensed firm, lagging cloth and sealer, labeled.
  hazard/duct-tape-encapsulated   | Duct joint wrap encapsulated                 | each | F2020     |           | 65 100 155     | 78      | 0       |         | 900     | 0     |              | 12
    Licensed firm, each joint.
  hazard/siding-abated            | Cement-board siding abated                   | sf   | F2020     |           | 6 9 13.5       | 76      | 0       |         | 4500    | 0     |              | outside_wall_area
    Licensed firm; new siding apart.
  hazard/vermiculite-removed      | Vermiculite removed                          | sf   | F2020     |           | 9 13.5 20      | 80      | 0       |         | 4500    | 0     |              | footprint_area
    Licensed firm, containment, vacuumed, air tests.
  hazard/lead-encapsulated        | Lead paint encapsulated                      | sf   | F2020     |           | 4.2 6.2 9.2    | 76      | 0       |         | 900     | 0     | wall_area    | 200
    Certified firm, listed coating on sound paint, clearance test.
  hazard/lead-component-replaced  | Lead-painted window or door, removed safely  | each | F2020     |           | 190 290 440    | 84      | 0       |         | 650     | 0     | windows      | 6
    Certified firm, removal and clearance; the new unit apart.
  hazard/growth-remediated        | Suspected growth remediated                  | sf   | F2020     |           | 9 14 22        | 82      | 0       |         | 1500    | 0     | floor_area   | 100
    Remediation firm: containment, cleaned or cut out, dried, clearance. The water is stopped first.
  hazard/radon-system             | Radon mitigation system                      | each | F2020     |           | 1250 1700 2500 | 58      | 0       |         | 1250    | 0     |              | 1
    Certified firm: suction point, fan, pipe above the roof, test afterwards.
  hazard/oil-tank-buried          | Buried oil tank closed                       | each | G1040     |           | 2400 3600 6000 | 74      | 0       |         | 2400    | 0     |              | 1
    Licensed firm: emptied, dug out or filled, soil sample, papers. Tainted soil apart.
  hazard/oil-tank-indoor          | Indoor oil tank removed                      | each | F2020     |           | 650 950 1450   | 78      | 0       |         | 650     | 0     |              | 1
    Pumped, cut, carried out, fill pipe removed.
  hazard/soil-removed             | Tainted soil removed                         | cy   | G1040     |           | 190 290 460    | 62      | 0       |         | 2500    | 0     |              | 10
    Dug, hauled to a licensed place, clean fill, reports.
  hazard/crawl-space-made-safe    | Fouled or wet crawl space made safe to enter | lump | F2020     |           | 650 1050 1800  | 84      | 0       |         | 650     | 0     |              | 1
    Pumped, aired, cleared by a firm that does this, before other trades go in.
  `,
)
