import { randomUUIDv7 } from 'node:crypto'
import { Problem } from '../errors.ts'
import type { Actor } from './actor.ts'
import { NOTHING, signatureHash } from './chain.ts'
import type { Store } from './open-store.ts'
import type { SignatureRow } from './tables.ts'

/** In the order in which they sign. */
export const roles = ['originator', 'checker', 'approver'] as const
export type Role = (typeof roles)[number]

export const listSignatures = (store: Store, record: string): Promise<SignatureRow[]> =>
  store.reader.selectFrom('signatures').selectAll().where('record', '=', record).orderBy('ordinal').execute()

/**
 * Signs a record: binds who, as what, with which meaning, when by the server's clock, and the hash of the record. Throws
 * `signature-step` where another role is next, `signature-same-person` where this person signed before.
 */
export function sign(
  store: Store,
  record: { readonly id: string; readonly project: string; readonly record_hash: string },
  actor: Actor,
  { role, meaning }: { readonly role: Role; readonly meaning: string },
): Promise<SignatureRow> {
  return store.db.transaction().execute(async (trx) => {
    // Two who sign at once come one after the other.
    await store.capabilities.lockProject(trx, record.project)
    const before = await trx
      .selectFrom('signatures')
      .selectAll()
      .where('record', '=', record.id)
      .orderBy('ordinal')
      .execute()
    const next = roles[before.length]
    if (role !== next) throw new Problem('signature-step', { next: next ?? 'nobody: all have signed', role })
    const same = before.find((s) => s.actor === actor.name)
    if (same) throw new Problem('signature-same-person', { actor: actor.name, role: same.role })
    const signed = {
      id: randomUUIDv7(),
      record: record.id,
      ordinal: before.length + 1,
      role,
      meaning,
      actor: actor.name,
      actor_key: actor.key,
      signed_at: store.clock().toISOString(),
      signed_hash: record.record_hash,
      previous_hash: before.at(-1)?.signature_hash ?? NOTHING,
    }
    const row: SignatureRow = { ...signed, signature_hash: signatureHash(signed) }
    await trx.insertInto('signatures').values(row).execute()
    return row
  })
}
