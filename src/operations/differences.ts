/** One place where two values differ. What is absent on one side is left out there. */
export type Difference = { readonly pointer: string; readonly before?: unknown; readonly after?: unknown }

const isTree = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null
const escapeKey = (key: string) => key.replaceAll('~', '~0').replaceAll('/', '~1')

/** Where two JSON values differ, by JSON Pointer, leaves only. Lists are compared place by place. */
export function differences(before: unknown, after: unknown, pointer = ''): Difference[] {
  if (Object.is(before, after) || (before === 0 && after === 0)) return []
  if (isTree(before) && isTree(after) && Array.isArray(before) === Array.isArray(after)) {
    const keys = new Set([...Object.keys(before), ...Object.keys(after)])
    return [...keys].flatMap((key) => {
      const at = `${pointer}/${escapeKey(key)}`
      return differences(
        Object.hasOwn(before, key) ? before[key] : undefined,
        Object.hasOwn(after, key) ? after[key] : undefined,
        at,
      )
    })
  }
  return [{ pointer, ...(before !== undefined && { before }), ...(after !== undefined && { after }) }]
}
