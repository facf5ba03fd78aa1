import type { GraphQLError, GraphQLFormattedError } from 'graphql'
import { Problem } from '../errors.ts'

/** By name, not by class: the executor may have loaded another copy of the graphql module than this file. */
const isGraphqlError = (error: unknown): error is GraphQLError =>
  error instanceof Error && error.name === 'GraphQLError' && 'extensions' in error

/** The refusal of an operation with the code, status and pointers of the REST answer. */
export function formatProblem(problem: Problem, at: Pick<GraphQLFormattedError, 'locations' | 'path'> = {}) {
  const { code, status, message, errors } = problem
  return { message, ...at, extensions: { code, status, ...(errors.length > 0 && { errors }) } }
}

/** Suggestions ("Did you mean …?") list names of the schema; the executor writes them whatever is asked of it. */
const withoutSuggestions = (message: string) => message.replace(/ ?Did you mean [^?]*\?/g, '')

export type FormatOptions = { readonly production: boolean; readonly report: (failure: Error) => void }

/** A value that does not fit the schema on its way out is the service's own fault; an argument is the client's. */
const isClients = (error: GraphQLError) => error.path === undefined || error.message.startsWith('Argument ')

/**
 * An error as it is sent. Three kinds: a refusal of an operation; a fault of the document or its variables; anything
 * else, of which nothing is told but that it happened.
 */
export function formatError(error: Error, options: FormatOptions): GraphQLFormattedError {
  const graphqlError = isGraphqlError(error) ? error : undefined
  const cause = graphqlError?.originalError ?? error
  const { locations, path } = graphqlError?.toJSON() ?? {}
  const at = { ...(locations && { locations }), ...(path && { path }) }
  if (cause instanceof Problem) return formatProblem(cause, at)
  if (!graphqlError || !isGraphqlError(cause) || !isClients(graphqlError)) {
    options.report(cause)
    return formatProblem(new Problem('internal-error'), at)
  }
  const message = options.production ? withoutSuggestions(error.message) : error.message
  return { message, ...at, extensions: { code: codeOf(graphqlError), status: 400, ...factsOf(graphqlError) } }
}

function codeOf(error: GraphQLError): string {
  if (typeof error.extensions.code === 'string') return error.extensions.code
  if (!error.message.startsWith('Syntax Error')) return 'graphql-invalid'
  return error.message.includes('tokens. Parsing aborted') ? 'too-many-tokens' : 'graphql-syntax'
}

const factsOf = ({ extensions: { got, limit } }: GraphQLError) => (limit === undefined ? {} : { got, limit })
