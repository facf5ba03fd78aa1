import { connect } from 'node:net'
import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'

let app: FastifyInstance
let port: number
beforeAll(async () => {
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent', REQUEST_TIMEOUT: '1', BODY_LIMIT: '100000' }))
  await app.listen({ port: 0, host: '127.0.0.1' })
  port = (app.server.address() as { port: number }).port
})
afterAll(() => app.close())

/** Sends bytes as they are, and gives what came back until the service closed the connection. */
function raw(...parts: string[]): Promise<{ status: number; type: string; body: string }> {
  return new Promise((resolve, reject) => {
    const socket = connect(port, '127.0.0.1')
    let got = ''
    socket.on('data', (chunk) => {
      got += chunk
    })
    socket.on('error', () => undefined)
    socket.on('close', () => {
      const [head = '', body = ''] = got.split('\r\n\r\n')
      resolve({ status: Number(head.split(' ')[1]), type: /content-type: (\S+?);/i.exec(head)?.[1] ?? '', body })
    })
    setTimeout(() => reject(new Error(`no answer: ${got}`)), 15_000).unref()
    for (const part of parts) socket.write(part)
  })
}

test.each<[string, number, string[]]>([
  ['no HTTP at all', 400, ['what is this\r\n\r\n']],
  [
    'a flood of headers',
    431,
    [
      'GET /livez HTTP/1.1\r\nhost: a\r\n',
      ...Array.from({ length: 2000 }, (_, i) => `x-${i}: ${'y'.repeat(50)}\r\n`),
      '\r\n',
    ],
  ],
  [
    'a client that stops half way',
    408,
    [
      'POST /v1/single-pile HTTP/1.1\r\nhost: a\r\ncontent-type: application/json\r\ncontent-length: 500\r\n\r\n{"pile":',
    ],
  ],
  [
    'a body announced as a gigabyte',
    413,
    [
      'POST /v1/single-pile HTTP/1.1\r\nhost: a\r\nconnection: close\r\ncontent-type: application/json\r\ncontent-length: 1000000000\r\n\r\n{',
    ],
  ],
])('%s gets a %i problem', { timeout: 20_000 }, async (_, status, parts) => {
  const reply = await raw(...parts)
  expect(reply.status).toBe(status)
  expect(reply.type).toBe('application/problem+json')
  expect(JSON.parse(reply.body).status).toBe(status)
})

test('the service still answers', async () => {
  expect((await fetch(`http://127.0.0.1:${port}/livez`)).status).toBe(200)
})
