import type { Store } from './open-store.ts'

/** Writes one row, so that a full or read-only disk shows. Throws `store-unavailable`. */
export async function probe(store: Store): Promise<void> {
  const written_at = store.clock().toISOString()
  await store.db
    .insertInto('probe')
    .values({ id: 1, written_at })
    .onConflict((c) => c.column('id').doUpdateSet({ written_at }))
    .execute()
}
