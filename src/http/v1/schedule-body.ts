import multipart from '@fastify/multipart'
import type { FastifyInstance, FastifyRequest } from 'fastify'
import { csvRows } from '../../contract/csv-loads.ts'
import { Problem, problemError, problemOf } from '../../errors.ts'

/** Lets a schedule come as `multipart/form-data`: `schedule` (JSON) and `loads` (CSV with a header). */
export async function acceptMultipart(app: FastifyInstance, bodyLimit: number): Promise<void> {
  await app.register(multipart, {
    limits: { fileSize: bodyLimit, fieldSize: bodyLimit, files: 2, fields: 2, parts: 4 },
  })
}

/** The schedule of a request, the rows of its CSV put in. */
export async function scheduleBody(request: FastifyRequest): Promise<unknown> {
  if (!request.isMultipart()) return request.body
  const parts: Record<string, string> = {}
  for await (const part of request.parts())
    parts[part.fieldname] =
      part.type === 'file'
        ? (await part.toBuffer()).toString('utf8')
        : typeof part.value === 'string'
          ? part.value
          : JSON.stringify(part.value)
  const missing = ['schedule', 'loads'].filter((name) => parts[name] === undefined)
  if (missing.length > 0) throw problemOf(missing.map((field) => problemError('', 'missing-field', { field })))
  let schedule: { loads?: { signs?: unknown } }
  try {
    schedule = JSON.parse(parts.schedule!) as typeof schedule
  } catch (fault) {
    throw new Problem('malformed-json', { reason: (fault as Error).message })
  }
  return { ...schedule, loads: { ...schedule.loads, rows: csvRows(parts.loads!, schedule.loads?.signs) } }
}
