import { accepted } from '../contract/accepted.ts'

/** The two types of GraphQL over HTTP. Under `legacy` a document that cannot be run is still a 200. */
export const legacy = 'application/json'
export const modern = 'application/graphql-response+json'
export type GraphqlMediaType = typeof legacy | typeof modern

/**
 * The type of the answer: the one with the larger quality; at a tie `modern` only where it is named, because a client
 * that names nothing is taken for an old one. Undefined: neither is acceptable.
 */
export function negotiate(accept: string | undefined): GraphqlMediaType | undefined {
  if (accept === undefined || accept.trim() === '') return legacy
  const [old, current] = [accepted(accept, legacy), accepted(accept, modern)]
  const named = current && current.specific === 2 && current.quality > 0
  if (named && current.quality >= (old?.quality ?? 0)) return modern
  if (old && old.quality > 0) return legacy
  return current && current.quality > 0 ? modern : undefined
}
