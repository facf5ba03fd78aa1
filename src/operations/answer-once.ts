import type { Transaction } from 'kysely'
import { amend, claim, LEASE_MS, type Reply, type Request, release, renew, settle } from '../store/idempotency.ts'
import type { Tables } from '../store/tables.ts'
import type { Office } from './office.ts'

export type { Reply }
/** Keeps the reply in the transaction of what it tells. */
export type Keep = (trx: Transaction<Tables>, reply: Reply) => Promise<void>

/**
 * Answers a request once for its Idempotency-Key: a retry gets the same bytes. Without a key it just runs. A run that throws
 * leaves the key free. Throws `idempotency-mismatch` and `idempotency-running`.
 */
export async function answerOnce(
  { store }: Pick<Office, 'store'>,
  request: Request | undefined,
  run: (keep: Keep) => Promise<Reply>,
): Promise<Reply & { readonly replayed: boolean }> {
  if (!request) return { ...(await run(async () => undefined)), replayed: false }
  const claimed = await claim(store, request)
  if ('status' in claimed) return { ...claimed, replayed: true }
  // A renewal that fails costs the lease at worst, and then the run is undone where it would be kept.
  const alive = setInterval(() => void renew(store, claimed).catch(() => undefined), LEASE_MS / 3)
  try {
    return { ...(await run((trx, reply) => settle(trx, claimed, reply))), replayed: false }
  } catch (fault) {
    // Where the store is gone the lease ends by itself.
    await release(store, claimed).catch(() => undefined)
    throw fault
  } finally {
    clearInterval(alive)
  }
}

/** Lets retries of a request get another reply than the one that was kept. */
export async function answerBetter(
  { store }: Pick<Office, 'store'>,
  request: Request | undefined,
  reply: Reply,
): Promise<void> {
  if (request) await amend(store, request, reply)
}
