import { createHash, randomBytes, randomInt } from 'node:crypto'
import type { Actor, Scope } from './actor.ts'
import type { Store } from './open-store.ts'
import type { KeyRow } from './tables.ts'

export type KeyRights = {
  /** The person or pipeline that records show. */
  readonly name: string
  readonly scopes: readonly Scope[]
  readonly projects: readonly string[]
  readonly expiresAt?: Date
}

/** What a key begins with, so that scanners of secrets know one. */
const PREFIX = 'kentledge'
const LETTERS = 'abcdefghjkmnpqrstuvwxyz23456789'

const fingerprint = (key: string) => createHash('sha256').update(key).digest('hex')
const newId = () => Array.from({ length: 10 }, () => LETTERS[randomInt(LETTERS.length)]).join('')

/** Makes a key: `kentledge_<id>_<256 random bits>`. It is given once; the store keeps its hash. */
export async function makeKey(
  store: Store,
  rights: KeyRights,
  replaces?: string,
): Promise<{ id: string; key: string }> {
  const id = newId()
  const key = `${PREFIX}_${id}_${randomBytes(32).toString('base64url')}`
  const row: KeyRow = {
    id,
    hash: fingerprint(key),
    name: rights.name,
    scopes: JSON.stringify(rights.scopes),
    projects: JSON.stringify(rights.projects),
    created_at: store.clock().toISOString(),
    expires_at: rights.expiresAt?.toISOString() ?? null,
    revoked_at: null,
    replaces: replaces ?? null,
  }
  await store.db.insertInto('keys').values(row).execute()
  return { id, key }
}

export const listKeys = (store: Store): Promise<KeyRow[]> =>
  store.reader.selectFrom('keys').selectAll().orderBy('created_at').orderBy('id').execute()

/** Revokes a key at once. False where there is no such key, or it was revoked before. */
export async function revokeKey(store: Store, id: string): Promise<boolean> {
  const done = await store.db
    .updateTable('keys')
    .set({ revoked_at: store.clock().toISOString() })
    .where('id', '=', id)
    .where('revoked_at', 'is', null)
    .returning('id')
    .executeTakeFirst()
  return done !== undefined
}

/** A new key of the same rights; the old one ends after `graceSeconds`. Undefined where there is no such key that lives. */
export async function rotateKey(store: Store, id: string, graceSeconds: number) {
  const old = await store.reader.selectFrom('keys').selectAll().where('id', '=', id).executeTakeFirst()
  const now = store.clock()
  if (!old || stateOf(old, now) !== 'valid') return undefined
  const { name, expires_at } = old
  const rights = { name, scopes: JSON.parse(old.scopes) as Scope[], projects: JSON.parse(old.projects) as string[] }
  const made = await makeKey(store, { ...rights, ...(expires_at && { expiresAt: new Date(expires_at) }) }, id)
  const end = new Date(now.getTime() + graceSeconds * 1000).toISOString()
  if (!expires_at || end < expires_at)
    await store.db.updateTable('keys').set({ expires_at: end }).where('id', '=', id).execute()
  return made
}

export function stateOf({ revoked_at, expires_at }: KeyRow, now: Date): 'valid' | 'revoked' | 'expired' {
  if (revoked_at !== null) return 'revoked'
  return expires_at !== null && expires_at <= now.toISOString() ? 'expired' : 'valid'
}

/** Who a key stands for; the reason where it stands for nobody. Asked of the store each time: a revoked key ends with the next request. */
export async function actorOf(store: Store, key: string): Promise<Actor | 'unknown' | 'revoked' | 'expired'> {
  const row = await store.reader.selectFrom('keys').selectAll().where('hash', '=', fingerprint(key)).executeTakeFirst()
  if (!row) return 'unknown'
  const state = stateOf(row, store.clock())
  if (state !== 'valid') return state
  return { name: row.name, key: row.id, scopes: JSON.parse(row.scopes), projects: JSON.parse(row.projects) }
}

/** Whether a key was ever made. Keys are never deleted, so a service that asked for keys does not open when the last is revoked. */
export async function anyKey(store: Store): Promise<boolean> {
  return (await store.reader.selectFrom('keys').select('id').limit(1).executeTakeFirst()) !== undefined
}
