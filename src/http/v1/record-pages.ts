import type { FastifyInstance } from 'fastify'
import { checkKinds } from '../../contract/replies.ts'
import type { Office } from '../../operations/office.ts'
import { printCapSheet, printOverview, printPiles, printPlan } from '../../operations/print-record.ts'
import { sendTagged } from '../conditional.ts'
import { pageHeaders } from '../html.ts'
import { leaves } from '../leaves.ts'
import { anyText, oneOf, readQuery } from '../query.ts'

type Id = { Params: { id: string } }

const PAGE = { config: { produces: ['text/html'] } }
const CSV = { config: { produces: ['text/csv'] } }
/** A script that accepts anything wants the file; browsers name HTML. */
const CSV_OR_PAGE = { config: { produces: ['text/csv', 'text/html'] } }

const ofPlan = { check: oneOf(...checkKinds), since: anyText('id or revision of an assessment of the project') }

/** Pages of stored records, printed from what is stored: plan, sheets of caps, schedule of piles. */
export function recordPages(app: FastifyInstance, office: Office): void {
  app.get<{ Params: { slug: string } }>('/v1/projects/:slug/plan', PAGE, async (request, reply) => {
    const { slug } = request.params
    const query = readQuery(request, ofPlan)
    const { bytes } = await printPlan(
      office,
      request.actor!,
      slug,
      `/v1/projects/${slug}/plan`,
      query,
      leaves(reply.raw),
    )
    return pageHeaders(reply).send(bytes)
  })
  app.get<Id>('/v1/assessments/:id/sheet', PAGE, async (request, reply) => {
    const { id } = request.params
    const at = `/v1/assessments/${id}/sheet`
    const { record, bytes } = await printOverview(
      office,
      request.actor!,
      id,
      at,
      readQuery(request, ofPlan),
      leaves(reply.raw),
    )
    request.project = record.project
    return pageHeaders(reply).send(bytes)
  })
  app.get<{ Params: { id: string; mark: string } }>(
    '/v1/assessments/:id/caps/:mark/sheet',
    PAGE,
    async (request, reply) => {
      readQuery(request, {})
      const { id, mark } = request.params
      const { record, bytes } = await printCapSheet(office, request.actor!, id, mark, leaves(reply.raw))
      request.project = record.project
      return pageHeaders(reply).send(bytes)
    },
  )
  for (const [path, produced] of [
    ['/v1/assessments/:id/piles', CSV_OR_PAGE],
    // A link in a page cannot say what it accepts.
    ['/v1/assessments/:id/piles.csv', CSV],
  ] as const) {
    app.get<Id>(path, produced, async (request, reply) => {
      readQuery(request, {})
      const csv = request.accepted === 'text/csv'
      const page = csv ? 'piles-csv' : 'piles'
      const { record, bytes } = await printPiles(office, request.actor!, request.params.id, page, leaves(reply.raw))
      request.project = record.project
      if (!csv) return pageHeaders(reply).send(bytes)
      const name = `${record.project}-${record.revision}-piles.csv`
      reply.header('content-disposition', `attachment; filename="${name}"`)
      return sendTagged(request, reply, `${record.content_hash};piles`, () => bytes)
    })
  }
}
