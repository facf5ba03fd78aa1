import { STATUS_CODES } from 'node:http'
import type { Socket } from 'node:net'
import { Problem } from '../errors.ts'

type ClientError = Error & { readonly code?: string }

function problemOfSocket(error: ClientError): Problem {
  if (error.code === 'HPE_HEADER_OVERFLOW') return new Problem('headers-too-large')
  if (error.code === 'ERR_HTTP_REQUEST_TIMEOUT') return new Problem('request-timeout')
  return new Problem('malformed-request', { reason: error.code ?? error.message })
}

/** Answers what the HTTP parser itself refuses, before there is a request: a problem document, then the connection closes. */
export function answerClientError(error: ClientError, socket: Socket): void {
  if (error.code === 'ECONNRESET' || !socket.writable) {
    socket.destroy()
    return
  }
  const problem = problemOfSocket(error)
  const body = JSON.stringify(problem.document)
  const head = [
    `HTTP/1.1 ${problem.status} ${STATUS_CODES[problem.status]}`,
    'content-type: application/problem+json; charset=utf-8',
    `content-length: ${Buffer.byteLength(body)}`,
    'connection: close',
  ]
  socket.end(`${head.join('\r\n')}\r\n\r\n${body}`)
}
