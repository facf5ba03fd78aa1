import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { demoBody, exampleBody } from '../print/records.ts'

let app: FastifyInstance
beforeAll(async () => {
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent' }))
})
afterAll(() => app.close())

const post = (url: string, payload: unknown, accept?: string) =>
  app.inject({
    method: 'POST',
    url,
    payload: JSON.stringify(payload),
    headers: { 'content-type': 'application/json', ...(accept !== undefined && { accept }) },
  })

const asked: Readonly<Record<string, [url: string, body: unknown]>> = {
  'single-pile': ['/v1/single-pile', exampleBody('single-pile')],
  block: ['/v1/block', exampleBody('block')],
  group: ['/v1/group', exampleBody('group')],
  settlement: ['/v1/settlement', exampleBody('settlement')],
  assessment: ['/v1/assessments', demoBody()],
  'one cap': ['/v1/assessments?cap=B1', demoBody()],
}

test.each(Object.keys(asked))('%s answers in JSON or as a page, as it is asked', async (name) => {
  const [url, body] = asked[name]!
  for (const accept of [undefined, '*/*', 'application/json', 'text/html;q=0.5, application/json', 'application/*']) {
    const reply = await post(url, body, accept)
    expect([reply.statusCode, reply.headers['content-type'], reply.headers.vary]).toEqual([
      200,
      'application/json; charset=utf-8',
      'Accept',
    ])
  }
  for (const accept of ['text/html', 'text/html,application/xhtml+xml,*/*;q=0.8', 'TEXT/HTML', 'text/*']) {
    const reply = await post(url, body, accept)
    expect([reply.statusCode, reply.headers['content-type'], reply.headers.vary]).toEqual([
      200,
      'text/html; charset=utf-8',
      'Accept',
    ])
    expect(reply.body).toMatch(/^<!doctype html>/)
    const policy = String(reply.headers['content-security-policy'])
    expect(policy).toMatch(/^default-src 'none';/)
    expect(policy).not.toMatch(/unsafe|\*|http/)
    expect(reply.headers['x-content-type-options']).toBe('nosniff')
  }
  for (const accept of ['image/png', 'text/html;q=0, application/json;q=0']) {
    const reply = await post(url, body, accept)
    expect([reply.statusCode, reply.headers['content-type']]).toEqual([406, 'application/problem+json; charset=utf-8'])
    expect(reply.json().type).toBe('/problems/not-acceptable')
  }
})

test('a fault of the request is a problem, whatever is accepted', async () => {
  for (const [url] of Object.values(asked)) {
    const reply = await post(url, {}, 'text/html')
    expect([reply.statusCode, reply.headers['content-type']]).toEqual([422, 'application/problem+json; charset=utf-8'])
  }
})

test('the page holds the numbers of the JSON answer, and its hash', async () => {
  const [url, body] = asked['single-pile']!
  const { result, meta } = (await post(url, body)).json()
  const page = (await post(url, body, 'text/html')).body
  expect(page).toContain(meta.requestHash)
  expect(page).toContain(Number(result.ultimateResistance).toFixed(0))
})
