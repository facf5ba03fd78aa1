import type { FastifyInstance } from 'fastify'
import { listChanges } from '../../operations/list-changes.ts'
import type { Office } from '../../operations/office.ts'
import { isHeld, sendTagged } from '../conditional.ts'
import { anyText, readQuery } from '../query.ts'

/** So many of each list: more would not be read, and the counts tell of them. */
const MOST = 50_000

/** What changed between two revisions of a project. */
export function changes(app: FastifyInstance, office: Office): void {
  app.get<{ Params: { id: string } }>('/v1/assessments/:id/changes', async (request, reply) => {
    const { since } = readQuery(request, { since: anyText('the id of another revision') })
    const { project, tag, compute } = await listChanges(office, request.actor!, request.params.id, since)
    request.project = project
    const gone = new AbortController()
    reply.raw.on('close', () => gone.abort())
    const body = isHeld(request, tag) ? undefined : await compute(MOST, gone.signal)
    return sendTagged(request, reply, tag, () => body!)
  })
}
