import type { Actor } from '../operations/rights.ts'

/** What resolvers get beside their arguments. */
export type Context = { readonly actor: Actor }
