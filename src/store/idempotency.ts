import { randomUUID } from 'node:crypto'
import type { Transaction } from 'kysely'
import { Problem } from '../errors.ts'
import type { Store } from './open-store.ts'
import type { Tables } from './tables.ts'

/** A reply is kept so long. */
const KEPT_MS = 24 * 3600 * 1000
/** A run that has not renewed its claim for so long is taken for dead. */
export const LEASE_MS = 3000

export type Reply = {
  readonly status: number
  readonly headers: Readonly<Record<string, string>>
  readonly body: Uint8Array
}
export type Request = { readonly owner: string; readonly key: string; readonly fingerprint: string }
/** The right to answer a request: to be renewed while it runs, then settled in the transaction of its effect, or given up. */
export type Claim = Request & { readonly runner: string }

const later = (store: Store, ms: number) => new Date(store.clock().getTime() + ms).toISOString()

/**
 * Claims a request by its Idempotency-Key, or gives the reply that it had. Throws `idempotency-mismatch` where the key stands for
 * another request, `idempotency-running` while the first one runs.
 */
export function claim(store: Store, request: Request): Promise<Claim | Reply> {
  const { owner, key, fingerprint } = request
  return store.db.transaction().execute(async (trx) => {
    const now = store.clock().toISOString()
    const runner = randomUUID()
    const lease = { runner, lease_until: later(store, LEASE_MS) }
    await trx.deleteFrom('idempotency').where('expires_at', '<=', now).execute()
    const made = await trx
      .insertInto('idempotency')
      .values({ owner, key, fingerprint, state: 'running', ...lease, expires_at: later(store, KEPT_MS) })
      .onConflict((c) => c.doNothing())
      .returning('key')
      .executeTakeFirst()
    if (made) return { ...request, runner }
    const found = await trx
      .selectFrom('idempotency')
      .selectAll()
      .where('owner', '=', owner)
      .where('key', '=', key)
      .executeTakeFirst()
    if (found && found.fingerprint !== fingerprint) throw new Problem('idempotency-mismatch')
    if (found?.state === 'done')
      return { status: found.status!, headers: JSON.parse(found.headers!), body: found.body! }
    if (!found || found.lease_until > now) throw new Problem('idempotency-running', { seconds: 1 })
    const taken = await trx
      .updateTable('idempotency')
      .set(lease)
      .where('owner', '=', owner)
      .where('key', '=', key)
      .where('runner', '=', found.runner)
      .where('state', '=', 'running')
      .returning('key')
      .executeTakeFirst()
    if (!taken) throw new Problem('idempotency-running', { seconds: 1 })
    return { ...request, runner }
  })
}

const own = (db: Store['db'] | Transaction<Tables>, { owner, key, runner }: Claim) =>
  db
    .updateTable('idempotency')
    .where('owner', '=', owner)
    .where('key', '=', key)
    .where('runner', '=', runner)
    .where('state', '=', 'running')

/** Says that the run lives. */
export async function renew(store: Store, claim: Claim): Promise<void> {
  await own(store.db, claim)
    .set({ lease_until: later(store, LEASE_MS) })
    .execute()
}

/** Keeps the reply, in the transaction of what it tells. Throws, and so undoes that, when another run took over meanwhile. */
export async function settle(trx: Transaction<Tables>, claim: Claim, reply: Reply): Promise<void> {
  const kept = await own(trx, claim)
    .set({ state: 'done', status: reply.status, headers: JSON.stringify(reply.headers), body: reply.body })
    .returning('key')
    .executeTakeFirst()
  if (!kept) throw new Problem('idempotency-running', { seconds: 1 })
}

/** Keeps another reply than the first: what was begun has ended before that was sent. */
export async function amend(store: Store, { owner, key, fingerprint }: Request, reply: Reply): Promise<void> {
  await store.db
    .updateTable('idempotency')
    .set({ status: reply.status, headers: JSON.stringify(reply.headers), body: reply.body })
    .where('owner', '=', owner)
    .where('key', '=', key)
    .where('fingerprint', '=', fingerprint)
    .where('state', '=', 'done')
    .execute()
}

/** Gives the claim up: nothing was done, so the key may come again. */
export async function release(store: Store, { owner, key, runner }: Claim): Promise<void> {
  await store.db
    .deleteFrom('idempotency')
    .where('owner', '=', owner)
    .where('key', '=', key)
    .where('runner', '=', runner)
    .where('state', '=', 'running')
    .execute()
}

/** Claims of a process that ended: only where no other process serves the same database. */
export async function releaseAll(store: Store): Promise<void> {
  await store.db.deleteFrom('idempotency').where('state', '=', 'running').execute()
}
