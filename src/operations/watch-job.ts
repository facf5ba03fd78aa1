import { setTimeout as wait } from 'node:timers/promises'
import type { JobRow } from '../store/tables.ts'
import type { Office } from './office.ts'
import { type Actor, ownAssessment } from './rights.ts'

/** How far an assessment is: caps done of caps, as many as are known. */
export type JobProgress = {
  readonly id: string
  readonly state: JobRow['state'] | 'completed'
  readonly done: number
  readonly caps: number | null
}

/** The first look and the rarest ones, ms. */
const [SOON, SELDOM] = [20, 500]
/** Told again after so long without news, so that no proxy takes the connection for dead, ms. */
const SILENCE = 15_000

async function progressOf(office: Pick<Office, 'store'>, actor: Actor, id: string): Promise<JobProgress> {
  const found = await ownAssessment(office, actor, id)
  if ('record' in found) return { id, state: 'completed', done: found.record.caps, caps: found.record.caps }
  const { state, done, caps } = found.job
  return { id, state, done, caps }
}

export const isEnded = ({ state }: Pick<JobProgress, 'state'>) => state !== 'queued' && state !== 'running'

/**
 * The progress of an assessment from now until it ends: at once, then with each change. It ends early when `gone` is told or the
 * service stops. It reads the store, so it does not matter which replica runs the job. Throws `no-such-assessment`.
 */
export async function* watchJob(
  office: Pick<Office, 'store' | 'line'>,
  actor: Actor,
  id: string,
  gone?: AbortSignal,
): AsyncGenerator<JobProgress, void, undefined> {
  const signal = gone ? AbortSignal.any([gone, office.line.stopping]) : office.line.stopping
  let [last, toldAt, pause] = ['', 0, SOON]
  while (!signal.aborted) {
    const progress = await progressOf(office, actor, id)
    const now = JSON.stringify(progress)
    if (now !== last || performance.now() - toldAt > SILENCE) {
      ;[last, toldAt, pause] = [now, performance.now(), SOON]
      yield progress
    }
    if (isEnded(progress)) return
    await wait(pause, undefined, { signal }).catch(() => undefined)
    pause = Math.min(2 * pause, SELDOM)
  }
}
