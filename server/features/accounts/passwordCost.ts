/** bcrypt's cost: 2 to this power rounds, about a third of a second of one core. */
export const PASSWORD_COST = 12
