import multipart from '@fastify/multipart'
import type { FastifyInstance, FastifyRequest } from 'fastify'
import { problemError, problemOf } from '../../errors.ts'
import type { AssessTask } from '../../operations/assess-in-thread.ts'
import { optionsOf } from './calculators.ts'

type Options = {
  readonly assess: (task: AssessTask, gone: AbortSignal) => Promise<Uint8Array>
  readonly bodyLimit: number
}

/** `POST /v1/assessments`: the body goes to a thread as it came, as JSON or as `multipart/form-data` with `schedule` and `loads` (CSV). */
export async function assessments(app: FastifyInstance, { assess, bodyLimit }: Options): Promise<void> {
  await app.register(multipart, {
    limits: { fileSize: bodyLimit, fieldSize: bodyLimit, files: 2, fields: 2, parts: 4 },
  })
  app.removeContentTypeParser('application/json')
  app.addContentTypeParser('application/json', { parseAs: 'string', bodyLimit }, (_request, body, done) =>
    done(null, body),
  )
  app.post('/v1/assessments', async (request, reply) => {
    const options = optionsOf(request)
    const parts = request.isMultipart() ? await formParts(request) : { schedule: String(request.body ?? '') }
    const gone = new AbortController()
    reply.raw.on('close', () => gone.abort())
    const bytes = await assess({ ...parts, options }, gone.signal)
    return reply.type('application/json; charset=utf-8').send(bytes)
  })
}

async function formParts(request: FastifyRequest): Promise<{ schedule: string; loads: string }> {
  const parts = new Map<string, string>()
  for await (const part of request.parts()) {
    // A field of type application/json arrives parsed.
    const text =
      part.type === 'file'
        ? (await part.toBuffer()).toString('utf8')
        : typeof part.value === 'string'
          ? part.value
          : JSON.stringify(part.value)
    parts.set(part.fieldname, text)
  }
  const [schedule, loads] = [parts.get('schedule'), parts.get('loads')]
  if (schedule !== undefined && loads !== undefined) return { schedule, loads }
  throw problemOf(
    ['schedule', 'loads']
      .filter((name) => !parts.has(name))
      .map((field) => problemError('', 'missing-field', { field })),
  )
}
