import { createHash } from 'node:crypto'
import canonicalize from 'canonicalize'

/** `sha256:…` over the canonical JSON (RFC 8785) of a value. */
export const hashOf = (value: unknown): string =>
  `sha256:${createHash('sha256')
    .update(canonicalize(value) ?? '')
    .digest('hex')}`
