import { createHash } from 'node:crypto'
import type { FastifyInstance, FastifyRequest } from 'fastify'
import { Problem } from '../../errors.ts'
import { answerOnce, type Keep, type Reply } from '../../operations/answer-once.ts'
import type { Office } from '../../operations/office.ts'
import { listAssessments } from '../../operations/read-assessment.ts'
import { recordAssessment } from '../../operations/record-assessment.ts'
import { ownProject } from '../../operations/rights.ts'
import { showRecord } from '../../operations/show-record.ts'
import { askedPage, pageOf, paging } from '../pages.ts'
import { readQuery } from '../query.ts'
import { recordLinks } from './record-links.ts'
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

function replyOf(record: Parameters<typeof showRecord>[0]): Reply {
  return {
    status: 201,
    headers: {
      location: `/v1/assessments/${record.id}`,
      etag: `"${record.content_hash}"`,
      link: recordLinks(record.project, undefined, undefined),
      'content-type': 'application/json; charset=utf-8',
    },
    body: Buffer.from(JSON.stringify(showRecord(record))),
  }
}

/** Assessments of a project: posted as a schedule, kept as the next revision; listed oldest first. */
export function projectAssessments(app: FastifyInstance, office: Office, bodyLimit: number): void {
  app.post<Slug>('/v1/projects/:slug/assessments', async (request, reply) => {
    const { slug } = request.params
    readQuery(request, {})
    await ownProject(office, request.actor!, slug)
    const schedule = await scheduleBody(request, bodyLimit)
    const gone = new AbortController()
    reply.raw.on('close', () => gone.abort())
    const run = async (keep: Keep) => {
      let made: Reply | undefined
      const record = await recordAssessment(office, slug, request.actor!, schedule, gone.signal, {
        also: async (trx, kept) => {
          made = replyOf(kept)
          await keep(trx, made)
        },
      })
      return made ?? replyOf(record)
    }
    const { status, headers, body, replayed } = await answerOnce(office, keyed(request, schedule), run)
    if (replayed) reply.header('idempotency-replayed', 'true')
    return reply.code(status).headers(headers).send(body)
  })
  app.get<Slug>('/v1/projects/:slug/assessments', async (request, reply) => {
    const { limit, page } = askedPage<number>(request, readQuery(request, paging))
    const rows = await listAssessments(office, request.actor!, request.params.slug, page)
    return pageOf(request, reply, rows, limit, (row) => row.revision)
  })
}
