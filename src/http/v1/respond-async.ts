import type { FastifyRequest } from 'fastify'
import { LONGEST_WAIT } from '../../contract/limits.ts'
import { answerBetter, answerOnce, type Keep, type Reply } from '../../operations/answer-once.ts'
import type { Office } from '../../operations/office.ts'
import { queueAssessment } from '../../operations/queue-assessment.ts'
import { getAssessment } from '../../operations/read-assessment.ts'
import type { ScheduleText } from '../../operations/read-schedule.ts'
import type { ShownJob } from '../../operations/show-job.ts'
import { watchJob } from '../../operations/watch-job.ts'
import type { Preferences } from '../prefer.ts'
import { recordReply } from './record-reply.ts'

/** Clients that poll do so about this often, s. */
export const POLL = '1'

const accepted = (job: ShownJob, applied: string): Reply => ({
  status: 202,
  headers: {
    location: `/v1/assessments/${job.id}`,
    link: `</v1/assessments/${job.id}/events>; rel="monitor"`,
    'retry-after': POLL,
    'preference-applied': applied,
    'content-type': 'application/json; charset=utf-8',
  },
  body: Buffer.from(JSON.stringify(job)),
})

type Post = {
  readonly project: string
  readonly schedule: ScheduleText
  readonly preferences: Preferences
  readonly gone: AbortSignal
  /** The Idempotency-Key with what it stands for. */
  readonly once: Parameters<typeof answerOnce>[1]
}

/**
 * Answers a schedule with 202 as soon as it stands in line, or with its record (201) where that comes while the client waits. A
 * repeated request gets the answer of the first one, and waits for nothing.
 */
export async function respondAsync(office: Office, request: FastifyRequest, post: Post) {
  const actor = request.actor!
  const wait = Math.min(post.preferences.wait, LONGEST_WAIT)
  const waits = wait > 0 ? `wait=${wait}` : undefined
  const applied = ['respond-async', ...(waits ? [waits] : [])].join(', ')
  let id = ''
  const run = async (keep: Keep) => {
    let made: Reply | undefined
    await queueAssessment(office, post.project, actor, request.id, post.schedule, async (trx, job) => {
      id = job.id
      made = accepted(job, applied)
      await keep(trx, made)
    })
    return made!
  }
  const first = await answerOnce(office, post.once, run)
  if (first.replayed || !waits) return first
  const patience = AbortSignal.any([post.gone, AbortSignal.timeout(wait * 1000)])
  for await (const _ of watchJob(office, actor, id, patience));
  const found = await getAssessment(office, actor, id)
  const late: Reply = found.job
    ? accepted(found.job, applied)
    : recordReply(found.record, { 'preference-applied': waits })
  await answerBetter(office, post.once, late)
  return { ...late, replayed: false }
}
