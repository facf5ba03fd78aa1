import { afterEach, describe, expect, test } from 'vitest'
import { Problem } from '../../src/errors.ts'
import { answerOnce, type Reply } from '../../src/operations/answer-once.ts'
import { claim } from '../../src/store/idempotency.ts'
import { bothDatabases, closeStores, emptyStore } from './databases.ts'

afterEach(closeStores)
const request = { owner: 'key1', key: 'a', fingerprint: 'f' }
const reply = (text: string): Reply => ({ status: 201, headers: { location: '/x' }, body: Buffer.from(text) })
const codeOf = (run: Promise<unknown>) =>
  run.then(
    () => 'done',
    (fault) => (fault as Problem).code,
  )

describe.each(bothDatabases())('on $name', (database) => {
  const hours = 3600 * 1000
  async function open() {
    let now = Date.UTC(2030, 0, 1)
    const store = await emptyStore(database, { clock: () => new Date(now) })
    const run = (text: string, over: Partial<typeof request> = {}) =>
      answerOnce({ store }, { ...request, ...over }, async (keep) => {
        const made = reply(text)
        await store.db.transaction().execute((trx) => keep(trx, made))
        return made
      })
    return {
      store,
      run,
      pass: (ms: number) => {
        now += ms
      },
    }
  }

  test('a retry gets the same bytes, another body is refused, another API key is independent', async () => {
    const { run } = await open()
    expect(await run('first')).toMatchObject({ replayed: false })
    const again = await run('second')
    expect([again.replayed, again.status, again.headers, Buffer.from(again.body).toString()]).toEqual([
      true,
      201,
      { location: '/x' },
      'first',
    ])
    expect(await codeOf(run('third', { fingerprint: 'g' }))).toBe('idempotency-mismatch')
    expect(await run('fourth', { owner: 'key2' })).toMatchObject({ replayed: false })
  })

  test('a reply is kept for 24 hours', async () => {
    const { run, pass } = await open()
    await run('first')
    pass(24 * hours - 1)
    expect((await run('second')).replayed).toBe(true)
    pass(1)
    expect((await run('third', { fingerprint: 'g' })).replayed).toBe(false)
  })

  test('a run that lives is waited for; one that died is taken over, and can no longer keep what it did', async () => {
    const { store, run, pass } = await open()
    let first: Promise<unknown> | undefined
    await new Promise<void>((started) => {
      first = codeOf(
        answerOnce({ store }, request, async (keep) => {
          started()
          await new Promise((resolve) => setTimeout(resolve, 200))
          await store.db.transaction().execute((trx) => keep(trx, reply('late')))
          return reply('late')
        }),
      )
    })
    expect(await codeOf(run('second'))).toBe('idempotency-running')
    pass(5000)
    expect(await run('third')).toMatchObject({ replayed: false })
    expect(await first).toBe('idempotency-running')
    expect(Buffer.from((await run('fourth')).body).toString()).toBe('third')
  })

  test('a run that fails leaves the key free', async () => {
    const { store, run } = await open()
    const failing = answerOnce({ store }, request, async () => {
      throw new Problem('overloaded', { seconds: 1 })
    })
    expect(await codeOf(failing)).toBe('overloaded')
    expect(await run('other', { fingerprint: 'g' })).toMatchObject({ replayed: false })
  })

  test('of 100 claims at once one is given', async () => {
    const { store } = await open()
    const codes = await Promise.all(Array.from({ length: 100 }, () => codeOf(claim(store, request))))
    expect(codes.filter((code) => code === 'done')).toHaveLength(1)
    expect(codes.filter((code) => code === 'idempotency-running')).toHaveLength(99)
  })
})
