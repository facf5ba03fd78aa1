import { Problem } from '../errors.ts'
import { cursorOf, type Position, positionOf } from '../operations/cursors.ts'

/** A page of a list. What is counted over the whole list is asked for only where a query selects it. */
export type Connection<Node> = {
  /** Its name, which cursors are tied to. */
  readonly list: string
  readonly rows: readonly (Node & { readonly position: Position })[]
  readonly more: boolean
  readonly total: () => Promise<number>
}

/** Rows of a page where a query does not say. */
export const DEFAULT_FIRST = 20
export const MOST_FIRST = 1000

export type PageArgs = { readonly first?: number | null; readonly after?: string | null }

/** Limit and position of a list, one row more than its page holds. Throws `bad-query` and `bad-cursor`. */
export function askedPage<P extends Position>(list: string, { first, after }: PageArgs) {
  const limit = first ?? DEFAULT_FIRST
  if (limit < 1 || limit > MOST_FIRST)
    throw new Problem('bad-query', { field: 'first', expected: `a whole number from 1 to ${MOST_FIRST}`, got: limit })
  const position = after === undefined || after === null ? undefined : positionOf<P>(list, after)
  return { limit, page: { limit: limit + 1, ...(position !== undefined && { after: position }) } }
}

export const connectionOf = <Node>(
  list: string,
  rows: Connection<Node>['rows'],
  limit: number,
  total: () => Promise<number>,
): Connection<Node> => ({ list, rows: rows.slice(0, limit), more: rows.length > limit, total })

/** The fields that every connection has. */
export const connectionFields = <Node>() => ({
  nodes: ({ rows }: Connection<Node>) => rows,
  edges: ({ list, rows }: Connection<Node>) => rows.map((node) => ({ cursor: cursorOf(list, node.position), node })),
  pageInfo: ({ list, rows, more }: Connection<Node>) => {
    const last = rows.at(-1)
    return { hasNextPage: more, endCursor: last ? cursorOf(list, last.position) : null }
  },
  totalCount: ({ total }: Connection<Node>) => total(),
})
