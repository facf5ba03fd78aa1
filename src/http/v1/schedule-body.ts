import type { FastifyRequest } from 'fastify'
import { Problem, problemError, problemOf } from '../../errors.ts'

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

/** The schedule of a request as text: JSON, or `multipart/form-data` with `schedule` and `loads` (CSV). */
export async function scheduleBody(
  request: FastifyRequest,
  limit: number,
): Promise<{ readonly schedule: string; readonly loads?: string }> {
  return request.isMultipart() ? formParts(request, limit) : { schedule: String(request.body ?? '') }
}
