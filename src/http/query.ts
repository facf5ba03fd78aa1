import type { FastifyRequest } from 'fastify'
import { Problem } from '../errors.ts'

/** How one query parameter is read; undefined where the text is none of it. */
export type Parameter<T> = { readonly expected: string; readonly read: (text: string) => T | undefined }

export const whole = (min: number, max: number): Parameter<number> => ({
  expected: `a whole number from ${min} to ${max}`,
  read: (text) => (/^\d{1,9}$/.test(text) && Number(text) >= min && Number(text) <= max ? Number(text) : undefined),
})
export const decimal: Parameter<number> = {
  expected: 'a number',
  read: (text) => (/^\d{1,9}(\.\d{1,9})?$/.test(text) ? Number(text) : undefined),
}
export const oneOf = <const T extends string>(...names: readonly T[]): Parameter<T> => ({
  expected: names.join(' or '),
  read: (text) => names.find((name) => name === text),
})
export const yesOrNo: Parameter<boolean> = {
  expected: 'true or false',
  read: (text) => (text === 'true' ? true : text === 'false' ? false : undefined),
}
export const anyText = (expected: string): Parameter<string> => ({ expected, read: (text) => text || undefined })

/** Reads the query by its parameters. Throws `bad-query` for a value that does not fit and for a parameter that is not known. */
export function readQuery<P extends Readonly<Record<string, Parameter<unknown>>>>(
  request: FastifyRequest,
  parameters: P,
): { [K in keyof P]?: P[K] extends Parameter<infer T> ? T : never } {
  const read: Record<string, unknown> = {}
  for (const [field, got] of Object.entries(request.query as Record<string, string | string[]>)) {
    const parameter = Object.hasOwn(parameters, field) ? parameters[field] : undefined
    // A misspelt parameter that vanished would give another answer than was asked for.
    if (!parameter)
      throw new Problem('bad-query', { field, expected: Object.keys(parameters).join(', ') || 'left out', got })
    const value = typeof got === 'string' ? parameter.read(got) : undefined
    if (value === undefined) throw new Problem('bad-query', { field, expected: parameter.expected, got })
    read[field] = value
  }
  return read as never
}
