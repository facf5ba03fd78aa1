import type { FastifyInstance } from 'fastify'
import { afterEach, describe, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { makeKey } from '../../src/store/keys.ts'
import { openStore, type Store } from '../../src/store/open-store.ts'
import { bothDatabases } from '../store/databases.ts'

const schedule = readExamples().assessment as { title: string; caps: { mark: string }[] }
const json = { 'content-type': 'application/json' }
const apps: FastifyInstance[] = []
afterEach(async () => {
  for (const app of apps.splice(0)) await app.close()
})
type Sent = { readonly status: number; readonly headers: Record<string, string>; readonly body: string }

describe.each(bothDatabases())('on $name', (database) => {
  async function office() {
    const store = await openStore((await database.place()).options)
    const app = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '2', WORK_QUEUE: '200' }), store)
    apps.push(app)
    return withApp(app, store)
  }
  function withApp(app: FastifyInstance, store: Store) {
    const ask = async (method: string, url: string, payload?: unknown, headers: object = {}): Promise<Sent> => {
      const body = payload === undefined ? {} : { payload: JSON.stringify(payload), headers: { ...json, ...headers } }
      const reply = await app.inject({ method: method as 'GET', url, headers: { ...headers }, ...body })
      return { status: reply.statusCode, headers: reply.headers as Record<string, string>, body: reply.body }
    }
    const get = (url: string, headers: object = {}) => ask('GET', url, undefined, headers)
    const post = (headers: object = {}, body: unknown = schedule) =>
      ask('POST', '/v1/projects/quay/assessments', body, headers)
    return { app, store, ask, get, post }
  }
  const project = async () => {
    const made = await office()
    expect((await made.ask('PUT', '/v1/projects/quay', { title: 'Quay' })).status).toBe(201)
    return made
  }

  test('100 posts at once with one Idempotency-Key make one record, and one answer', async () => {
    const { post, get } = await project()
    const headers = { 'idempotency-key': 'the-same' }
    const answers: Sent[] = []
    const persist = async () => {
      for (;;) {
        const answer = await post(headers)
        if (answer.status !== 409) return answers.push(answer)
        expect(answer.headers['retry-after']).toBe('1')
        await new Promise((resolve) => setTimeout(resolve, 50))
      }
    }
    await Promise.all(Array.from({ length: 100 }, persist))
    expect(new Set(answers.map((a) => a.status))).toEqual(new Set([201]))
    expect(new Set(answers.map((a) => a.body)).size).toBe(1)
    expect(answers.filter((a) => a.headers['idempotency-replayed'] === undefined)).toHaveLength(1)
    expect(JSON.parse((await get('/v1/projects/quay/assessments')).body).items).toHaveLength(1)
    expect((await post(headers, { ...schedule, title: 'Another' })).body).toContain('idempotency-mismatch')
    expect((await post({ 'idempotency-key': 'a b' })).status).toBe(422)
  })

  test('20 posts at once: no revision used twice or skipped; a refused schedule takes none', async () => {
    const { post, get } = await project()
    const sent = await Promise.all(
      Array.from({ length: 25 }, (_, i) => post({}, i % 5 === 4 ? { ...schedule, caps: [] } : schedule)),
    )
    expect(sent.filter((s) => s.status === 422)).toHaveLength(5)
    const made = sent.filter((s) => s.status === 201).map((s) => JSON.parse(s.body).revision as number)
    expect(made.sort((a, b) => a - b)).toEqual(Array.from({ length: 20 }, (_, i) => i + 1))
    expect(JSON.parse((await get('/v1/projects/quay/integrity')).body)).toMatchObject({ holds: true, records: 20 })
  })

  test('the same schedule as JSON and as a form with CSV gives the same content, and verifies again', async () => {
    const { app, post, get, ask } = await project()
    const { rows, ...loads } = (schedule as unknown as { loads: { rows: Record<string, unknown>[] } }).loads
    const columns = Object.keys(rows[0]!)
    const csv = [columns.join(','), ...rows.map((row) => columns.map((c) => row[c]).join(','))].join('\n')
    const form = new FormData()
    form.set('schedule', JSON.stringify({ ...schedule, loads }))
    form.set('loads', new Blob([csv], { type: 'text/csv' }), 'loads.csv')
    const first = JSON.parse((await post()).body)
    const second = (
      await app.inject({ method: 'POST', url: '/v1/projects/quay/assessments', payload: form as never })
    ).json()
    expect(second).toMatchObject({ revision: 2, contentHash: first.contentHash, requestHash: first.requestHash })
    expect(second.previousHash).toBe(first.recordHash)
    expect(JSON.parse((await ask('POST', `/v1/assessments/${first.id}/reverify`)).body)).toMatchObject({
      identical: true,
      count: 0,
    })
    const plain = (await ask('POST', '/v1/assessments?trace=none', schedule)).body
    expect(JSON.parse((await get(`/v1/assessments/${first.id}/content`)).body).result).toEqual(JSON.parse(plain).result)
  })

  test('a record is tagged by its content, stays as it is, and leads to its successor', async () => {
    const { app, post, get } = await project()
    const { id, contentHash } = JSON.parse((await post()).body)
    const url = `/v1/assessments/${id}`
    const first = await get(url)
    expect(first.headers.etag).toBe(`"${contentHash}"`)
    expect(first.headers.link).not.toContain('successor')
    expect(await get(url, { 'if-none-match': `W/"x", "${contentHash}"` })).toMatchObject({ status: 304, body: '' })
    const next = JSON.parse((await post()).body).id
    const after = await get(url)
    expect(after.body).toBe(first.body)
    expect(after.headers.link).toContain(`</v1/assessments/${next}>; rel="successor-version"`)
    expect((await get(`/v1/assessments/${next}`)).headers.link).toContain(
      `</v1/assessments/${id}>; rel="predecessor-version"`,
    )
    const head = await app.inject({ method: 'HEAD', url })
    expect([head.statusCode, head.body, head.headers.etag]).toEqual([200, '', `"${contentHash}"`])
    expect((await get(url, { accept: 'text/html' })).status).toBe(406)
    expect(first.headers.vary).toBe('Accept')
    expect((await app.inject({ method: 'PATCH', url })).headers.allow).toBe('GET, HEAD, DELETE')
  })

  test('a title changes only for those who have seen it', async () => {
    const { ask, get } = await project()
    const url = '/v1/projects/quay'
    const put = (title: string, headers: object = {}) => ask('PUT', url, { title }, headers)
    const { etag } = (await get(url)).headers
    expect((await put('Quay')).status).toBe(200)
    expect((await put('Other')).status).toBe(428)
    expect((await put('Other', { 'if-none-match': '*' })).status).toBe(412)
    expect((await put('Other', { 'if-match': '"stale"' })).status).toBe(412)
    const changed = await put('Other', { 'if-match': etag })
    expect([changed.status, JSON.parse(changed.body).title]).toEqual([200, 'Other'])
    expect((await put('Third', { 'if-match': etag })).status).toBe(412)
    expect((await ask('PUT', '/v1/projects/new', { title: 'N' }, { 'if-match': '*' })).status).toBe(412)
    expect((await ask('PUT', '/v1/projects/No_Slug', { title: 'N' })).body).toContain('bad-project-slug')
    expect((await ask('PUT', '/v1/projects/new', { title: 'N', status: 'x' })).body).toContain('unknown-field')
    expect((await ask('PUT', '/v1/projects/new', { title: '\ud800' })).body).toContain('not-unicode')
    expect((await get('/v1/projects/new')).status).toBe(404)
  })

  test('caps come in pages, filtered, and as CSV whose cells no spreadsheet runs', async () => {
    const { post, get } = await project()
    const text = JSON.stringify(schedule).replaceAll('"C2"', '"=C2+1"')
    const { id } = JSON.parse((await post({}, JSON.parse(text))).body)
    const url = `/v1/assessments/${id}/caps`
    const all = JSON.parse((await get(url)).body).items as { mark: string; utilisation: number; exceeded: boolean }[]
    expect(all.map((c) => c.mark)).toEqual(JSON.parse(text).caps.map((c: { mark: string }) => c.mark))
    const marks = async (query: string) =>
      JSON.parse((await get(`${url}?${query}`)).body).items.map((c: { mark: string }) => c.mark)
    expect(await marks('exceeded=true')).toEqual(all.filter((c) => c.exceeded).map((c) => c.mark))
    expect(await marks('utilisationAtLeast=0.8')).toEqual(all.filter((c) => c.utilisation >= 0.8).map((c) => c.mark))
    expect(await marks('check=settlement')).toHaveLength(all.length)
    expect(await marks('check=settlement&utilisationAtLeast=1000')).toEqual([])
    const walked: string[] = []
    for (let next: string | undefined = `${url}?limit=4`; next; ) {
      const page: Sent = await get(next)
      walked.push(...JSON.parse(page.body).items.map((c: { mark: string }) => c.mark))
      next = /<([^>]+)>; rel="next"/.exec(page.headers.link ?? '')?.[1]
    }
    expect(walked).toEqual(all.map((c) => c.mark))
    const csv = await get(url, { accept: 'text/csv' })
    expect(csv.headers['content-type']).toBe('text/csv; charset=utf-8')
    const lines = csv.body.trim().split('\r\n')
    expect(lines).toHaveLength(all.length + 1)
    expect(lines.map((line) => line.split(',')[0])).toContain("'=C2+1")
    expect(csv.headers.etag).not.toBe((await get(url)).headers.etag)
    const one = JSON.parse((await get(`${url}/${encodeURIComponent('=C2+1')}`)).body)
    expect(one.result).toMatchObject({ mark: '=C2+1' })
    const at = all.findIndex((c) => c.mark === '=C2+1')
    expect(one.trace.results[`/caps/${at}/checks/0/utilisation`]).toMatch(/^caps\//)
    expect(JSON.parse((await get(`${url}/C2`)).body).type).toBe('/problems/no-such-cap')
    for (const bad of [
      'limit=0',
      'limit=-1',
      'limit=1001',
      'limit=2.5',
      'check=none',
      'exceeded=1',
      'cursor=',
      'utilisation=1',
    ])
      expect([bad, (await get(`${url}?${bad}`)).status]).toEqual([bad, 422])
  })

  test('a walk misses nothing and gives nothing twice while a writer adds; a changed cursor is told', async () => {
    const { post, get } = await project()
    for (let i = 0; i < 6; i++) await post()
    let writing = true
    const writer = (async () => {
      while (writing) await post()
    })()
    const seen: number[] = []
    let url: string | undefined = '/v1/projects/quay/assessments?limit=2'
    let last = ''
    while (url && seen.length < 12) {
      const page: Sent = await get(url)
      seen.push(...JSON.parse(page.body).items.map((r: { revision: number }) => r.revision))
      last = url
      url = /<([^>]+)>; rel="next"/.exec(page.headers.link ?? '')?.[1]
    }
    writing = false
    await writer
    expect(seen.length).toBeGreaterThanOrEqual(6)
    expect(seen).toEqual(seen.map((_, i) => i + 1))
    const cursor = new URL(last, 'http://x').searchParams.get('cursor')!
    const path = '/v1/projects/quay/assessments'
    for (let i = 0; i < cursor.length; i++) {
      const letter = cursor[i] === 'A' ? 'B' : 'A'
      const bent = cursor.slice(0, i) + letter + cursor.slice(i + 1)
      expect(JSON.parse((await get(`${path}?limit=2&cursor=${bent}`)).body).type).toBe('/problems/bad-cursor')
    }
    expect((await get(`/v1/projects?cursor=${cursor}`)).status).toBe(422)
  })

  test('three people sign in their order; a skipped step and a second signature are refused', async () => {
    const { post, ask, get, store } = await project()
    const { id, recordHash } = JSON.parse((await post()).body)
    const bearer = async (name: string) => {
      const { key } = await makeKey(store, { name, scopes: ['read', 'sign'], projects: ['quay'] })
      return { authorization: `Bearer ${key}` }
    }
    const [ann, ben, cleo] = [await bearer('Ann'), await bearer('Ben'), await bearer('Cleo')]
    const url = `/v1/assessments/${id}/signatures`
    const sign = async (role: string, who: object) => {
      const { status, body } = await ask('POST', url, { role, meaning: `as ${role}` }, who)
      return status === 201 ? 201 : JSON.parse(body).type
    }
    expect(await sign('checker', ben)).toBe('/problems/signature-step')
    expect(await sign('originator', ann)).toBe(201)
    expect(await sign('originator', ben)).toBe('/problems/signature-step')
    expect(await sign('checker', await bearer('Ann'))).toBe('/problems/signature-same-person')
    expect(await sign('approver', cleo)).toBe('/problems/signature-step')
    expect((await Promise.all([sign('checker', ben), sign('checker', cleo)])).filter((s) => s === 201)).toHaveLength(1)
    const checker = JSON.parse((await get(url, ann)).body).items[1].actor as string
    expect(await sign('approver', checker === 'Ben' ? ben : cleo)).toBe('/problems/signature-same-person')
    expect(await sign('approver', checker === 'Ben' ? cleo : ben)).toBe(201)
    const signatures = JSON.parse((await get(url, ann)).body).items as Record<string, unknown>[]
    expect(signatures.map((s) => s.role)).toEqual(['originator', 'checker', 'approver'])
    for (const s of signatures) expect(s).toMatchObject({ signedHash: recordHash, meaning: `as ${s.role}` })
    expect(JSON.parse((await get('/v1/projects/quay/integrity', ann)).body).holds).toBe(true)
  })

  test('where the store cannot be written the service is not ready, and acknowledges nothing; the process still lives', async () => {
    const { store, get, post } = await project()
    const state = async () => [(await get('/readyz')).status, (await get('/livez')).status]
    expect(await state()).toEqual([200, 200])
    const mend = await database.breakDown(store)
    expect(await state()).toEqual([503, 200])
    const refused = await post()
    expect([refused.status, JSON.parse(refused.body).type, refused.headers['retry-after']]).toEqual([
      503,
      '/problems/store-unavailable',
      '1',
    ])
    await mend()
    expect(await state()).toEqual([200, 200])
    expect(JSON.parse((await post()).body).revision).toBe(1)
  })
})
