import { once } from 'node:events'
import { setTimeout as wait } from 'node:timers/promises'
import { afterEach, describe, expect, test } from 'vitest'
import { readExamples } from '../../src/contract/examples.ts'
import { slowSchedule } from '../jobs/slow-schedule.ts'
import { bothDatabases } from '../store/databases.ts'
import { type Started, startService } from './start-service.ts'

/** Jobs of services that are killed, stopped and doubled. ROUNDS=50 for a long run. */
const rounds = Number(process.env.ROUNDS ?? 1)
/** A run that was killed is found on PostgreSQL after ten seconds of silence. */
const patience = 90_000

type Answer = { id: string; state: string; attempts: number; contentHash?: string; problem?: { type: string } }

const url = '/v1/projects/quay/assessments'
const started: Started[] = []
async function start(env: Readonly<Record<string, string>>, more: Record<string, string> = {}): Promise<Started> {
  const made = await startService({ env: { LOG_LEVEL: 'info', WORKERS: '2', ...env, ...more } })
  started.push(made)
  const headers = { 'content-type': 'application/json' }
  await fetch(`${made.address}/v1/projects/quay`, { method: 'PUT', headers, body: '{"title":"Quay"}' })
  return made
}
async function kill({ child }: Started, signal: NodeJS.Signals = 'SIGKILL'): Promise<unknown[]> {
  const exit = once(child, 'exit')
  child.kill(signal)
  return exit
}
afterEach(async () => {
  for (const { child } of started.splice(0)) if (child.exitCode === null) child.kill('SIGKILL')
})

async function post(to: Started, schedule: object, headers: Record<string, string> = { prefer: 'respond-async' }) {
  const all = { 'content-type': 'application/json', ...headers }
  const reply = await fetch(to.address + url, { method: 'POST', headers: all, body: JSON.stringify(schedule) })
  return (await reply.json()) as Answer
}
const get = async (from: Started, id: string) =>
  (await (await fetch(`${from.address}/v1/assessments/${id}`)).json()) as Answer
async function until(from: Started, id: string, reached: (answer: Answer) => boolean): Promise<Answer> {
  for (const end = Date.now() + patience; Date.now() < end; await wait(20)) {
    const answer = await get(from, id)
    if (reached(answer)) return answer
  }
  throw new Error(`${id} stays as it is: ${JSON.stringify(await get(from, id))}\n${from.log()}`)
}
const isEnded = ({ state }: Answer) => !['queued', 'running'].includes(state)
const isRunning = ({ state }: Answer) => state === 'running'
const lines = ({ log }: Started) =>
  log()
    .split('\n')
    .filter((line) => line.includes('"msg":"job"'))
    .map((line) => JSON.parse(line) as { job: string; state: string; traceId: string; attempt: number })

const JOBS = 6
const slow = slowSchedule(30)

describe.each(bothDatabases())('on $name', (database) => {
  test(
    `a service killed in the middle of a job, ${rounds} times: the next start ends it with the same hash`,
    async () => {
      const { env } = await database.place()
      let service = await start(env)
      const { contentHash } = await post(service, slow, {})
      let [tries, most] = [0, 0]
      for (let round = 0; round < rounds; round++) {
        const { id } = await post(service, slow)
        await until(service, id, isRunning)
        await wait(300 * Math.random())
        await kill(service)
        service = await start(env)
        const ended = await until(service, id, isEnded)
        expect(ended).toMatchObject({ state: 'completed', contentHash })
        const { attempt } = lines(service).find((line) => line.job === id && line.state === 'completed') ?? {}
        // The kill may have come just before the job was claimed, or just after its record was there.
        tries += attempt ?? 1
        most = Math.max(most, attempt ?? 1)
      }
      const integrity = await (await fetch(`${service.address}/v1/projects/quay/integrity`)).json()
      expect(integrity).toMatchObject({ holds: true, records: rounds + 1 })
      expect(await kill(service, 'SIGTERM')).toEqual([0, null])
      console.info(`${database.name}: ${rounds} jobs killed, ${tries} tries in all, at most ${most} of one job`)
    },
    60_000 + rounds * 60_000,
  )

  test('SIGTERM: a job that can end in time does; another goes back into line, and the next start ends it', async () => {
    const { env } = await database.place()
    const first = await start(env, { SHUTDOWN_TIMEOUT: '30' })
    const traceId = 'c0ffee'.repeat(6).slice(0, 32)
    const { id: short } = await post(first, slowSchedule(10), {
      prefer: 'respond-async',
      traceparent: `00-${traceId}-00f067aa0ba902b7-01`,
    })
    await until(first, short, (answer) => isRunning(answer) || isEnded(answer))
    expect(await kill(first, 'SIGTERM')).toEqual([0, null])
    expect(lines(first).map(({ state, traceId }) => ({ state, traceId }))).toEqual([
      { state: 'running', traceId },
      { state: 'completed', traceId },
    ])

    const second = await start(env, { SHUTDOWN_TIMEOUT: '2' })
    expect((await get(second, short)).state).toBe('completed')
    const { id: long } = await post(second, slowSchedule(2000))
    await until(second, long, isRunning)
    const stream = fetch(`${second.address}/v1/assessments/${long}/events`).then((reply) => reply.text())
    await wait(200)
    const begun = performance.now()
    expect(await kill(second, 'SIGTERM')).toEqual([0, null])
    // The job itself would take minutes.
    expect(performance.now() - begun).toBeLessThan(20_000)
    expect(await stream).not.toMatch(/event: (completed|failed)/)

    const third = await start(env)
    // The run that was given back does not count as a try.
    expect(await until(third, long, isRunning)).toMatchObject({ attempts: 1 })
    await fetch(`${third.address}/v1/assessments/${long}`, { method: 'DELETE' })
  })
})

const [sqlite, postgres] = bothDatabases()

test('a job whose service is lost each time is given up, and the jobs behind it run', async () => {
  const { env } = await sqlite!.place()
  let service = await start(env, { WORKERS: '1' })
  const { id: poison } = await post(service, slowSchedule(400))
  const { id: good } = await post(service, readExamples().assessment as object)
  for (let attempts = 1; attempts <= 3; attempts++) {
    await until(service, poison, (answer) => isRunning(answer) && answer.attempts === attempts)
    await kill(service)
    service = await start(env, { WORKERS: '1' })
  }
  expect(await until(service, poison, isEnded)).toMatchObject({
    state: 'failed',
    problem: { type: '/problems/job-abandoned' },
  })
  expect(await until(service, good, isEnded)).toMatchObject({ state: 'completed' })
}, 120_000)

test(
  `two replicas share the jobs; one is killed in the middle, ${rounds} times, and the other ends them all`,
  async () => {
    const { env } = await postgres!.place()
    const stays = await start(env)
    const { contentHash } = await post(stays, slow, {})
    const shares: number[] = []
    for (let round = 0; round < rounds; round++) {
      const leaves = await start(env)
      // A thread of each is warm.
      for (const one of [stays, leaves]) await post(one, readExamples().assessment as object, {})
      const before = lines(stays).length
      const ids: string[] = []
      for (let i = 0; i < JOBS; i++) ids.push((await post(i % 2 ? stays : leaves, slow)).id)
      const count = (state: string) => lines(leaves).filter((line) => line.state === state).length
      const isAtIt = () => count('completed') > 0 && count('running') > count('completed')
      for (const end = Date.now() + patience; !isAtIt() && Date.now() < end; ) await wait(10)
      await kill(leaves)
      const left = count('completed')
      for (const id of ids)
        expect(await until(stays, id, isEnded)).toMatchObject({ id, state: 'completed', contentHash })
      const own = lines(stays)
        .slice(before)
        .filter((line) => line.state === 'completed' && ids.includes(line.job)).length
      expect(left).toBeGreaterThan(0)
      expect(own).toBeGreaterThan(0)
      // The kill may have come between a record and its line in the log.
      expect([JOBS - 1, JOBS]).toContain(own + left)
      shares.push(own)
    }
    const integrity = await (await fetch(`${stays.address}/v1/projects/quay/integrity`)).json()
    expect(integrity).toMatchObject({ holds: true, records: 1 + rounds * (JOBS + 2) })
    console.info(`two replicas: ${rounds} kills, of ${JOBS} jobs the one that stayed ended ${shares.join(', ')}`)
  },
  60_000 + rounds * 120_000,
)

test('on PostgreSQL a job is picked up within milliseconds', async () => {
  const { env } = await postgres!.place()
  const [here, there] = [await start(env, { WORKERS: '1' }), await start(env, { WORKERS: '1' })]
  const times: number[] = []
  for (let i = 0; i < 11; i++) {
    const { id } = await post(here, readExamples().assessment as object)
    await until(here, id, isEnded)
    const record = (await (await fetch(`${here.address}/v1/assessments/${id}/content`)).json()) as object
    expect(record).toHaveProperty('result')
    const line = [here, there].flatMap((s) => s.log().split('\n')).find((l) => l.includes(id) && l.includes('running'))!
    // The first 48 bits of the id are the moment of the post, ms.
    times.push((JSON.parse(line) as { time: number }).time - Number.parseInt(id.replaceAll('-', '').slice(0, 12), 16))
  }
  times.sort((a, b) => a - b)
  console.info(`pick-up: median ${times[5]} ms, largest ${times[10]} ms`)
  // Polling alone would take half a second on average.
  expect(times[5]).toBeLessThan(250)
})
