/** Hard bounds of an instructor's own calculator; what is longer was pasted by mistake, or meant to break something. */
export const ownCalculatorLimits = {
  inputs: 12,
  outputs: 8,
  slips: 10,
  examples: 8,
  cautions: 6,
  sources: 6,
  nameCharacters: 24,
  expressionCharacters: 300,
  fewestExamples: 2,
} as const

/** What the id of an own calculator begins with; its key follows. */
export const OWN_PREFIX = 'own:'
