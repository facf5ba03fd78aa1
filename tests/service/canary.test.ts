import { execFileSync } from 'node:child_process'
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { readExamples } from '../../src/contract/examples.ts'
import { endService, type Started, startService } from './start-service.ts'

/** Strings that must not wander: a key, a wrong key, the name of a person, a title, the name of a layer, a broken body. */
const person = 'Canary Person'
const wrongKey = 'kentledge_canarywrong_AAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAA'
const title = 'canary-title <script>alert(1)</script>'
const layer = 'canary-layer " onload="alert(2)'
const broken = '{"pile": "canary-broken-body"'

const root = fileURLToPath(new URL('../../', import.meta.url))
let folder: string
let service: Started
let key: string
const replies: string[] = []
beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'kentledge-canary-'))
  const out = execFileSync(
    process.execPath,
    ['src/keys.ts', 'make', '--name', person, '--scopes', 'calculate,read,write,sign'],
    { cwd: root, env: { DATA_DIR: folder }, encoding: 'utf8' },
  )
  key = /kentledge_\S+/.exec(out)![0]
  service = await startService({ env: { DATA_DIR: folder, LOG_LEVEL: 'trace' } })
}, 60_000)
afterAll(async () => {
  await endService(service)
  rmSync(folder, { recursive: true, force: true })
})

async function send(method: string, path: string, body?: string, headers: Record<string, string> = {}) {
  const reply = await fetch(service.address + path, {
    method,
    headers: { authorization: `Bearer ${key}`, ...(body && { 'content-type': 'application/json' }), ...headers },
    ...(body && { body }),
  })
  const text = await reply.text()
  // What a caller wrote into the URL may come back to that caller; it must go nowhere else.
  if (!path.includes(key)) replies.push(text)
  return { status: reply.status, text }
}

test('keys, people, titles and bodies are in no log line, no metric and no problem; hostile names stay text', {
  timeout: 60_000,
}, async () => {
  const schedule = JSON.parse(JSON.stringify(readExamples().assessment))
  schedule.title = title
  for (const profile of Object.values(schedule.ground) as { layers: { name: string }[] }[])
    profile.layers[0]!.name = layer
  expect((await send('PUT', '/v1/projects/quay', JSON.stringify({ title }))).status).toBe(201)
  const posted = await send('POST', '/v1/projects/quay/assessments', JSON.stringify(schedule))
  expect(posted.status).toBe(201)
  const { id } = JSON.parse(posted.text)
  const signed = await send(
    'POST',
    `/v1/assessments/${id}/signatures`,
    JSON.stringify({ role: 'originator', meaning: 'computed' }),
  )
  expect(signed.status).toBe(201)

  const problems: string[] = []
  const tries: [string, string, string?, Record<string, string>?][] = [
    ['GET', '/v1/projects', undefined, { authorization: `Bearer ${wrongKey}` }],
    ['GET', '/v1/projects', undefined, { authorization: `Basic ${Buffer.from(`canary:${key}`).toString('base64')}` }],
    ['POST', '/v1/single-pile', broken],
    ['GET', `/v1/projects/quay/${encodeURIComponent(key)}`],
    ['GET', `/v1/projects?${encodeURIComponent(key)}=1`],
    ['POST', '/graphql', JSON.stringify({ query: '{ canaryField }' })],
    ['POST', '/v1/projects/quay/assessments', JSON.stringify({ ...schedule, limits: 'none' })],
    ['DELETE', '/v1/projects/quay'],
  ]
  for (const [method, path, body, headers] of tries) {
    const { status, text } = await send(method, path, body, headers)
    expect([method, path.slice(0, 30), status < 500]).toEqual([method, path.slice(0, 30), true])
    problems.push(text)
  }
  const metrics = await (await fetch(`${service.address}/metrics`)).text()
  const secrets = [key.split('_').at(-1)!, wrongKey.split('_').at(-1)!]
  for (const secret of secrets) {
    for (const [where, text] of [
      ['log', service.log()],
      ['metrics', metrics],
      ['answers', replies.join('\n')],
    ] as const)
      expect([where, text.includes(secret)]).toEqual([where, false])
    // At rest there is a hash only.
    for (const file of readdirSync(folder)) expect(readFileSync(join(folder, file)).includes(secret)).toBe(false)
  }
  for (const personal of [person, 'canary-title', 'canary-layer', 'canary-broken-body']) {
    expect([personal, service.log().includes(personal)]).toEqual([personal, false])
    expect([personal, metrics.includes(personal)]).toEqual([personal, false])
  }
  for (const personal of [person, 'canary-title', 'canary-broken-body'])
    expect(problems.filter((text) => text.includes(personal))).toEqual([])

  for (const path of ['/v1/projects/quay/plan', `/v1/assessments/${id}/caps/A1/sheet`]) {
    const { status, text } = await send('GET', path, undefined, { accept: 'text/html' })
    expect([path, status]).toEqual([path, 200])
    expect(text).not.toContain('<script>alert')
    expect(text).not.toContain('onload="alert')
  }
})
