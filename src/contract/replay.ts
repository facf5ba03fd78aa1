import { z } from 'zod'
import type { Step } from '../engine/index.ts'

const number = z.number()
const operands = z
  .array(
    z.strictObject({
      symbol: z.string().max(100),
      value: number,
      unit: z.string().max(20),
      from: z.string().max(1000),
    }),
  )
  .max(5000)
const citation = z.strictObject({ key: z.string(), locator: z.string() })
const line = {
  id: z.string().min(1).max(1000),
  symbol: z.string().max(100),
  name: z.string().max(500),
  value: number,
  unit: z.string().max(20),
  quantity: z.string().max(100),
}
const unknown = z.strictObject({ symbol: z.string(), value: number, unit: z.string() })

export const step = z.discriminatedUnion('kind', [
  z.strictObject({
    ...line,
    kind: z.literal('input'),
    from: z.string().optional(),
    default: z.literal(true).optional(),
    reason: z.string().optional(),
    source: citation.optional(),
  }),
  z.strictObject({
    ...line,
    kind: z.literal('formula'),
    formula: z.string().max(500),
    operands,
    source: citation,
    range: z
      .array(
        z.strictObject({ symbol: z.string(), min: number.optional(), max: number.optional(), inside: z.boolean() }),
      )
      .optional(),
  }),
  z.strictObject({ ...line, kind: z.literal('sum'), operands }),
  z.strictObject({
    ...line,
    kind: z.literal('lookup'),
    operands,
    rows: z
      .array(z.tuple([number, number]))
      .min(1)
      .max(2),
    source: citation,
  }),
  z.strictObject({
    ...line,
    kind: z.literal('choice'),
    rule: z.enum(['smallest', 'largest']),
    operands: operands.min(1),
    chosen: z.string(),
  }),
  z.strictObject({
    ...line,
    kind: z.literal('solution'),
    method: z.string(),
    operands,
    unknowns: z.array(unknown).max(5000),
    residuals: z.array(z.strictObject({ name: z.string(), value: number })).max(100),
    tolerance: number,
    mesh: z.array(number).max(10_000).optional(),
    table: z
      .strictObject({
        columns: z.array(z.strictObject({ symbol: z.string(), unit: z.string() })).max(20),
        rows: z.array(z.array(number).max(20)).max(10_000),
      })
      .optional(),
    source: citation,
  }),
])

export type ReplayRequest = { readonly trace: { readonly steps: readonly Step[] }; readonly request?: unknown }

/** A trace as an answer printed it, and, if wanted, the request that it belongs to. */
export const replayRequest = z.strictObject({
  trace: z.strictObject({
    steps: z.array(step).min(1).max(200_000),
    results: z.record(z.string(), z.string()).optional(),
    sources: z.array(z.unknown()).optional(),
  }),
  request: z.unknown().optional(),
}) as unknown as z.ZodType<ReplayRequest>
