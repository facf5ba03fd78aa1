import { readFile } from 'node:fs/promises'
import type { FastifyInstance } from 'fastify'
import { getOperationAST } from 'graphql'
import mercurius from 'mercurius'
import type { Context } from './context.ts'
import { costOf } from './cost.ts'
import { type FormatOptions, formatError } from './error-format.ts'
import { explorerRoute } from './explorer/explorer-route.ts'
import { graphqlRoute, type RouteOptions } from './graphql-route.ts'
import { cachedDocuments, limits } from './limits.ts'
import { resolvers } from './resolvers.ts'
import { documentLimits, noIntrospection, tooCostly } from './validation-rules.ts'

export type GraphqlOptions = {
  /** True: no introspection, no suggestions, no explorer. */
  readonly production: boolean
  readonly actorOf: RouteOptions['actorOf']
  readonly office: RouteOptions['office']
}

/** GraphQL at /graphql. The route is our own, because that of mercurius coerces, batches and negotiates otherwise. */
export async function graphqlPlugin(app: FastifyInstance, options: GraphqlOptions): Promise<void> {
  const { production, actorOf, office } = options
  const format: FormatOptions = { production, report: (err) => app.log.error({ err }, 'GraphQL failed') }
  const bodyBytes = app.initialConfig.bodyLimit ?? 1_048_576
  // The declared type of mercurius knows fewer options than the validator of graphql, which gets them all.
  const validateOptions: { maxErrors?: number } & { hideSuggestions: boolean } = { hideSuggestions: production }
  await app.register(mercurius, {
    schema: await readFile(new URL('../../schema/schema.graphql', import.meta.url), 'utf8'),
    resolvers: resolvers(bodyBytes) as Parameters<typeof app.graphql.defineResolvers>[0],
    routes: false,
    // Lets its resolvers subscribe; the socket is our own, like the route.
    subscription: true,
    // Compiled aside, after the second use. Compiled at a use of its own (a number here), that use skips the check of
    // the variables, and a misfit fails without a reason.
    jit: { minCount: 2, eluThreshold: 1 },
    cache: cachedDocuments,
    validationRules: production ? [documentLimits, noIntrospection] : [documentLimits],
    graphql: { parseOptions: { maxTokens: limits.tokens }, validateOptions },
    errorFormatter: (execution) => ({
      statusCode: 200,
      response: {
        data: execution.data,
        errors: execution.errors?.map((error) => formatError(error, format)),
      } as never,
    }),
  })
  // The rules of a document do not see its variables; with them the cost of its lists is known.
  app.graphql.addHook('preExecution', async (schema, document, context, variables) => {
    const { operationName } = context as unknown as Context
    const operation = getOperationAST(document, operationName)
    const costly = operation && tooCostly(costOf(schema, document, operation, variables))
    if (costly) throw costly
  })
  await app.register(async (scope) => graphqlRoute(scope, { ...format, actorOf, office }))
  if (!production) await app.register(explorerRoute)
}
