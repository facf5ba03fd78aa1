import type { Office } from '../operations/office.ts'
import type { Actor } from '../operations/rights.ts'
import { type Loaders, loadersOf } from './loaders.ts'

/** What resolvers get beside their arguments. */
export type Context = {
  readonly actor: Actor
  readonly office: Office
  readonly loaders: Loaders
  readonly operationName?: string
}

export const contextOf = (office: Office, actor: Actor, operationName?: string): Context => ({
  actor,
  office,
  loaders: loadersOf(office),
  ...(operationName !== undefined && { operationName }),
})
