import { createHash } from 'node:crypto'
import type { FastifyReply, FastifyRequest } from 'fastify'
import { Problem } from '../errors.ts'
import { anyText, whole } from './query.ts'

/** Query parameters of every list. */
export const paging = { limit: whole(1, 1000), cursor: anyText('a cursor of this list') }

/** Ties a position to its list and filters, so that a changed cursor is told instead of followed. No secret: a position is none. */
const seal = (list: string, position: unknown) =>
  createHash('sha256')
    .update(JSON.stringify([list, position]))
    .digest('base64url')
    .slice(0, 16)

export const cursorOf = (list: string, position: string | number): string =>
  Buffer.from(JSON.stringify([position, seal(list, position)])).toString('base64url')

/** The position that a cursor of this list holds. Throws `bad-cursor`. */
export function positionOf(list: string, cursor: string): unknown {
  try {
    const [position, sealed] = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8')) as unknown[]
    // Base64 lets trailing bits through: the text must be the one that was given out.
    if (sealed === seal(list, position) && cursorOf(list, position as string) === cursor) return position
  } catch {}
  throw new Problem('bad-cursor')
}

/** The filters of a request as the name of a list: its path and all parameters but those of paging. */
export function listOf(request: FastifyRequest): string {
  const url = new URL(request.url, 'http://here')
  for (const name of Object.keys(paging)) url.searchParams.delete(name)
  url.searchParams.sort()
  return url.pathname + url.search
}

/** Cuts rows, asked for with one more than the limit, to a page; the way to the next one stands in the answer and in Link (RFC 8288). */
export function pageOf<Row>(
  request: FastifyRequest,
  reply: FastifyReply,
  rows: readonly Row[],
  limit: number,
  position: (row: Row) => string | number,
): { readonly items: readonly Row[]; readonly next?: string } {
  if (rows.length <= limit) return { items: rows }
  const items = rows.slice(0, limit)
  const next = cursorOf(listOf(request), position(items.at(-1)!))
  const url = new URL(request.url, 'http://here')
  url.searchParams.set('cursor', next)
  reply.header('link', `<${url.pathname}${url.search}>; rel="next"`)
  return { items, next }
}

/** Limit and position of a list request, one row more than its page holds. */
export function askedPage<Position extends string | number>(
  request: FastifyRequest,
  { limit = 100, cursor }: { readonly limit?: number; readonly cursor?: string },
) {
  const after = cursor === undefined ? undefined : (positionOf(listOf(request), cursor) as Position)
  return { limit, page: { limit: limit + 1, ...(after !== undefined && { after }) } }
}
