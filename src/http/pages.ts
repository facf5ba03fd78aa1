import type { FastifyReply, FastifyRequest } from 'fastify'
import { cursorOf, type Position, positionOf } from '../operations/cursors.ts'
import { anyText, whole } from './query.ts'

/** Query parameters of every list. */
export const paging = { limit: whole(1, 1000), cursor: anyText('a cursor of this list') }

/** Cuts rows, asked for with one more than the limit, to a page; the way to the next one stands in the answer and in Link (RFC 8288). */
export function pageOf<Row>(
  request: FastifyRequest,
  reply: FastifyReply,
  list: string,
  rows: readonly Row[],
  limit: number,
  position: (row: Row) => Position,
): { readonly items: readonly Row[]; readonly next?: string } {
  if (rows.length <= limit) return { items: rows }
  const items = rows.slice(0, limit)
  const next = cursorOf(list, position(items.at(-1)!))
  const url = new URL(request.url, 'http://here')
  url.searchParams.set('cursor', next)
  reply.header('link', `<${url.pathname}${url.search}>; rel="next"`)
  return { items, next }
}

/** Limit and position of a list request, one row more than its page holds. */
export function askedPage<P extends Position>(
  list: string,
  { limit = 100, cursor }: { readonly limit?: number; readonly cursor?: string },
) {
  const after = cursor === undefined ? undefined : positionOf<P>(list, cursor)
  return { limit, page: { limit: limit + 1, ...(after !== undefined && { after }) } }
}
