import { priceTable } from './priceTable.ts'

/** Heating and cooling plant. */
export const heatingPlantItems = priceTable(
  { system: 'heating-cooling', trade: 'heating', priceDate: '2026-03-05' },
  `
  key                       | name                                       | unit | uniformat | own hands   | hired           | labor % | waste % | package | minimum | hours | room formula | house formula
  heat/furnace-gas          | Gas furnace, high efficiency               | each | D3020     |             | 4300 5600 7600  | 46      | 0       |         | 4300    | 0     |              | 1
    Up to 80,000 Btu an hour, plastic vent, drain, thermostat, start-up.
  heat/furnace-gas-standard | Gas furnace, chimney vented                | each | D3020     |             | 3300 4300 5800  | 46      | 0       |         | 3300    | 0     |              | 1
    Where the chimney is lined and stays in use.
  heat/boiler-gas           | Gas boiler                                 | each | D3020     |             | 6200 8200 11500 | 48      | 0       |         | 6200    | 0     |              | 1
    Boiler, pump, valves, expansion tank, old one away.
  heat/boiler-repair        | Boiler serviced, worn parts renewed        | each | D3020     |             | 450 750 1300    | 72      | 0       |         | 450     | 0     |              | 1
    Cleaned, controls and relief valve renewed, combustion tested.
  heat/heat-pump-ducted     | Ducted heat pump                           | ton  | D3050     |             | 3600 4700 6400  | 42      | 0       |         | 7500    | 0     |              | 2.5
    Outdoor and indoor units, line set, pad, thermostat, on ducts that are there.
  heat/heat-pump-wall       | Wall heat pump, one room                   | each | D3050     |             | 3400 4400 6000  | 45      | 0       |         | 3400    | 0     | 1            | 1
    Outdoor unit and one wall unit up to a ton; circuit apart.
  heat/heat-pump-wall-head  | Further wall unit on the same outdoor unit | each | D3050     |             | 1800 2400 3300  | 45      | 0       |         | 1800    | 0     | 1            | 2
    Line set to forty feet, drain.
  heat/central-air          | Central air conditioner added              | ton  | D3030     |             | 1500 2000 2800  | 42      | 0       |         | 4200    | 0     |              | 2.5
    Coil on the furnace, outdoor unit, pad; circuit apart.
  heat/window-air           | Window air conditioner                     | each | D3050     | 210 300 430 | 290 400 560     | 22      | 0       |         | 120     | 1     | 1            | 2
    With bracket and side panels.
  heat/tune-up              | Furnace or heat pump serviced              | each | D3070     |             | 130 190 290     | 92      | 0       |         | 130     | 0     |              | 1
    Cleaned, filter, combustion or charge tested, report.
  heat/chimney-liner        | Chimney liner for heating                  | lf   | D3020     |             | 58 85 125       | 52      | 0       |         | 1200    | 0     |              | 28
    Stainless liner, cap and tee, insulated where it must be.
  `,
)

/** Ducts, radiators, room heaters, controls. */
export const heatingRoomItems = priceTable(
  { system: 'heating-cooling', trade: 'heating', priceDate: '2026-03-05' },
  `
  key                       | name                            | unit | uniformat | own hands   | hired       | labor % | waste % | package | minimum | hours | room formula | house formula
  heat/duct-run             | Duct run added                  | each | D3040     |             | 380 580 880 | 66      | 0       |         | 380     | 0     | 1            | 2
    Six-inch supply to thirty feet, boot and register.
  heat/duct-main            | Main duct replaced              | lf   | D3040     |             | 32 47 70    | 64      | 8       |         | 900     | 0     |              | 40
    Sheet metal, sealed; suspect wrap tested first.
  heat/duct-clean           | Ducts cleaned                   | lump | D3040     |             | 380 550 820 | 92      | 0       |         | 380     | 0     |              | 1
    Under suction, registers washed. Not where growth is suspected inside.
  heat/register             | Register or grille renewed      | each | D3040     | 9 15 26     | 35 52 80    | 55      | 0       |         | 120     | 0.25  | 2            | 14
    Same size, painted steel.
  heat/radiator-moved       | Radiator moved or reset         | each | D3050     |             | 320 490 740 | 80      | 0       |         | 320     | 0     | 1            | 2
    Drained, piped, valve renewed, bled.
  heat/radiator-valve       | Radiator valve and vent         | each | D3050     | 28 42 62    | 130 195 290 | 76      | 0       |         | 220     | 1.5   | 1            | 8
    Valve or thermostatic head, vent.
  heat/radiator-out         | Radiator taken out, pipe capped | each | D3050     |             | 190 290 440 | 90      | 0       |         | 220     | 0     | 1            | 1
    Carried to the curb.
  heat/baseboard-electric   | Electric baseboard heater       | lf   | D3050     | 17 24 34    | 58 82 120   | 58      | 0       |         | 300     | 0.4   | 6            | 24
    240 volt, with wall thermostat; circuit apart.
  heat/wall-heater-electric | Electric wall heater with fan   | each | D3050     | 130 190 280 | 360 520 760 | 55      | 0       |         | 300     | 2.5   | 1            | 1
    For a bath or an addition; circuit apart.
  heat/heater-moved         | Wall heater moved               | each | D3050     |             | 290 440 660 | 84      | 0       |         | 290     | 0     | 1            | 1
    For a wall that is taken out: cable or gas made safe by the licensed trade first.
  heat/thermostat           | Thermostat, programmable        | each | D3060     | 38 70 130   | 130 200 310 | 50      | 0       |         | 120     | 0.8   |              | 1
    Low voltage.
  heat/gas-pipe             | Gas pipe added                  | lf   | D3010     |             | 24 36 54    | 72      | 0       |         | 350     | 0     | 10           | 20
    Black steel or listed flexible tube, bonded, pressure tested.
  heat/gas-shut-off         | Gas shut-off and connector      | each | D3010     |             | 110 165 250 | 76      | 0       |         | 130     | 0     | 1            | 1
    At an appliance, leak tested.
  `,
)
