/*
 * Spreadsheets round binary numbers, and not all of them see that 1.005 stands for 1.005. Each figure is therefore rounded
 * twice, first far behind the last digit that can matter, which takes the binary noise off, then half away from zero to the digit that counts.
 * 0.07 × 150 × 100 is 1050.0000000000002 in binary; ROUND(…, 4) makes it 1050 before the cent is decided.
 */

/** Dollars to the cent of quantity × unit price, but the minimum charge at least. */
export function amountFormula(quantity: string, unitPrice: string, minimumCharge: string | null): string {
  const product = `ROUND(ROUND(${quantity}*${unitPrice}*100,4),0)/100`
  return minimumCharge === null ? product : `MAX(${minimumCharge},${product})`
}

/** A percentage of a base that is already rounded to the cent; `percent` is a number of percent. */
export function percentFormula(base: string, percent: string): string {
  return `ROUND(ROUND(${base}*${percent},6),0)/100`
}

/** Sum of amounts that are each rounded to the cent. */
export function sumFormula(range: string): string {
  return `ROUND(SUM(${range}),2)`
}

/** The same sum, of the rows where each of the ranges holds its criterion. */
export function sumWhereFormula(range: string, criteria: readonly [range: string, criterion: string][]): string {
  return `ROUND(SUMIFS(${range},${criteria.flat().join(',')}),2)`
}

/** Own-hands hours to two decimals. */
export function hoursFormula(quantity: string, hoursPerUnit: string): string {
  return `ROUND(ROUND(${quantity}*${hoursPerUnit}*100,7),0)/100`
}

/** Quantity to two decimals: with waste, and up to whole packages where there is a package. `waste` is a number of percent. */
export function quantityFormula(measured: string, waste: string, packageSize: string | null): string {
  const withWaste = `${measured}*(1+${waste}/100)`
  const needed = packageSize === null ? withWaste : `ROUNDUP(ROUND(${withWaste}/${packageSize},9),0)*${packageSize}`
  return `ROUND(ROUND(${needed}*100,7),0)/100`
}
