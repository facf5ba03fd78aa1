import { createHash } from 'node:crypto'
import type { FastifyInstance, FastifyRequest } from 'fastify'
import { Problem } from '../../errors.ts'
import { answerOnce, type Keep, type Reply } from '../../operations/answer-once.ts'
import { assessmentList } from '../../operations/find-assessments.ts'
import type { Office } from '../../operations/office.ts'
import { listAssessments } from '../../operations/read-assessment.ts'
import { recordAssessment } from '../../operations/record-assessment.ts'
import { ownProject } from '../../operations/rights.ts'
import { showRecord } from '../../operations/show-record.ts'
import { leaves } from '../leaves.ts'
import { askedPage, pageOf, paging } from '../pages.ts'
import { preferencesOf } from '../prefer.ts'
import { readQuery } from '../query.ts'
import { recordReply } from './record-reply.ts'
import { respondAsync } from './respond-async.ts'
import { scheduleBody } from './schedule-body.ts'

type Slug = { Params: { slug: string } }

/** The request by its Idempotency-Key, held to what was sent; undefined without the header. */
function keyed(request: FastifyRequest, parts: { readonly schedule: string; readonly loads?: string }) {
  const key = request.headers['idempotency-key']
  if (key === undefined) return undefined
  if (typeof key !== 'string' || !/^[\x21-\x7e]{1,255}$/.test(key)) throw new Problem('bad-idempotency-key')
  const hash = createHash('sha256').update(JSON.stringify([request.method, request.url, parts.loads === undefined]))
  hash
    .update(parts.schedule)
    .update('\0')
    .update(parts.loads ?? '')
  return { owner: request.actor!.key ?? '', key, fingerprint: hash.digest('hex') }
}

/** Assessments of a project: posted as a schedule, kept as the next revision; listed oldest first. */
export function projectAssessments(app: FastifyInstance, office: Office, bodyLimit: number): void {
  app.post<Slug>('/v1/projects/:slug/assessments', async (request, reply) => {
    const { slug } = request.params
    readQuery(request, {})
    await ownProject(office, request.actor!, slug)
    const schedule = await scheduleBody(request, bodyLimit)
    const once = keyed(request, schedule)
    const gone = leaves(reply.raw)
    const run = async (keep: Keep) => {
      let made: Reply | undefined
      await recordAssessment(office, slug, request.actor!, schedule, gone, {
        also: async (trx, kept) => {
          made = recordReply(showRecord(kept))
          await keep(trx, made)
        },
      })
      return made!
    }
    const preferences = preferencesOf(request.headers.prefer)
    const { status, headers, body, replayed } = preferences.respondAsync
      ? await respondAsync(office, request, { project: slug, schedule, preferences, gone, once })
      : await answerOnce(office, once, run)
    if (replayed) reply.header('idempotency-replayed', 'true')
    return reply.code(status).headers(headers).send(body)
  })
  app.get<Slug>('/v1/projects/:slug/assessments', async (request, reply) => {
    const { slug } = request.params
    const list = assessmentList({ project: slug }, 'oldest')
    const { limit, page } = askedPage<number>(list, readQuery(request, paging))
    const rows = await listAssessments(office, request.actor!, slug, page)
    return pageOf(request, reply, list, rows, limit, (row) => row.revision)
  })
}
