import type { FastifyInstance, FastifyRequest } from 'fastify'
import { GraphQLError, type GraphQLSchema, getOperationAST, parse, specifiedRules, validate } from 'graphql'
import { makeHandler } from 'graphql-ws/use/@fastify/websocket'
import type { Office } from '../operations/office.ts'
import type { Actor } from '../operations/rights.ts'
import { contextOf } from './context.ts'
import { type FormatOptions, formatError } from './error-format.ts'
import { limits } from './limits.ts'
import { documentLimits, noIntrospection } from './validation-rules.ts'

type Options = FormatOptions & {
  readonly office: Office
  readonly actorOf: (request: FastifyRequest) => Actor
}

const refused = (code: string, message: string) => [new GraphQLError(message, { extensions: { code } })]

/** What a subscription runs with, or why it does not: the same limits as for queries, which are not answered here. */
function argumentsOf(schema: GraphQLSchema, query: string, operationName: string | undefined, production: boolean) {
  if (query.length > limits.characters) return refused('query-too-long', 'The document is too long.')
  try {
    const document = parse(query, { maxTokens: limits.tokens })
    const rules = [...specifiedRules, documentLimits, ...(production ? [noIntrospection] : [])]
    const options = { hideSuggestions: production }
    const faults = validate(schema, document, rules, options)
    if (faults.length > 0) return faults
    if (getOperationAST(document, operationName)?.operation !== 'subscription')
      return refused('graphql-request', 'Here subscriptions are answered; send queries by POST.')
    return { schema, document, operationName }
  } catch (fault) {
    return [fault as GraphQLError]
  }
}

/**
 * Subscriptions by websocket (protocol graphql-transport-ws) at the address of the queries. The key stands in the header of the
 * request that opens the socket. A service that stops closes it.
 */
export function subscriptions(app: FastifyInstance, options: Options) {
  const { office, actorOf, production } = options
  const formatted = (errors: readonly Error[]) => errors.map((error) => formatError(error, options))
  const handler = makeHandler({
    onSubscribe: ({ extra, subscriptions: open }, _id, { query, operationName, variables }) => {
      if (Object.keys(open).length > limits.subscriptions)
        return refused(
          'too-many-subscriptions',
          `At most ${limits.subscriptions} subscriptions are open in one socket.`,
        )
      const found = argumentsOf(app.graphql.schema as GraphQLSchema, query, operationName ?? undefined, production)
      if ('schema' in found)
        return { ...found, variableValues: variables, contextValue: contextOf(office, actorOf(extra.request)) }
      return found
    },
    onError: (_context, _id, _payload, errors) => formatted(errors),
    onNext: (_context, _id, _payload, _args, { errors, ...result }) => ({
      ...result,
      ...(errors && { errors: formatted(errors) }),
    }),
  })
  return function (this: FastifyInstance, socket: Parameters<typeof handler>[0], request: FastifyRequest) {
    const close = () => socket.close(1001, 'the service stops')
    office.line.stopping.addEventListener('abort', close)
    socket.once('close', () => office.line.stopping.removeEventListener('abort', close))
    return handler.call(this, socket, request)
  }
}
