/** One published source, once. `basis` says how its figures reached this project. */
export type Source = {
  readonly key: string
  readonly title: string
  readonly author: string
  readonly year: number | null
  /** published: read in a copy; memory: written down from memory of it; common practice: no single source. */
  readonly basis: 'published' | 'common practice' | 'memory'
}

/** A place in a source: a clause, table, equation or page. */
export type Citation = { readonly key: string; readonly locator: string }
