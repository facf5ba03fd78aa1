/** What the endpoint accepts of a document, refused before anything is computed. */
export const limits = {
  /** Fields above one another. */
  depth: 8,
  /** Aliases, a fragment counted wherever it is spread. */
  aliases: 30,
  tokens: 2_000,
  /** Sum of `rootCosts`. */
  cost: 100,
  /** Characters of a document: one token may be a very long string, and parsed documents are kept. */
  characters: 32_768,
} as const

/** Cost of a field at the root, about its computing time; one that is not listed costs 1. */
export const rootCosts: Readonly<Record<string, number>> = { singlePile: 5, block: 5, group: 10, settlement: 10 }

/** Parsed and compiled documents that are kept. */
export const cachedDocuments = 256
