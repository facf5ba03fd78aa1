import { type ChildProcess, spawn } from 'node:child_process'
import { once } from 'node:events'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, expect, test } from 'vitest'

const main = new URL('../../src/main.ts', import.meta.url).pathname
const schedule = readFileSync(new URL('../../schema/examples/assessment.json', import.meta.url), 'utf8')
const started: ChildProcess[] = []
afterEach(() => {
  for (const child of started.splice(0)) child.kill('SIGKILL')
})

async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1')
  await once(server, 'listening')
  const { port } = server.address() as { port: number }
  server.close()
  return port
}

async function start(
  env: Record<string, string> = {},
): Promise<{ child: ChildProcess; url: string; log: () => string }> {
  const port = await freePort()
  const data = mkdtempSync(join(tmpdir(), 'kentledge-data-'))
  const child = spawn(process.execPath, [main], {
    env: { ...process.env, PORT: String(port), DATA_DIR: data, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  started.push(child)
  child.once('exit', () => rmSync(data, { recursive: true, force: true }))
  let log = ''
  child.stdout!.on('data', (chunk) => {
    log += chunk
  })
  child.stderr!.on('data', (chunk) => {
    log += chunk
  })
  const url = `http://127.0.0.1:${port}`
  for (let i = 0; i < 200; i++) {
    if (
      await fetch(`${url}/readyz`).then(
        (r) => r.ok,
        () => false,
      )
    )
      return { child, url, log: () => log }
    await new Promise((resolve) => setTimeout(resolve, 50))
  }
  throw new Error(`the service did not start: ${log}`)
}

/** A schedule that keeps a worker busy for a while: the example's caps many times over. */
function longSchedule(times: number): string {
  const s = JSON.parse(schedule)
  const caps = s.caps
  const rows = s.loads.rows
  s.caps = Array.from({ length: times }, (_, i) =>
    caps.map((c: { mark: string; x: number }) => ({ ...c, mark: `${c.mark}-${i}`, x: c.x + 40 * i })),
  ).flat()
  s.loads.rows = Array.from({ length: times }, (_, i) =>
    rows.map((r: { cap: string }) => ({ ...r, cap: `${r.cap}-${i}` })),
  ).flat()
  return JSON.stringify(s)
}
const assess = (url: string, body: string) =>
  fetch(`${url}/v1/assessments?trace=none`, { method: 'POST', headers: { 'content-type': 'application/json' }, body })

test('SIGTERM: what is under way is answered, then the process ends with 0', async () => {
  const { child, url } = await start({ LOG_LEVEL: 'warn' })
  const answer = assess(url, longSchedule(300))
  await new Promise((resolve) => setTimeout(resolve, 150))
  const exit = once(child, 'exit')
  child.kill('SIGTERM')
  await new Promise((resolve) => setTimeout(resolve, 30))
  const ready = await fetch(`${url}/readyz`).then(
    (r) => r.status,
    () => 0,
  )
  expect([503, 0]).toContain(ready)
  const reply = await answer
  expect(reply.status).toBe(200)
  expect(((await reply.json()) as { result: { summary: { caps: number } } }).result.summary.caps).toBe(1800)
  expect((await exit)[0]).toBe(0)
})

test('one log line a request, with the trace id of the caller; problems carry it too', async () => {
  const { url, log } = await start({ LOG_LEVEL: 'info' })
  const traceId = '4bf92f3577b34da6a3ce929d0e0e4736'
  const reply = await fetch(`${url}/nowhere`, { headers: { traceparent: `00-${traceId}-00f067aa0ba902b7-01` } })
  expect(((await reply.json()) as { traceId: string }).traceId).toBe(traceId)
  await new Promise((resolve) => setTimeout(resolve, 100))
  const lines = log()
    .trim()
    .split('\n')
    .map((l) => JSON.parse(l))
    .filter((l) => l.traceId === traceId)
  expect(lines).toHaveLength(1)
  expect(lines[0]).toMatchObject({ status: 404, method: 'GET', route: 'unknown' })
})

test('metrics go by route template', async () => {
  const { url } = await start({ LOG_LEVEL: 'silent' })
  for (let i = 0; i < 20; i++) await fetch(`${url}/v1/methods/unheard-of-${i}`)
  const text = await (await fetch(`${url}/metrics`)).text()
  expect(text).toContain('route="/v1/methods/:id",status="404"')
  expect(text).not.toContain('unheard-of')
  expect(text).toContain('kentledge_build_info{engine="kentledge/')
  expect(text).toContain('nodejs_eventloop_lag')
})

test('all faults of the environment are told at once, and the process ends with 1', async () => {
  const child = spawn(process.execPath, [main], {
    env: { ...process.env, PORT: 'eighty', LOG_LEVEL: 'loud', BODY_LIMIT: '-3' },
    stdio: ['ignore', 'ignore', 'pipe'],
  })
  let said = ''
  child.stderr!.on('data', (chunk) => {
    said += chunk
  })
  expect((await once(child, 'exit'))[0]).toBe(1)
  for (const name of ['PORT', 'LOG_LEVEL', 'BODY_LIMIT']) expect(said).toContain(name)
})
