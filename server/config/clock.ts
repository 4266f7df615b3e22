/** What time it is. Handed in, so that tests set it and a demo keeps its dates. */
export type Clock = () => Date

export const systemClock: Clock = () => new Date()
