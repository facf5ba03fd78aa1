import { Problem } from '../errors.ts'
import { type Actor, anonymous } from '../store/actor.ts'
import { actorOf, anyKey } from '../store/keys.ts'
import type { Office } from './office.ts'

export type Authenticate = (authorization: string | undefined) => Promise<Actor>

const reasons = {
  unknown: 'the key is not known',
  revoked: 'the key was revoked',
  expired: 'the key has expired',
} as const

/**
 * Who asks. With `auth` off, or as long as no key was ever made, everybody is anonymous and may do all. Throws
 * `unauthenticated`.
 */
export function authenticate({ store }: Pick<Office, 'store'>, auth: 'keys' | 'off'): Authenticate {
  let asked = false
  return async (authorization) => {
    if (auth === 'off') return anonymous
    asked ||= await anyKey(store)
    if (!asked) return anonymous
    const key = /^Bearer +(\S+)$/i.exec(authorization ?? '')?.[1]
    if (!key) throw new Problem('unauthenticated', { reason: 'send Authorization: Bearer with a key' })
    const actor = await actorOf(store, key)
    if (typeof actor === 'string') throw new Problem('unauthenticated', { reason: reasons[actor] })
    return actor
  }
}

/** Whether the service may listen to others than its own machine. */
export const isGuarded = async ({ store }: Pick<Office, 'store'>): Promise<boolean> => anyKey(store)
