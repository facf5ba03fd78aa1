/** What the endpoint accepts of a document, refused before anything is computed. */
export const limits = {
  /** Fields above one another. */
  depth: 8,
  /** Aliases, a fragment counted wherever it is spread. */
  aliases: 30,
  tokens: 2_000,
  /** Objects of the answer, as many as its lists may hold, and `fieldCosts`. */
  cost: 10_000,
  /** Characters of a document: one token may be a very long string, and parsed documents are kept. */
  characters: 32_768,
  /** Subscriptions that are open in one socket. */
  subscriptions: 10,
} as const

/** Cost of a field that takes longer than an object of an answer, about its computing time; any other with fields of its own costs 1. */
export const fieldCosts: Readonly<Record<string, number>> = {
  'Query.singlePile': 475,
  'Query.block': 475,
  'Query.group': 950,
  'Query.settlement': 950,
  'Assessment.changes': 950,
  'Assessment.aggregates': 50,
  'AssessmentConnection.aggregates': 200,
  'Cap.trace': 475,
}

/** Members of a list that is no page, where they are known; of any other. */
export const listSizes: Readonly<Record<string, number>> = { 'Cap.checks': 9, 'Assessment.signatures': 3 }
export const LIST = 10

/** Parsed and compiled documents that are kept. */
export const cachedDocuments = 256
