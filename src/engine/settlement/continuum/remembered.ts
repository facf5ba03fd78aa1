/** Solved piles that a process keeps: the oldest use goes first. */
const KEPT = 64

const known = new Map<string, unknown>()

/**
 * The value of a pure computation, computed once for the same content. Engines of one process share it, so a pile in a ground is solved
 * once whatever the requests; the answer is the same with an empty memory.
 */
export function remembered<T>(content: unknown, compute: () => T): T {
  const key = JSON.stringify(content)
  const value = (known.has(key) ? known.get(key) : compute()) as T
  known.delete(key)
  known.set(key, value)
  if (known.size > KEPT) known.delete(known.keys().next().value!)
  return value
}
