import type { GraphQLResolveInfo } from 'graphql'
import { limits as requestLimits } from '../contract/limits.ts'
import { guarded } from './access.ts'
import { calculators } from './calculators.ts'
import type { Context } from './context.ts'
import { limits } from './limits.ts'
import { methods, sources } from './lists.ts'
import { plainInput } from './plain-input.ts'
import type { Resolvers } from './resolver-types.ts'
import { scalars } from './scalars.ts'
import { storedQueries, storedSubscriptions, storedTypes } from './stored.ts'
import { traceWanted } from './trace-wanted.ts'

/** The operations answer in the contract's own shapes, held to the schema by the compiler: no field needs a resolver. */
const calculator =
  <Answer>(calculate: (request: unknown, options: { readonly trace: boolean }) => Answer) =>
  async (_parent: unknown, { request }: { request: unknown }, _context: Context, info: GraphQLResolveInfo) =>
    calculate(plainInput(request), { trace: traceWanted(info) })

export function resolvers(bodyBytes: number): Resolvers {
  const { layers, pilesPerCap } = requestLimits
  const { depth, aliases, tokens, cost } = limits
  const query: Resolvers['Query'] = {
    ...storedQueries,
    singlePile: calculator(calculators.singlePile),
    block: calculator(calculators.block),
    group: calculator(calculators.group),
    settlement: calculator(calculators.settlement),
    methods,
    method: (_parent, { id, kind }) =>
      methods().find((method) => method.id === id && (!kind || method.kind === kind)) ?? null,
    sources,
    limits: () => ({ depth, aliases, tokens, cost, bodyBytes, layers, pilesPerCap }),
  }
  return { ...scalars, ...storedTypes, Subscription: storedSubscriptions, Query: guarded('Query', query) }
}
