import { type ErrorCode, Problem } from '../errors.ts'
import type { RunJob } from '../jobs/queue.ts'
import { type Claimed, claimJob, completeJob, failJob, isHeld, requeueJob, tellProgress } from '../store/jobs.ts'
import type { Progress } from './draft-in-thread.ts'
import type { JobEnd, Office } from './office.ts'
import { recordAssessment } from './record-assessment.ts'

export type Log = Record<'info' | 'warn' | 'error', (facts: object, message: string) => void>

/** A job that was begun so often without an end is given up. */
const TRIES = 3
/** Progress is written, and a cancelled job noticed, so often, ms. */
const BEAT = 500
/** What may be no fault of the schedule: worth another try. */
const passing: readonly ErrorCode[] = ['worker-died', 'timed-out', 'store-unavailable']

/** Writes the progress of a run as it comes, and ends the run when it is no longer its own. */
function beating({ store }: Pick<Office, 'store'>, { hold }: Claimed) {
  const ended = new AbortController()
  let [latest, written] = [{ done: 0, caps: 0 }, -1]
  const beat = async () => {
    const { done, caps } = latest
    const news = caps > 0 && done !== written
    if (news) written = done
    if (!(await (news ? tellProgress(store, hold, done, caps) : isHeld(store, hold)))) ended.abort()
  }
  let busy = false
  const timer = setInterval(() => {
    if (busy) return
    busy = true
    // Where the store cannot be asked the run goes on: its end will tell.
    void beat()
      .catch(() => undefined)
      .finally(() => {
        busy = false
      })
  }, BEAT)
  return {
    told: (progress: Progress) => {
      latest = progress
    },
    ended: ended.signal,
    stop: () => clearInterval(timer),
  }
}

const asProblem = (fault: unknown) => (fault instanceof Problem ? fault : new Problem('internal-error'))

/** Runs a job to its end: a record, or a problem that it keeps. Throws where it shall be given out again. */
export function runJob(office: Office, log: Log): RunJob {
  const { store } = office
  const ended = (state: JobEnd) => office.line.ended(state)
  return async (id, lost) => {
    const claimed = await claimJob(store, id).catch((err) => {
      log.error({ job: id, err }, 'job')
      throw err
    })
    // Cancelled, or ended by a run that was taken for dead.
    if (!claimed) return
    const { job, hold, text } = claimed
    const begun = performance.now()
    const facts = (state: string) => ({
      traceId: job.trace_id,
      job: id,
      project: job.project,
      actor: job.actor_key ?? undefined,
      attempt: job.attempts,
      state,
      durationMs: Math.round(performance.now() - begun),
    })
    const giveUp = async (problem: Problem) => {
      await failJob(store, hold, problem)
      log.warn({ ...facts('failed'), code: problem.code, err: problem }, 'job')
      ended('failed')
    }
    if (job.attempts > TRIES) {
      const reason = 'Each time the service itself was lost.'
      return giveUp(new Problem('job-abandoned', { attempts: TRIES, reason }))
    }
    log.info(facts('running'), 'job')
    const beat = beating(office, claimed)
    const actor = { name: job.actor, key: job.actor_key }
    try {
      await recordAssessment(office, job.project, actor, text, AbortSignal.any([lost, beat.ended]), {
        id,
        told: beat.told,
        also: (trx) => completeJob(trx, hold),
      })
      log.info(facts('completed'), 'job')
      ended('completed')
    } catch (fault) {
      const problem = asProblem(fault)
      if (beat.ended.aborted || problem.code === 'assessment-cancelled') {
        log.info(facts('cancelled'), 'job')
        return
      }
      const innocent = lost.aborted || problem.code === 'overloaded'
      if (innocent || (passing.includes(problem.code) && job.attempts < TRIES)) {
        await requeueJob(store, hold, !innocent)
        log.warn({ ...facts('queued'), code: problem.code }, 'job')
        throw fault
      }
      if (!passing.includes(problem.code)) await giveUp(problem)
      else await giveUp(new Problem('job-abandoned', { attempts: job.attempts, reason: problem.message }))
    } finally {
      beat.stop()
    }
  }
}
