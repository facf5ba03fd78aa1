import type { FastifyInstance } from 'fastify'
import { checkKinds } from '../../contract/replies.ts'
import type { Office } from '../../operations/office.ts'
import { type CapPosition, capList, capOrders, getCap, listCaps } from '../../operations/read-caps.ts'
import { sendTagged } from '../conditional.ts'
import { csvOf } from '../csv.ts'
import { askedPage, pageOf, paging } from '../pages.ts'
import { anyText, decimal, oneOf, readQuery, yesOrNo } from '../query.ts'

type Id = { Params: { id: string } }
const JSON_OR_CSV = ['application/json', 'text/csv']
/** A spreadsheet wants the whole list: so many caps as a schedule may hold. */
const WHOLE = 5000

const filters = {
  check: oneOf(...checkKinds),
  utilisationAtLeast: decimal,
  exceeded: yesOrNo,
  ground: anyText('name of a ground profile'),
  pileType: anyText('name of a pile type'),
  mark: anyText('a part of a mark'),
  order: oneOf(...capOrders),
}

/** Caps of a record as pages of rows, for spreadsheets as CSV; one cap with its checks and trace. */
export function caps(app: FastifyInstance, office: Office): void {
  app.get<Id>('/v1/assessments/:id/caps', { config: { produces: JSON_OR_CSV } }, async (request, reply) => {
    const { limit: wanted, cursor, order = 'schedule', ...filter } = readQuery(request, { ...paging, ...filters })
    const csv = request.accepted === 'text/csv'
    const { id } = request.params
    const list = capList(id, filter, order)
    const { limit, page } = askedPage<CapPosition>(list, { limit: wanted ?? (csv ? WHOLE : 100), cursor })
    const { record, rows } = await listCaps(office, request.actor!, id, filter, order, page)
    request.project = record.project
    const { items, next } = pageOf(request, reply, list, rows, limit, (row) => row.position)
    const shown = items.map((row) => row.cap)
    const tag = record.content_hash + (csv ? ';csv' : '')
    return sendTagged(request, reply, tag, () => (csv ? csvOf(shown) : JSON.stringify({ items: shown, next })))
  })
  app.get<{ Params: { id: string; mark: string } }>('/v1/assessments/:id/caps/:mark', async (request, reply) => {
    const { trace = 'full' } = readQuery(request, { trace: oneOf('full', 'none') })
    const { id, mark } = request.params
    const cap = await getCap(office, request.actor!, id, mark, trace === 'full')
    request.project = cap.record.project
    // The result is JSON already: kept as text it need not be parsed and printed again.
    return sendTagged(request, reply, cap.record.content_hash, () =>
      cap.trace === undefined
        ? `{"result":${cap.result}}`
        : `{"result":${cap.result},"trace":${JSON.stringify(cap.trace)}}`,
    )
  })
}
