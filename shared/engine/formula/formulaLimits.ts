/** Nesting that is taken: brackets, calls, conditions and exponents inside one another. A long sum is not deep. */
export const FORMULA_MAX_DEPTH = 50
/** An exponent is a plain number from −10 to 10: nothing that is built needs more. */
export const EXPONENT_MAX = 10
/** A number that is written in a formula. */
export const LITERAL_MAX = 1e12
/** Steps that pass this grow past what is computed here; no product of two of them overflows. */
export const STEP_MAX = 1e100
/** A quantity that passes this is no quantity of a house. */
export const QUANTITY_MAX = 1e9
