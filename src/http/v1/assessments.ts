import multipart from '@fastify/multipart'
import type { FastifyInstance, FastifyRequest } from 'fastify'
import { Problem, problemError, problemOf } from '../../errors.ts'
import type { AssessTask } from '../../operations/assess-in-thread.ts'
import { pageHeaders, pageWanted } from '../pages.ts'
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
    const page = pageWanted(request, reply)
    const options = optionsOf(request)
    const parts = request.isMultipart() ? await formParts(request, bodyLimit) : { schedule: String(request.body ?? '') }
    const gone = new AbortController()
    reply.raw.on('close', () => gone.abort())
    const bytes = await assess({ ...parts, options, page }, gone.signal)
    if (page) return pageHeaders(reply).send(bytes)
    return reply.type('application/json; charset=utf-8').send(bytes)
  })
}

const names = ['schedule', 'loads']

/** The two parts of the form. Files and fields together stay within the limit of a body; anything else beside them is refused. */
async function formParts(request: FastifyRequest, limit: number): Promise<{ schedule: string; loads: string }> {
  const parts = new Map<string, string>()
  const faults = []
  let size = 0
  try {
    for await (const part of request.parts()) {
      // A field of type application/json arrives parsed.
      const text =
        part.type === 'file'
          ? (await part.toBuffer()).toString('utf8')
          : typeof part.value === 'string'
            ? part.value
            : JSON.stringify(part.value)
      size += text.length
      if (size > limit || (part.type === 'field' && part.valueTruncated)) throw new Problem('body-too-large', { limit })
      if (!names.includes(part.fieldname)) faults.push(problemError('', 'unknown-field', { field: part.fieldname }))
      else if (parts.has(part.fieldname))
        faults.push(problemError('', 'too-many-items', { field: part.fieldname, limit: 1, got: 2 }))
      parts.set(part.fieldname, text)
    }
  } catch (fault) {
    // The parser of forms throws plain errors for a missing boundary or an early end.
    if (fault instanceof Problem || (fault as { code?: unknown }).code !== undefined) throw fault
    throw new Problem('malformed-form', { reason: (fault as Error).message })
  }
  for (const field of names) if (!parts.has(field)) faults.push(problemError('', 'missing-field', { field }))
  if (faults.length > 0) throw problemOf(faults)
  return { schedule: parts.get('schedule')!, loads: parts.get('loads')! }
}
