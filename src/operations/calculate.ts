import type { z } from 'zod'
import { hashOf } from '../canonical.ts'
import { parse } from '../contract/parse.ts'
import { type Answer, EngineFault, engineVersion, sliceTrace } from '../engine/index.ts'
import { type ErrorCode, problemError, problemOf } from '../errors.ts'

export type Options = { readonly trace: boolean; readonly of?: string; readonly cap?: string }

/** What every calculator does: parse, hash, compute, and say by which engine. */
export function calculate<T, R>(
  schema: z.ZodType<T>,
  compute: (request: T, option: { trace: boolean; cap?: string }) => Answer<R>,
  input: unknown,
  options: Options,
) {
  const request = parse(schema, input)
  const requestHash = hashOf(request)
  const answer = told(() => compute(request, options))
  const trace = answer.trace && options.of !== undefined ? sliceTrace(answer.trace, options.of) : answer.trace
  return { ...answer, ...(trace && { trace }), meta: { engine: engineVersion, requestHash } }
}

/** Turns a refusal of the engine into the problem that is told. */
export function told<R>(compute: () => R): R {
  try {
    return compute()
  } catch (fault) {
    if (!(fault instanceof EngineFault)) throw fault
    throw problemOf(fault.faults.map((f) => problemError(f.pointer, f.code as ErrorCode, f.facts)))
  }
}
