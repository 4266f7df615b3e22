import { describe, expect, it } from 'vitest'
import { HOUSE_SYSTEMS } from '../../shared/catalogue/houseSystems.ts'
import { findUniformat, UNIFORMAT } from '../../shared/catalogue/uniformat.ts'

/** ASTM E1557-97 as printed in NISTIR 6389 (1999): each group element with its individual elements. */
const PRINTED = `
A Substructure
A10 Foundations: A1010 Standard Foundations; A1020 Special Foundations; A1030 Slab on Grade
A20 Basement Construction: A2010 Basement Excavation; A2020 Basement Walls
B Shell
B10 Superstructure: B1010 Floor Construction; B1020 Roof Construction
B20 Exterior Enclosure: B2010 Exterior Walls; B2020 Exterior Windows; B2030 Exterior Doors
B30 Roofing: B3010 Roof Coverings; B3020 Roof Openings
C Interiors
C10 Interior Construction: C1010 Partitions; C1020 Interior Doors; C1030 Fittings
C20 Stairs: C2010 Stair Construction; C2020 Stair Finishes
C30 Interior Finishes: C3010 Wall Finishes; C3020 Floor Finishes; C3030 Ceiling Finishes
D Services
D10 Conveying: D1010 Elevators & Lifts; D1020 Escalators & Moving Walks; D1090 Other Conveying Systems
D20 Plumbing: D2010 Plumbing Fixtures; D2020 Domestic Water Distribution; D2030 Sanitary Waste; D2040 Rain Water Drainage; D2090 Other Plumbing Systems
D30 HVAC: D3010 Energy Supply; D3020 Heat Generating Systems; D3030 Cooling Generating Systems; D3040 Distribution Systems; D3050 Terminal & Package Units; D3060 Controls & Instrumentation; D3070 Systems Testing & Balancing; D3090 Other HVAC Systems & Equipment
D40 Fire Protection: D4010 Sprinklers; D4020 Standpipes; D4030 Fire Protection Specialties; D4090 Other Fire Protection Systems
D50 Electrical: D5010 Electrical Service & Distribution; D5020 Lighting and Branch Wiring; D5030 Communications & Security; D5090 Other Electrical Systems
E Equipment & Furnishings
E10 Equipment: E1010 Commercial Equipment; E1020 Institutional Equipment; E1030 Vehicular Equipment; E1090 Other Equipment
E20 Furnishings: E2010 Fixed Furnishings; E2020 Movable Furnishings
F Special Construction & Demolition
F10 Special Construction: F1010 Special Structures; F1020 Integrated Construction; F1030 Special Construction Systems; F1040 Special Facilities; F1050 Special Controls & Instrumentation
F20 Selective Building Demolition: F2010 Building Elements Demolition; F2020 Hazardous Components Abatement
G Building Sitework
G10 Site Preparation: G1010 Site Clearing; G1020 Site Demolition & Relocations; G1030 Site Earthwork; G1040 Hazardous Waste Remediation
G20 Site Improvements: G2010 Roadways; G2020 Parking Lots; G2030 Pedestrian Paving; G2040 Site Development; G2050 Landscaping
G30 Site Civil/Mechanical Utilities: G3010 Water Supply; G3020 Sanitary Sewer; G3030 Storm Sewer; G3040 Heating Distribution; G3050 Cooling Distribution; G3060 Fuel Distribution; G3090 Other Site Mechanical Utilities
G40 Site Electrical Utilities: G4010 Electrical Distribution; G4020 Site Lighting; G4030 Site Communications & Security; G4090 Other Site Electrical Utilities
G90 Other Site Construction: G9010 Service and Pedestrian Tunnels; G9090 Other Site Systems & Equipment
`

const printedElements = [...PRINTED.matchAll(/([A-G](?:\d{4}|\d{2})?) ([^:;\n]+)/g)].map(([, code, title]) => `${code} ${title}`)

describe('UNIFORMAT II (ASTM E1557-97, NISTIR 6389)', () => {
  it('has 7 major groups, 22 group elements and 79 individual elements', () => {
    const countAtLevel = (level: number) => UNIFORMAT.filter((element) => element.level === level).length
    expect([1, 2, 3].map(countAtLevel)).toEqual([7, 22, 79])
  })

  it('is the printed list, code by code and title by title', () => {
    expect(UNIFORMAT.map(({ code, title }) => `${code} ${title}`)).toEqual(printedElements)
  })

  it('holds each element under the group that its code begins with', () => {
    for (const { code, level } of UNIFORMAT.filter((element) => element.level > 1)) {
      expect(findUniformat(code.slice(0, level === 3 ? 3 : 1))?.level).toBe(level - 1)
    }
  })

  it('finds an element by its code, and none by a code of another list', () => {
    expect(findUniformat('C3020')).toEqual({ code: 'C3020', title: 'Floor Finishes', level: 3 })
    expect(findUniformat('C2030')).toBeNull()
  })

  it('classifies each of the 31 house systems', () => {
    expect(HOUSE_SYSTEMS).toHaveLength(31)
    for (const system of HOUSE_SYSTEMS) {
      expect(system.uniformat.length, system.key).toBeGreaterThan(0)
      for (const code of system.uniformat) expect(findUniformat(code)?.level, `${system.key} ${code}`).toBe(3)
    }
  })
})
