import { escapePointer } from '../places.ts'

/** Where a thing stands in the schedule before and in the schedule after; on one side only where it was added or is gone. */
export type Pointers = { readonly before?: string; readonly after?: string }

/** One place where two values differ. What is absent on one side is left out there. */
export type Leaf = {
  readonly pointer: Pointers
  /** The way from what was compared down to the place, `undrainedShearStrength/top`. */
  readonly field: string
  readonly before?: unknown
  readonly after?: unknown
  /** After less before, where both are numbers; in the unit of the field. */
  readonly by?: number
}

/** Fields that say which of several shapes a value has: two of different shapes have nothing to be compared field by field. */
const shapes = ['kind', 'format', 'shape', 'route', 'soil', 'method']

type Tree = Readonly<Record<string, unknown>>
const isTree = (value: unknown): value is Tree => typeof value === 'object' && value !== null
const sameShape = (a: Tree, b: Tree) =>
  Array.isArray(a) === Array.isArray(b) && shapes.every((field) => a[field] === b[field])
const same = (a: unknown, b: unknown) => Object.is(a, b) || (a === 0 && b === 0)
const own = (tree: Tree, key: string) => (Object.hasOwn(tree, key) ? tree[key] : undefined)

export function leaf(pointer: Pointers, field: string, before: unknown, after: unknown): Leaf {
  const by = typeof before === 'number' && typeof after === 'number' ? { by: after - before } : {}
  return {
    pointer: {
      ...(before !== undefined && { before: pointer.before }),
      ...(after !== undefined && { after: pointer.after }),
    },
    field,
    ...(before !== undefined && { before }),
    ...(after !== undefined && { after }),
    ...by,
  }
}

/** Every place where two values differ, in the order of the fields. Lists are compared place by place. */
export function* leaves(before: unknown, after: unknown, pointer: Required<Pointers>, field = ''): Generator<Leaf> {
  if (same(before, after)) return
  if (!isTree(before) || !isTree(after) || !sameShape(before, after)) {
    yield leaf(pointer, field, before, after)
    return
  }
  for (const key of new Set([...Object.keys(before), ...Object.keys(after)])) {
    const part = `/${escapePointer(key)}`
    const at = { before: pointer.before + part, after: pointer.after + part }
    yield* leaves(own(before, key), own(after, key), at, field === '' ? key : `${field}/${key}`)
  }
}
