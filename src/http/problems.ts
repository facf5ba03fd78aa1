import type { FastifyError, FastifyInstance, FastifyReply } from 'fastify'
import { catalogue, type ErrorCode, Problem } from '../errors.ts'

const TYPE = 'application/problem+json; charset=utf-8'

export function sendProblem(reply: FastifyReply, problem: Problem): FastifyReply {
  if (problem.status === 503 || problem.code === 'idempotency-running') reply.header('retry-after', '1')
  if (problem.status === 401) reply.header('www-authenticate', 'Bearer')
  // The trace id lets an operator find the line of the log that belongs to an answer.
  return reply
    .code(problem.status)
    .type(TYPE)
    .send(JSON.stringify({ ...problem.document, traceId: reply.request.id }))
}

/** What Fastify itself refuses, as a problem of ours. */
function asProblem(error: FastifyError, limit: number, contentType: string): Problem {
  switch (error.code) {
    case 'FST_ERR_CTP_BODY_TOO_LARGE':
    case 'FST_REQ_FILE_TOO_LARGE':
      return new Problem('body-too-large', { limit })
    case 'FST_ERR_CTP_INVALID_MEDIA_TYPE':
      return new Problem('unsupported-media-type', { got: contentType || 'none' })
    case 'FST_ERR_CTP_INVALID_JSON_BODY':
    case 'FST_ERR_CTP_EMPTY_JSON_BODY':
    case 'FST_ERR_CTP_INVALID_CONTENT_LENGTH':
      return new Problem('malformed-json', { reason: error.message })
  }
  if (error.code?.startsWith('FST_') && (error.statusCode === 413 || error.statusCode === 406))
    return new Problem('malformed-form', { reason: error.message })
  if (error instanceof SyntaxError || error.statusCode === 400)
    return new Problem('malformed-json', { reason: error.message })
  return new Problem('internal-error')
}

/** Every 4xx and 5xx is a problem document (RFC 9457); an unknown path is a 404, a known one with another method a 405. */
export function problems(app: FastifyInstance, bodyLimit: number): void {
  app.setErrorHandler((error: FastifyError, request, reply) => {
    const problem =
      error instanceof Problem ? error : asProblem(error, bodyLimit, request.headers['content-type'] ?? '')
    if (problem.status >= 500) request.log.error({ err: error }, 'request failed')
    return sendProblem(reply, problem)
  })
  app.setNotFoundHandler((request, reply) => {
    const path = request.url.split('?')[0] ?? request.url
    const allowed = (['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE'] as const).filter(
      (method) => app.hasRoute({ method, url: path }) || app.findRoute({ method, url: path }) !== null,
    )
    // A route that answers to the method and still found nothing, as one of static files does.
    if (allowed.length === 0 || allowed.some((method) => method === request.method))
      return sendProblem(reply, new Problem('not-found', { path }))
    reply.header('allow', allowed.join(', '))
    return sendProblem(reply, new Problem('method-not-allowed', { path, method: request.method }))
  })
  app.get<{ Params: { code: string } }>('/problems/:code', async (request) => {
    const { code } = request.params
    if (!Object.hasOwn(catalogue, code)) throw new Problem('not-found', { path: `/problems/${code}` })
    return { code, ...catalogue[code as ErrorCode] }
  })
}
