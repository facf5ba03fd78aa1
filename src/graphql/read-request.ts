import type { FastifyRequest } from 'fastify'
import { GraphQLError, type GraphQLFormattedError, getOperationAST, parse } from 'graphql'
import { limits } from './limits.ts'

export type GraphqlRequest = {
  readonly query: string
  readonly operationName?: string
  readonly variables: Readonly<Record<string, unknown>>
}
/** A request that is not one of GraphQL: always a 4xx, under both media types. */
export type Unreadable = { readonly status: number; readonly error: GraphQLFormattedError }

const unreadable = (code: string, message: string, status = 400): Unreadable => ({
  status,
  error: { message, extensions: { code, status } },
})
const isMap = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)
const absent = (value: unknown): value is null | undefined => value === undefined || value === null

/** In a URL the maps stand as JSON text. */
function mapOfText(text: unknown): unknown {
  if (typeof text !== 'string') return text
  if (text === '') return undefined
  try {
    return JSON.parse(text)
  } catch {
    return text
  }
}

function parameters(request: FastifyRequest): unknown {
  if (request.method !== 'GET' && request.method !== 'HEAD') return request.body
  const query = request.query as Record<string, unknown>
  return { ...query, variables: mapOfText(query.variables), extensions: mapOfText(query.extensions) }
}

/** The executor takes JSON text for a parsed document, past every limit of the parser. None of these starts a document. */
const looksLikeJson = (query: string) =>
  /^\s*(?:[[\]"\d-]|\{\s*["}]|(?:true|false|null)\s*$)/.test(query.replace(/^\uFEFF/, ''))

/** GET must not change anything, whatever the schema comes to offer. */
function changesSomething(query: string, operationName: string | undefined): boolean {
  try {
    const operation = getOperationAST(parse(query, { maxTokens: limits.tokens }), operationName)?.operation
    return operation !== undefined && operation !== 'query'
  } catch {
    return false
  }
}

/** Reads the parameters of GraphQL over HTTP, strictly and all by itself: no coercion, no batches. */
export function readRequest(request: FastifyRequest): GraphqlRequest | Unreadable {
  const given = parameters(request)
  if (Array.isArray(given))
    return unreadable('batch-refused', 'Batches are not accepted: send one operation a request.')
  if (!isMap(given)) return unreadable('graphql-request', 'The body must be a JSON object with a field query.')
  const { query, operationName, variables, extensions } = given
  if (typeof query !== 'string' || query === '') return unreadable('graphql-request', 'query must be a text.')
  if (!absent(operationName) && typeof operationName !== 'string') {
    return unreadable('graphql-request', 'operationName must be a text.')
  }
  if (!absent(variables) && !isMap(variables)) return unreadable('graphql-request', 'variables must be an object.')
  if (!absent(extensions) && !isMap(extensions)) return unreadable('graphql-request', 'extensions must be an object.')
  if (query.length > limits.characters) {
    return unreadable(
      'query-too-long',
      `The document has ${query.length} characters, at most ${limits.characters} are allowed.`,
    )
  }
  const name = operationName ?? undefined
  if (request.method === 'GET' && changesSomething(query, name)) {
    return unreadable('method-not-allowed', 'Only queries may be sent by GET.', 405)
  }
  return { query, operationName: name, variables: variables ?? {} }
}

/** A syntax error where the text is JSON, undefined where it may be a document. */
export function refuseJson(query: string): GraphQLError | undefined {
  if (!looksLikeJson(query)) return undefined
  return new GraphQLError('Syntax Error: the query is not a GraphQL document.')
}
