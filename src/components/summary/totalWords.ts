/**
 * What the three figures above it mean, in plain words. The sum of all low figures is what it costs if every line goes well, which hardly ever happens,
 * so it isn't called a one-in-ten figure although each line's low is one.
 */
export const TOTAL_WORDS =
  'The low figure holds if everything goes well, the high one if everything goes badly. Some things go well and others badly, so the real cost lies between the two much more often than at either end.'
