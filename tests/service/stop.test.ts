import { type ChildProcess, spawn } from 'node:child_process'
import { once } from 'node:events'
import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { afterEach, expect, test } from 'vitest'
import { startService } from './start-service.ts'

const schedule = readFileSync(new URL('../../schema/examples/assessment.json', import.meta.url), 'utf8')
const started: ChildProcess[] = []
afterEach(() => {
  for (const child of started.splice(0)) child.kill('SIGKILL')
})

async function start(LOG_LEVEL: string) {
  const { child, address, log } = await startService({ env: { LOG_LEVEL } })
  started.push(child)
  return { child, url: address, log }
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
  const { child, url } = await start('warn')
  const answer = assess(url, longSchedule(300))
  const metrics = async () => (await fetch(`${url}/metrics`)).text()
  await expect.poll(metrics, { timeout: 10_000 }).toContain('kentledge_workers_busy 1')
  const exit = once(child, 'exit')
  child.kill('SIGTERM')
  // The signal is handled as soon as the process has a turn; from then on it takes no work.
  const takesWork = () =>
    fetch(`${url}/readyz`).then(
      (reply) => reply.ok,
      () => false,
    )
  await expect.poll(takesWork, { timeout: 10_000 }).toBe(false)
  const reply = await answer
  expect(reply.status).toBe(200)
  expect(((await reply.json()) as { result: { summary: { caps: number } } }).result.summary.caps).toBe(1800)
  expect((await exit)[0]).toBe(0)
})

test('one log line a request, with the trace id of the caller; problems carry it too', async () => {
  const { url, log } = await start('info')
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
  const { url } = await start('silent')
  for (let i = 0; i < 20; i++) await fetch(`${url}/v1/methods/unheard-of-${i}`)
  const text = await (await fetch(`${url}/metrics`)).text()
  expect(text).toContain('route="/v1/methods/:id",status="404"')
  expect(text).not.toContain('unheard-of')
  expect(text).toContain('kentledge_build_info{engine="kentledge/')
  expect(text).toContain('nodejs_eventloop_lag')
})

test('all faults of the environment are told at once, and the process ends with 1', async () => {
  const child = spawn(process.execPath, [fileURLToPath(new URL('../../src/main.ts', import.meta.url))], {
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
