import multipart from '@fastify/multipart'
import type { FastifyInstance } from 'fastify'
import type { AssessTask } from '../../operations/assess-in-thread.ts'
import type { Office } from '../../operations/office.ts'
import { JSON_OR_PAGE, pageHeaders } from '../html.ts'
import { leaves } from '../leaves.ts'
import { optionsOf } from './calculators.ts'
import { projectAssessments } from './project-assessments.ts'
import { scheduleBody } from './schedule-body.ts'

type Options = {
  readonly assess: (task: AssessTask, gone: AbortSignal) => Promise<Uint8Array>
  readonly bodyLimit: number
  readonly office: Office
}

/** Routes that take a schedule: the body goes to a thread as it came, as JSON or as a form. */
export async function assessments(app: FastifyInstance, { assess, bodyLimit, office }: Options): Promise<void> {
  await app.register(multipart, {
    limits: { fileSize: bodyLimit, fieldSize: bodyLimit, files: 2, fields: 2, parts: 4 },
  })
  app.removeContentTypeParser('application/json')
  app.addContentTypeParser('application/json', { parseAs: 'string', bodyLimit }, (_request, body, done) =>
    done(null, body),
  )
  app.post('/v1/assessments', { config: { produces: JSON_OR_PAGE } }, async (request, reply) => {
    const page = request.accepted === 'text/html'
    const options = optionsOf(request)
    const schedule = await scheduleBody(request, bodyLimit)
    const bytes = await assess({ ...schedule, options, page }, leaves(reply.raw))
    if (page) return pageHeaders(reply).send(bytes)
    return reply.type('application/json; charset=utf-8').send(bytes)
  })
  projectAssessments(app, office, bodyLimit)
}
