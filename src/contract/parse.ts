import type { z } from 'zod'
import { type ErrorCode, type ProblemError, problemError, problemOf } from '../errors.ts'

type Issue = z.core.$ZodIssue

const pointerOf = (path: readonly PropertyKey[]): string =>
  path.map((key) => `/${String(key).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('')
const kindOf = (value: unknown): string => (value === null ? 'null' : Array.isArray(value) ? 'array' : typeof value)

/** The value at a path of the request, for what was read. */
const valueAt = (input: unknown, path: readonly PropertyKey[]): unknown =>
  path.reduce<unknown>(
    (node, key) =>
      typeof node === 'object' && node !== null && Object.hasOwn(node, key)
        ? (node as Record<PropertyKey, unknown>)[key]
        : undefined,
    input,
  )

/** Translates the issues of a schema into the catalogue's errors, one for each fault. */
function errorsOf(issue: Issue, input: unknown, base: readonly PropertyKey[] = []): ProblemError[] {
  const path = [...base, ...issue.path]
  const pointer = pointerOf(path)
  const got = valueAt(input, path)
  const missing = () =>
    path.length === 0
      ? problemError('', 'wrong-type', { expected: 'a JSON object', got: 'no body' })
      : problemError(pointer, 'missing-field', { field: String(path.at(-1)) })
  switch (issue.code) {
    case 'unrecognized_keys':
      return issue.keys.map((field) => problemError(`${pointer}${pointerOf([field])}`, 'unknown-field', { field }))
    case 'invalid_type':
      return [
        got === undefined
          ? missing()
          : problemError(pointer, 'wrong-type', { expected: issue.expected, got: kindOf(got) }),
      ]
    case 'invalid_value':
      return [
        got === undefined
          ? missing()
          : problemError(pointer, 'unknown-choice', { options: issue.values.map(String), got: String(got) }),
      ]
    case 'too_small':
      return [
        issue.origin === 'array' || issue.origin === 'string'
          ? problemError(pointer, 'too-few-items', {
              limit: Number(issue.minimum),
              got: (got as { length: number }).length,
            })
          : problemError(pointer, 'out-of-range', {
              relation: 'at least',
              limit: Number(issue.minimum),
              got,
              unit: '',
            }),
      ]
    case 'too_big':
      return [
        issue.origin === 'array' || issue.origin === 'string'
          ? problemError(pointer, 'too-many-items', {
              limit: Number(issue.maximum),
              got: (got as { length: number }).length,
            })
          : problemError(pointer, 'out-of-range', { relation: 'at most', limit: Number(issue.maximum), got, unit: '' }),
      ]
    case 'invalid_union':
      return unionErrors(issue, input, path)
    case 'custom': {
      const { code, ...facts } = (issue.params ?? {}) as { code?: ErrorCode }
      return [problemError(pointer, code ?? 'wrong-type', facts)]
    }
    default:
      return [problemError(pointer, 'wrong-type', { expected: issue.message, got: kindOf(got) })]
  }
}

/** Of a union, the errors of the branch that the input was meant for: the one whose issues lie deepest. */
function unionErrors(
  issue: Issue & { code: 'invalid_union' },
  input: unknown,
  path: readonly PropertyKey[],
): ProblemError[] {
  const got = valueAt(input, path)
  const pointer = pointerOf(path)
  if (got === undefined) return [problemError(pointer, 'missing-field', { field: String(path.at(-1)) })]
  const options = 'options' in issue && Array.isArray(issue.options) ? issue.options.map(String) : undefined
  if (issue.errors.length === 0)
    return [
      problemError(pointer, 'unknown-choice', {
        options: options ?? [],
        got: kindOf(got) === 'object' ? 'object' : String(got),
      }),
    ]
  const isObject = kindOf(got) === 'object'
  const fitting = issue.errors.filter((branch) => !branch.some((i) => i.path.length === 0 && i.code === 'invalid_type'))
  const branch =
    fitting.find((b) => !isObject || b.some((i) => i.path.length > 0 || i.code === 'unrecognized_keys')) ?? fitting[0]
  if (!branch)
    return [problemError(pointer, 'wrong-type', { expected: 'a number or a string with a unit', got: kindOf(got) })]
  return branch.flatMap((i) => errorsOf(i, input, path))
}

/** Parses at the door: the typed request, or one problem with every fault. */
export function parse<T>(schema: z.ZodType<T>, input: unknown): T {
  const read = schema.safeParse(input)
  if (read.success) return read.data
  const errors = read.error.issues.flatMap((issue) => errorsOf(issue, input))
  const once = new Map(errors.map((e) => [`${e.pointer} ${e.code}`, e]))
  throw problemOf([...once.values()])
}
