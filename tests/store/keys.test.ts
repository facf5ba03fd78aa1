import { afterEach, describe, expect, test } from 'vitest'
import { authenticate } from '../../src/operations/authenticate.ts'
import { actorOf, listKeys, makeKey, revokeKey, rotateKey } from '../../src/store/keys.ts'
import { bothDatabases, closeStores, emptyStore } from './databases.ts'

afterEach(closeStores)
const rights = { name: 'A. Engineer', scopes: ['read', 'sign'] as const, projects: ['quay'] }

describe.each(bothDatabases())('on $name', (database) => {
  test('a key stands for its person until it is revoked; the store holds no key', async () => {
    const store = await emptyStore(database)
    const { id, key } = await makeKey(store, rights)
    expect(key).toMatch(/^kentledge_[a-z0-9]{10}_[\w-]{43}$/)
    expect(await actorOf(store, key)).toEqual({
      name: 'A. Engineer',
      key: id,
      scopes: ['read', 'sign'],
      projects: ['quay'],
    })
    expect(JSON.stringify(await listKeys(store))).not.toContain(key.split('_').slice(2).join('_'))
    expect(await actorOf(store, `${key.slice(0, -1)}!`)).toBe('unknown')
    expect(await revokeKey(store, id)).toBe(true)
    expect(await actorOf(store, key)).toBe('revoked')
    expect(await revokeKey(store, id)).toBe(false)
  })

  test('a key ends when it expires, a rotated one after its grace', async () => {
    let now = Date.UTC(2030, 0, 1)
    const store = await emptyStore(database, { clock: () => new Date(now) })
    const { id, key } = await makeKey(store, { ...rights, expiresAt: new Date(Date.UTC(2031, 0, 1)) })
    const next = (await rotateKey(store, id, 60))!
    expect(await actorOf(store, key)).toMatchObject({ key: id })
    expect(await actorOf(store, next.key)).toMatchObject({ key: next.id, name: 'A. Engineer' })
    now += 60_000
    expect(await actorOf(store, key)).toBe('expired')
    expect(await rotateKey(store, id, 0)).toBeUndefined()
    now = Date.UTC(2031, 0, 1)
    expect(await actorOf(store, next.key)).toBe('expired')
  })

  test('a service without keys is open until the first is made, and never again', async () => {
    const store = await emptyStore(database)
    const ask = authenticate({ store }, 'keys')
    expect(await ask(undefined)).toMatchObject({ name: 'anonymous' })
    const { id, key } = await makeKey(store, rights)
    await expect(ask(undefined)).rejects.toThrow('asks for a key')
    expect(await ask(`Bearer ${key}`)).toMatchObject({ key: id })
    await revokeKey(store, id)
    await expect(ask(`Bearer ${key}`)).rejects.toThrow('was revoked')
    await expect(ask(undefined)).rejects.toThrow('asks for a key')
    expect(await authenticate({ store }, 'off')(undefined)).toMatchObject({ name: 'anonymous' })
  })
})
