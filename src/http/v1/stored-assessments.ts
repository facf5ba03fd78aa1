import type { FastifyInstance } from 'fastify'
import type { Office } from '../../operations/office.ts'
import { getAssessment, getContent } from '../../operations/read-assessment.ts'
import { reverifyRecord } from '../../operations/reverify-record.ts'
import { ownRecord } from '../../operations/rights.ts'
import { listSignatures, signAssessment } from '../../operations/sign-assessment.ts'
import { verifyProject } from '../../operations/verify-project.ts'
import { sendTagged } from '../conditional.ts'
import { leaves } from '../leaves.ts'
import { type Parameter, readQuery, whole } from '../query.ts'
import { recordLinks } from './record-links.ts'
import { POLL } from './respond-async.ts'

type Id = { Params: { id: string } }

const hash: Parameter<string> = {
  expected: 'a record hash, sha256:…',
  read: (text) => (/^sha256:[0-9a-f]{64}$/.test(text) ? text : undefined),
}
/** One record: itself, its content, its signatures; the chain of a project; a record computed again. */
export function storedAssessments(app: FastifyInstance, office: Office): void {
  app.get<Id>('/v1/assessments/:id', async (request, reply) => {
    readQuery(request, {})
    const { job, record, before, after } = await getAssessment(office, request.actor!, request.params.id)
    request.project = (job ?? record).project
    if (job) {
      if (job.finishedAt === null) reply.header('retry-after', POLL)
      return reply.header('cache-control', 'no-store').send(job)
    }
    // The record itself stays as it is for ever; what came after it stands in the header.
    reply.header('link', recordLinks(record.project, before, after))
    return sendTagged(request, reply, record.contentHash, () => JSON.stringify(record))
  })
  app.get<Id>('/v1/assessments/:id/content', async (request, reply) => {
    readQuery(request, {})
    const content = await getContent(office, request.actor!, request.params.id)
    request.project = content.project
    return sendTagged(request, reply, content.hash, () => content.text)
  })
  app.get<Id>('/v1/assessments/:id/signatures', async (request) => {
    readQuery(request, {})
    return { items: await listSignatures(office, request.actor!, request.params.id) }
  })
  app.post<Id>('/v1/assessments/:id/signatures', async (request, reply) => {
    const signature = await signAssessment(office, request.actor!, request.params.id, request.body)
    return reply.code(201).header('location', `/v1/assessments/${request.params.id}/signatures`).send(signature)
  })
  app.post<Id>('/v1/assessments/:id/reverify', async (request, reply) => {
    const { project } = await ownRecord(office, request.actor!, request.params.id)
    request.project = project
    return reverifyRecord(office, request.params.id, leaves(reply.raw))
  })
  app.get<{ Params: { slug: string } }>('/v1/projects/:slug/integrity', async (request, reply) => {
    const given = readQuery(request, { revision: whole(1, 999_999_999), hash })
    const checkpoint = given.revision && given.hash ? { revision: given.revision, hash: given.hash } : undefined
    return verifyProject(office, request.actor!, request.params.slug, checkpoint, leaves(reply.raw))
  })
}
