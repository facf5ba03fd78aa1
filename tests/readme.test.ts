import { execFile } from 'node:child_process'
import { mkdtemp, readFile, rm, symlink, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { promisify } from 'node:util'
import { afterAll, beforeAll, expect, test } from 'vitest'
import type { Schemas } from '../schema/client.ts'
import { endService, type Started, startService } from './service/start-service.ts'

/** README's examples are run as a reader would: each fenced block as it stands, but for the address of the service. */

const run = promisify(execFile)
const root = fileURLToPath(new URL('../', import.meta.url))
const readme = await readFile(join(root, 'README.md'), 'utf8')
const inReadme = 'http://127.0.0.1:8080'
const blocks = [...readme.matchAll(/^```(\w*)\n(.*?)^```$/gms)].map((found) => ({
  language: found[1]!,
  text: found[2]!,
  title: `line ${readme.slice(0, found.index).split('\n').length}`,
}))
const of = (...languages: string[]) => blocks.filter((block) => languages.includes(block.language))
const schedules = (block: { text: string }) => block.text.includes('demo-schedule.json')

let service: Started
let folder: string
/** What the service says of the demo's schedule and of the single pile, asked without any of README's code. */
let schedule: Schemas['AssessmentAnswer']['result']
let pile: Schemas['SinglePileResult']

const json = (text: string) => JSON.parse(text)
const file = (name: string) => readFile(join(root, 'schema/examples', name), 'utf8')
async function post(path: string, body: object): Promise<unknown> {
  const headers = { 'content-type': 'application/json' }
  const reply = await fetch(service.address + path, { method: 'POST', headers, body: JSON.stringify(body) })
  expect(reply.status).toBe(200)
  return await reply.json()
}

beforeAll(async () => {
  service = await startService()
  const [head, ...lines] = (await file('demo-loads.csv')).trim().split(/\r?\n/)
  const rows = lines.map((line) => {
    const names = head!.split(',')
    return Object.fromEntries(line.split(',').map((cell, i) => [names[i], i < 2 ? cell : Number(cell)]))
  })
  const asked = json(await file('demo-schedule.json'))
  asked.loads.rows = rows
  const answer = (await post('/v1/assessments?trace=none', asked)) as Schemas['AssessmentAnswer']
  schedule = answer.result
  pile = ((await post('/v1/single-pile', json(await file('single-pile.json')))) as Schemas['SinglePileAnswer']).result
  // The blocks run in a folder that holds what they name, and nothing is written into the tree.
  folder = await mkdtemp(join(tmpdir(), 'kentledge-readme-'))
  for (const name of ['schema', 'node_modules']) await symlink(join(root, name), join(folder, name), 'junction')
  await writeFile(join(folder, 'package.json'), '{ "type": "module" }')
})
afterAll(async () => {
  await endService(service)
  if (folder) await rm(folder, { recursive: true, force: true })
})

/** What a program prints; an exit code other than 0 fails with what it said. */
async function output(program: string, args: readonly string[]): Promise<string> {
  const { stdout } = await run(program, args, { cwd: folder, maxBuffer: 2 ** 26 }).catch((fault) => {
    throw new Error(`${fault.message}\n${fault.stdout}\n${service.log()}`)
  })
  return stdout
}
const here = (text: string) => text.replaceAll(inReadme, service.address)

/** CI needs Node alone; curl and Python are used where they are. */
async function isThere(program: string): Promise<boolean> {
  const there = await run(program, ['--version']).then(
    () => true,
    () => false,
  )
  if (!there) console.warn(`README: ${program} is not installed here, its examples are not run`)
  return there
}
const [curl, python] = await Promise.all([isThere('curl'), isThere('python3')])

test('every block is of a language that is run here, and names the address that is replaced', () => {
  expect(blocks.map((block) => block.language)).toEqual([
    ...['sh', 'sh', 'ts', 'python', 'sh', 'sh', 'sh', 'sh', 'python', 'sh'],
  ])
  for (const block of blocks) expect(block.text, block.title).toContain(inReadme)
})

const stored = (block: { text: string }) => block.text.includes('/projects/')
const dashboard = (block: { text: string }) => block.text.includes('/graphql')
const calculating = of('sh').filter((block) => !stored(block) && !dashboard(block))
test.runIf(curl).for(calculating.map((block) => [block.title, block] as const))('sh, %s', async ([, block]) => {
  const { result, trace } = json(await output('sh', ['-euc', here(block.text)]))
  expect(trace).toBeUndefined()
  if (schedules(block)) expect(result).toEqual(schedule)
  else expect(result.allowableLoad).toBeGreaterThan(0)
})

test.for(of('ts').map((block) => [block.title, block] as const))('ts, %s: runs', async ([, block]) => {
  await writeFile(join(folder, 'example.ts'), here(block.text))
  const printed = (await output(process.execPath, ['example.ts'])).trim().split('\n')
  const exceeded = schedule.caps.flatMap(({ mark, checks }) =>
    checks.filter((c) => !c.satisfied).map((c) => `${mark} ${c.check} ${c.combination} ${c.utilisation.toFixed(2)}`),
  )
  expect(exceeded.length).toBeGreaterThan(0)
  expect(printed).toEqual(exceeded)
})

test.for(of('ts').map((block) => [block.title, block] as const))('ts, %s: its types hold', async ([, block]) => {
  const config = { extends: join(root, 'tsconfig.json'), files: ['typed.ts'], include: [] }
  await writeFile(join(folder, 'tsconfig.json'), JSON.stringify(config))
  const check = () => output(process.execPath, [join(root, 'node_modules/typescript/bin/tsc'), '-p', folder])
  await writeFile(join(folder, 'typed.ts'), block.text)
  expect(await check()).toBe('')
  await writeFile(join(folder, 'typed.ts'), block.text.replace('.satisfied', '.satisfactory'))
  await expect(check()).rejects.toThrow('satisfactory')
})

test.runIf(curl)('sh: a project is made, and a schedule kept in it once, however often it is sent', async () => {
  const [make, post, again, queue] = of('sh')
    .filter(stored)
    .map((block) => here(block.text))
  expect(json(await output('sh', ['-euc', make!]))).toMatchObject({ slug: 'quay', revision: 0 })
  const record = json(await output('sh', ['-euc', post!]))
  expect(record).toMatchObject({ project: 'quay', revision: 1, summary: schedule.summary })
  expect(json(await output('sh', ['-euc', post!]))).toEqual(record)
  expect(json(await output('sh', ['-euc', again!]))).toMatchObject({ project: 'quay', revision: 2 })
  const [page] = of('sh').filter(dashboard)
  const { data, errors } = json(await output('sh', ['-euc', here(page!.text)]))
  expect(errors).toBeUndefined()
  const { latest } = data.project
  expect([latest.revision, latest.caps.totalCount]).toEqual([2, latest.summary.exceeded])
  expect(latest.changes).toMatchObject({
    verdicts: [
      { cap: 'A3', check: 'pile-compression', turned: 'exceeded' },
      { cap: 'A3', check: 'group-compression', turned: 'exceeded' },
    ],
    inputs: [{ name: 'A3', combination: 'W1', field: 'Fz', before: 3630, after: 4100, unit: 'kN' }],
  })
  const followed = await output('sh', ['-euc', queue!])
  expect(followed).toMatch(/^event: (progress|completed)\ndata: /)
  expect(json(followed.trim().split('\n').at(-1)!)).toMatchObject({ state: 'completed', revision: 3 })
})

test.runIf(python)('python: the hashes of a project are recomputed, and a changed one is seen', async () => {
  const headers = { 'content-type': 'application/json' }
  const put = { method: 'PUT', headers, body: '{ "title": "Quay warehouse" }' }
  expect((await fetch(`${service.address}/v1/projects/quay`, put)).ok).toBe(true)
  const example = await file('assessment.json')
  for (const title of ['Ärmelkanal, “Nord”', 'second']) {
    const body = JSON.stringify({ ...json(example), title })
    const reply = await fetch(`${service.address}/v1/projects/quay/assessments`, { method: 'POST', headers, body })
    expect(reply.status).toBe(201)
  }
  const block = of('python').find(stored)!
  const run = async (text: string) => {
    await writeFile(join(folder, 'hashes.py'), text)
    return (await output('python3', ['hashes.py'])).trim().split('\n')
  }
  const lines = await run(here(block.text))
  expect(lines.length).toBeGreaterThanOrEqual(2)
  expect(lines).toEqual(lines.map((_, i) => `revision ${i + 1} holds`))
  const bent = here(block.text).replace('/content")', '/content").replace(b"0.", b"1.", 1)')
  expect(await run(bent)).toEqual(lines.map((_, i) => `revision ${i + 1} does not hold`))
})

const reckoning = of('python').filter((block) => !stored(block))
test.runIf(python).for(reckoning.map((block) => [block.title, block] as const))('python, %s', async ([, block]) => {
  await writeFile(join(folder, 'example.py'), here(block.text))
  const printed = (await output('python3', ['example.py'])).trim().split('\n')
  expect(printed.shift()).toBe(`allowable load ${pile.allowableLoad!.toFixed(0)} kN`)
  const lines = printed.map((line) => line.split(' '))
  const worst = schedule.caps.map(({ mark, checks }) => ({
    mark,
    ...checks.reduce((a, b) => (b.utilisation > a.utilisation ? b : a)),
  }))
  expect(lines.map((words) => words.slice(0, 3))).toEqual(worst.map((w) => [w.mark, w.check, w.combination]))
  // Printed to two decimals.
  for (const [i, { utilisation }] of worst.entries())
    expect(Math.abs(Number(lines[i]![3]) - utilisation)).toBeLessThan(0.005 + 1e-9)
})
