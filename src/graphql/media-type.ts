/** The two types of GraphQL over HTTP. Under `legacy` a document that cannot be run is still a 200. */
export const legacy = 'application/json'
export const modern = 'application/graphql-response+json'
export type GraphqlMediaType = typeof legacy | typeof modern

/** How much a range of an Accept header wants a type; undefined where it does not match. */
function specificity(range: string, type: string): number | undefined {
  if (range === type) return 2
  if (range === 'application/*') return 1
  return range === '*/*' ? 0 : undefined
}

/**
 * The type of the answer: the one with the larger quality; at a tie `modern` only where it is named, because a client
 * that names nothing is taken for an old one. Undefined: neither is acceptable.
 */
export function negotiate(accept: string | undefined): GraphqlMediaType | undefined {
  if (accept === undefined || accept.trim() === '') return legacy
  const best = new Map<GraphqlMediaType, { specific: number; quality: number }>()
  for (const part of accept.split(',')) {
    const [range = '', ...parameters] = part.split(';').map((text) => text.trim().toLowerCase())
    const q = Number(parameters.find((text) => text.startsWith('q='))?.slice(2) ?? 1)
    const quality = Number.isFinite(q) ? q : 0
    for (const type of [legacy, modern] as const) {
      const specific = specificity(range, type)
      const before = best.get(type)
      if (specific !== undefined && (!before || specific > before.specific)) best.set(type, { specific, quality })
    }
  }
  const [old, current] = [best.get(legacy), best.get(modern)]
  const named = current && current.specific === 2 && current.quality > 0
  if (named && current.quality >= (old?.quality ?? 0)) return modern
  if (old && old.quality > 0) return legacy
  return current && current.quality > 0 ? modern : undefined
}
