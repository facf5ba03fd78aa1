/** A part of a list: so many rows after a position. */
export type Page<Position> = { readonly limit: number; readonly after?: Position }
