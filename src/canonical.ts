import { createHash } from 'node:crypto'
import canonicalize from 'canonicalize'
import { Problem, type ProblemError, problemError, problemOf } from './errors.ts'

/** Canonical JSON (RFC 8785) of a value. Throws a problem for what canonical JSON does not hold. */
export function canonicalText(value: unknown): string {
  try {
    return canonicalize(value) ?? ''
  } catch (fault) {
    throw refusalOf(value, fault)
  }
}

/** `sha256:…` over parts of a text or over bytes, one after the other. */
export function sha256(parts: Iterable<string | Uint8Array>): string {
  const hash = createHash('sha256')
  for (const part of parts) hash.update(part)
  // Joined, not a template: see engine/trace/plain-string.ts.
  return ['sha256:', hash.digest('hex')].join('')
}

/** `sha256:…` over the canonical JSON of a value. */
export const hashOf = (value: unknown): string => sha256([canonicalText(value)])

/** Only a value that could not be printed is walked, without recursion: it may be nested a million deep. */
function refusalOf(value: unknown, fault: unknown): unknown {
  const errors: ProblemError[] = []
  const ahead: [node: unknown, pointer: string][] = [[value, '']]
  for (let next = ahead.pop(); next; next = ahead.pop()) {
    const [node, pointer] = next
    if (typeof node === 'string' && !node.isWellFormed()) errors.push(problemError(pointer, 'not-unicode'))
    if (typeof node !== 'object' || node === null) continue
    for (const [key, child] of Object.entries(node)) {
      if (key.isWellFormed()) ahead.push([child, `${pointer}/${key.replaceAll('~', '~0').replaceAll('/', '~1')}`])
      else errors.push(problemError(pointer, 'not-unicode'))
    }
  }
  if (errors.length > 0) return problemOf(errors.reverse())
  return fault instanceof RangeError ? new Problem('too-deep') : fault
}
