import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify'
import type { GraphQLFormattedError } from 'graphql'
import type { Office } from '../operations/office.ts'
import type { Actor } from '../operations/rights.ts'
import { contextOf } from './context.ts'
import { type FormatOptions, formatError } from './error-format.ts'
import { judgeVariables } from './judge-variables.ts'
import { type GraphqlMediaType, legacy, modern, negotiate } from './media-type.ts'
import { type GraphqlRequest, readRequest, refuseJson } from './read-request.ts'
import { subscriptions } from './subscriptions.ts'

const notAcceptable = {
  type: '/problems/not-acceptable',
  title: 'Not acceptable',
  status: 406,
  detail: `Answers are ${modern} or ${legacy}.`,
} as const

type Answer = { data?: Record<string, unknown> | null; errors?: readonly GraphQLFormattedError[] }

const statusOf = (error: GraphQLFormattedError | undefined) =>
  typeof error?.extensions?.status === 'number' ? error.extensions.status : 400

/** Under the legacy type whatever was a request of GraphQL is a 200; the modern one has the status of the first error. */
function statusUnder(type: GraphqlMediaType, { data, errors }: Answer): number {
  return type === legacy || data || !errors ? 200 : statusOf(errors[0])
}

/**
 * Compiled documents are kept by their text, whatever operation of it was compiled: the name goes into the text, as a
 * comment, so that the second operation of a document does not get the answer of the first.
 */
const textOf = ({ query, operationName }: GraphqlRequest) =>
  operationName === undefined ? query : `${query}\n#${JSON.stringify(operationName)}`

async function run(
  app: FastifyInstance,
  request: GraphqlRequest,
  options: RouteOptions,
  actor: Actor,
): Promise<Answer> {
  const refused = refuseJson(request.query)
  if (refused) return { errors: [formatError(refused, options)] }
  try {
    const { data, errors } = await app.graphql(
      textOf(request),
      contextOf(options.office, actor, request.operationName) as never,
      { ...request.variables },
      request.operationName,
    )
    // Errors first, as clients read them.
    return {
      ...(errors && { errors: errors as readonly GraphQLFormattedError[] }),
      ...(data !== undefined && { data }),
    }
  } catch (thrown) {
    // What the document or its variables do wrong comes as one error with a list.
    const inner =
      thrown instanceof Error && 'errors' in thrown && Array.isArray(thrown.errors) ? thrown.errors : [thrown]
    const judged = judgeVariables(inner, request.variables)
    return { errors: judged ?? inner.map((error) => formatError(error, options)) }
  }
}

export type RouteOptions = FormatOptions & {
  /** Who asks. */
  readonly actorOf: (request: FastifyRequest) => Actor
  readonly office: Office
}

export function graphqlRoute(app: FastifyInstance, options: RouteOptions): void {
  app.removeContentTypeParser('text/plain')
  const handler = async (request: FastifyRequest, reply: FastifyReply) => {
    reply.header('vary', 'Accept')
    const type = negotiate(request.headers.accept)
    if (!type) return reply.code(406).type('application/problem+json').send(notAcceptable)
    // A string goes out as it is; both types are JSON in UTF-8.
    const send = (status: number, body: Answer) =>
      reply.code(status).header('content-type', `${type}; charset=utf-8`).send(JSON.stringify(body))
    const read = readRequest(request)
    if ('error' in read) return send(read.status, { errors: [read.error] })
    const answer = await run(app, read, options, options.actorOf(request))
    return send(statusUnder(type, answer), answer)
  }
  const wsHandler = subscriptions(app, options)
  app.route({ method: 'GET', url: '/graphql', handler, wsHandler })
  app.post('/graphql', handler)
}
