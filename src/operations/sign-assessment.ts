import { parse } from '../contract/parse.ts'
import { signatureRequest } from '../contract/stored-requests.ts'
import type { Actor } from '../store/actor.ts'
import { listSignatures as list, sign } from '../store/signatures.ts'
import type { SignatureRow } from '../store/tables.ts'
import type { Office } from './office.ts'
import { ownRecord } from './rights.ts'

export const showSignature = (s: SignatureRow) => ({
  id: s.id,
  assessment: s.record,
  ordinal: s.ordinal,
  role: s.role,
  meaning: s.meaning,
  actor: s.actor,
  actorKey: s.actor_key,
  signedAt: s.signed_at,
  signedHash: s.signed_hash,
  previousHash: s.previous_hash,
  signatureHash: s.signature_hash,
})

/** Signs a record as originator, checker or approver. Throws `signature-step` and `signature-same-person`. */
export async function signAssessment(office: Office, actor: Actor, id: string, input: unknown) {
  const record = await ownRecord(office, actor, id)
  return showSignature(await sign(office.store, record, actor, parse(signatureRequest, input)))
}

export async function listSignatures(office: Office, actor: Actor, id: string) {
  await ownRecord(office, actor, id)
  return (await list(office.store, id)).map(showSignature)
}
