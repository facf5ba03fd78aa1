import { parse as parseCsv } from 'csv-parse/sync'
import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { makeKey } from '../../src/store/keys.ts'
import { openStore, type Store } from '../../src/store/open-store.ts'
import { read } from '../print/printed-page.ts'
import { demoBody } from '../print/records.ts'

/** Pages of stored records over the routes: what they say is what is stored, signatures and all. */
let app: FastifyInstance
let store: Store
let ids: string[]
let reader: string
beforeAll(async () => {
  store = await openStore()
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '1' }), store)
  reader = (await makeKey(store, { name: 'Office', scopes: ['admin'], projects: ['*'] })).key
  await send('PUT', '/v1/projects/quay', { title: 'River quay <warehouse>' })
  await send('PUT', '/v1/projects/empty', { title: 'Empty' })
  await send('PUT', '/v1/projects/dock', { title: 'Dock' })
  const heavier = demoBody()
  for (const row of heavier.loads.rows) if (row.cap === 'A1') row.Fz *= 1.1
  ids = []
  for (const [slug, body] of [
    ['quay', demoBody()],
    ['quay', heavier],
    ['dock', readExamples().assessment],
  ] as const)
    ids.push((await send('POST', `/v1/projects/${slug}/assessments`, body)).json().id)
})
afterAll(() => app.close())

const send = (method: 'PUT' | 'POST', url: string, body: unknown, key = reader) =>
  app.inject({
    method,
    url,
    payload: JSON.stringify(body),
    headers: { 'content-type': 'application/json', authorization: `Bearer ${key}` },
  })
const get = (url: string, accept = 'text/html,application/xhtml+xml,*/*;q=0.8', more = {}) =>
  app.inject({ url, headers: { accept, authorization: `Bearer ${reader}`, ...more } })

test('the sheet of a stored cap shows its record and its numbers, and who signed so far', async () => {
  const url = `/v1/assessments/${ids[0]}/caps/B1/sheet`
  const open = read((await get(url)).body)
  expect(open.querySelector('.issue')!.text).toContain('not signed')
  expect(open.querySelector('.issue')!.text).toContain('River quay <warehouse>')
  const roles = ['originator', 'checker', 'approver']
  for (const [i, name] of ['Maren Ortiz', 'Ines Falk', 'Jo Brandt'].entries()) {
    const { key } = await makeKey(store, { name, scopes: ['read', 'sign'], projects: ['quay'] })
    const signed = await send('POST', `/v1/assessments/${ids[0]}/signatures`, { role: roles[i], meaning: 'mine' }, key)
    expect(signed.statusCode).toBe(201)
  }
  const reply = await get(url)
  expect([reply.statusCode, reply.headers['content-type']]).toEqual([200, 'text/html; charset=utf-8'])
  expect(reply.headers['content-security-policy']).toMatch(/^default-src 'none';/)
  const page = read(reply.body)
  const said = page.querySelectorAll('.issue > div').map((div) => div.text.replace(/\s+/g, ' '))
  expect(said.filter((text) => /^(computed|checked|approved)/.test(text))).toEqual([
    expect.stringMatching(/^computed ?Maren Ortiz \d{4}-\d\d-\d\d/),
    expect.stringMatching(/^checked ?Ines Falk/),
    expect.stringMatching(/^approved ?Jo Brandt/),
  ])
  const record = (await get(`/v1/assessments/${ids[0]}`, 'application/json')).json()
  const cap = (await get(`/v1/assessments/${ids[0]}/caps/B1`, 'application/json')).json()
  for (const hash of [record.contentHash, record.recordHash]) expect(page.text).toContain(hash)
  // Every step of the stored trace that is printed by itself or in a table is there under its id.
  const printed = new Set(page.querySelectorAll('[data-step]').map((line) => line.getAttribute('data-step')))
  const known = new Set(cap.trace.steps.map((step: { id: string }) => step.id))
  expect(printed.size).toBeGreaterThan(60)
  for (const step of printed) expect(known).toContain(step)
  expect(page.querySelectorAll('#verdict table.checks tbody tr')).toHaveLength(cap.result.checks.length)
})

test('the plan is that of the newest revision; another one is laid beside it by id or by revision', async () => {
  const plan = '/v1/projects/quay/plan'
  const newest = read((await get(plan)).body)
  expect(newest.querySelector('.issue')!.text).toMatch(/revision\s*2/)
  expect(newest.querySelectorAll('svg.map')).toHaveLength(1)
  const offered = newest.querySelectorAll('nav.contents a').map((a) => a.getAttribute('href'))
  expect(offered).toEqual([`/v1/assessments/${ids[1]}/piles`, `${plan}?since=${ids[0]}`])
  for (const since of [ids[0], '1']) {
    const both = read((await get(`${plan}?check=pile-compression&since=${since}`)).body)
    expect(both.querySelectorAll('svg.map title').map((t) => t.text.slice(-10))).toEqual(['Revision 1', 'Revision 2'])
    const rows = both.querySelectorAll('#changes tbody tr').map((tr) => tr.querySelector('th')!.text)
    expect(rows).toEqual(['A1'])
    expect(both.querySelector('#changes tbody tr')!.text).toMatch(/rises.*loads/)
    // The filter keeps what it is laid beside, and says what is shown.
    const filters = both.querySelectorAll('.filters a')
    expect(filters.filter((a) => a.getAttribute('aria-current')).map((a) => a.text)).toEqual(['pile in compression'])
    for (const a of filters) expect(a.getAttribute('href')).toContain(`since=${ids[0]}`)
  }
  const first = read((await get(`/v1/assessments/${ids[0]}/sheet`)).body)
  expect(first.querySelector('.issue')!.text).toMatch(/revision\s*1/)
  const cap = first.querySelector('#caps tbody th a')!.getAttribute('href')!
  expect((await get(cap)).statusCode).toBe(200)
})

test('the schedule of piles is a page for browsers, and CSV for spreadsheets', async () => {
  const url = `/v1/assessments/${ids[0]}/piles`
  const csv = await get(url, '*/*')
  expect([csv.headers['content-type'], csv.headers['content-disposition']]).toEqual([
    'text/csv; charset=utf-8',
    'attachment; filename="quay-1-piles.csv"',
  ])
  const rows = parseCsv(csv.body, { columns: true }) as Record<string, string>[]
  const page = read((await get(url)).body)
  expect(page.querySelectorAll('#piles tbody tr')).toHaveLength(rows.length)
  const link = page.querySelectorAll('nav.contents a').at(-1)!.getAttribute('href')!
  // A browser follows the link with its usual header.
  const followed = await get(link)
  expect([followed.headers['content-type'], followed.body]).toEqual(['text/csv; charset=utf-8', csv.body])
  const again = await get(url, 'text/csv', { 'if-none-match': String(csv.headers.etag) })
  expect([again.statusCode, again.body]).toEqual([304, ''])
})

test('what is not there, or not of the project, is a problem', async () => {
  const told = async (url: string) => (await get(url)).json().type
  expect(await told('/v1/projects/empty/plan')).toBe('/problems/no-assessment-yet')
  expect(await told('/v1/projects/none/plan')).toBe('/problems/no-such-project')
  expect(await told(`/v1/projects/quay/plan?since=${ids[2]}`)).toBe('/problems/no-such-assessment')
  expect(await told('/v1/projects/quay/plan?since=9')).toBe('/problems/no-such-assessment')
  expect(await told('/v1/projects/quay/plan?check=weight')).toBe('/problems/bad-query')
  expect(await told(`/v1/assessments/${ids[0]}/caps/none/sheet`)).toBe('/problems/no-such-cap')
  const json = await get(`/v1/assessments/${ids[0]}/sheet`, 'application/json')
  expect([json.statusCode, json.json().type]).toEqual([406, '/problems/not-acceptable'])
})
