import { afterEach, expect, test } from 'vitest'
import { Problem } from '../../src/errors.ts'
import { type Work, WorkerPool } from '../../src/jobs/pool.ts'
import type { obey } from './thread-entry.ts'

type Task = Parameters<typeof obey>[0]
const work: Work<Task, Uint8Array> = { entry: new URL('./thread-entry.ts', import.meta.url), name: 'obey' }
const open: WorkerPool[] = []
function pool(queue: number, seconds = 30) {
  const made = new WorkerPool({ workers: 1, queue, seconds })
  open.push(made)
  return { run: (task: Task, signal: AbortSignal) => made.run(work, task, signal) }
}
afterEach(async () => {
  for (const p of open.splice(0)) await p.close()
})
const stays = () => new AbortController().signal
const codeOf = (run: Promise<unknown>) =>
  run.then(
    () => 'answered',
    (fault: unknown) => (fault instanceof Problem ? fault.code : String(fault)),
  )
const text = async (run: Promise<Uint8Array>) => new TextDecoder().decode(await run)

test('answers come back as bytes, refusals as problems', async () => {
  const p = pool(4)
  expect(await text(p.run({ answer: 'yes' }, stays()))).toBe('yes')
  expect(await codeOf(p.run({ refuse: true }, stays()))).toBe('malformed-json')
})

test('beyond the queue work is refused at once, the rest is answered', async () => {
  const p = pool(1)
  await p.run({}, stays())
  const codes = await Promise.all(Array.from({ length: 4 }, () => codeOf(p.run({ sleep: 200 }, stays()))))
  expect(codes.filter((c) => c === 'answered')).toHaveLength(2)
  expect(codes.filter((c) => c === 'overloaded')).toHaveLength(2)
})

test('a thread that dies, or overruns, costs its own task only', async () => {
  const p = pool(4, 1)
  expect(await codeOf(p.run({ die: true }, stays()))).toBe('worker-died')
  expect(await codeOf(p.run({ sleep: 5_000 }, stays()))).toBe('timed-out')
  expect(await text(p.run({ answer: 'still here' }, stays()))).toBe('still here')
})

test('a client that leaves ends its work and frees the thread', async () => {
  const p = pool(4)
  const leaves = new AbortController()
  const run = codeOf(p.run({ sleep: 20_000 }, leaves.signal))
  setTimeout(() => leaves.abort(), 100)
  expect(await run).toBe('worker-died')
  expect(await text(p.run({ answer: 'free' }, stays()))).toBe('free')
})

test('a defect of the entry is no lost thread: nobody is told to try again', async () => {
  const p = pool(4)
  expect(await codeOf(p.run({ fail: true }, stays()))).toBe('internal-error')
  expect(await text(p.run({ answer: 'still here' }, stays()))).toBe('still here')
})
