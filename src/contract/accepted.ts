/** How an Accept header wants a type: how exactly the best range names it (2: fully), and with what quality. */
export type Accepted = { readonly specific: number; readonly quality: number }

function specificity(range: string, type: string): number | undefined {
  if (range === type) return 2
  if (range === `${type.slice(0, type.indexOf('/'))}/*`) return 1
  return range === '*/*' ? 0 : undefined
}

/** The range of an Accept header (RFC 9110) that speaks of a type most exactly; undefined where none does. */
export function accepted(accept: string, type: string): Accepted | undefined {
  let best: Accepted | undefined
  for (const part of accept.split(',')) {
    const [range = '', ...parameters] = part.split(';').map((text) => text.trim().toLowerCase())
    const q = Number(parameters.find((text) => text.startsWith('q='))?.slice(2) ?? 1)
    const specific = specificity(range, type)
    if (specific !== undefined && (!best || specific > best.specific))
      best = { specific, quality: Number.isFinite(q) ? q : 0 }
  }
  return best
}

/** The offered type that is wanted most, at a tie the first; the first too where nothing is said. Undefined: none is acceptable. */
export function preferred<T extends string>(accept: string | undefined, offered: readonly T[]): T | undefined {
  if (accept === undefined || accept.trim() === '') return offered[0]
  const wanted = offered.map((type) => ({ type, quality: accepted(accept, type)?.quality ?? 0 }))
  const best = wanted.reduce((a, b) => (b.quality > a.quality ? b : a))
  return best.quality > 0 ? best.type : undefined
}
