import { createHash } from 'node:crypto'
import { Problem } from '../errors.ts'

/** Where a page ends: the key of its last row, in the order of the list. */
export type Position = string | number | readonly (string | number | null)[]

/** Ties a position to its list and filters, so that a changed cursor is told instead of followed. No secret: a position is none. */
const seal = (list: string, position: unknown) =>
  createHash('sha256')
    .update(JSON.stringify([list, position]))
    .digest('base64url')
    .slice(0, 16)

export const cursorOf = (list: string, position: Position): string =>
  Buffer.from(JSON.stringify([position, seal(list, position)])).toString('base64url')

/** The position that a cursor of this list holds. Throws `bad-cursor`. */
export function positionOf<P extends Position>(list: string, cursor: string): P {
  try {
    const [position, sealed] = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8')) as unknown[]
    // Base64 lets trailing bits through: the text must be the one that was given out.
    if (sealed === seal(list, position) && cursorOf(list, position as Position) === cursor) return position as P
  } catch {}
  throw new Problem('bad-cursor')
}

/** The name of a list: what it holds and every filter and order, so that REST and GraphQL share its cursors. */
export function listName(kind: string, of: string, given: Readonly<Record<string, unknown>> = {}): string {
  const set = Object.entries(given).filter(([, value]) => value !== undefined && value !== null)
  return JSON.stringify([kind, of, ...set.sort(([a], [b]) => (a < b ? -1 : 1))])
}
