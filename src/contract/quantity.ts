import { z } from 'zod'
import { readQuantity } from '../engine/index.ts'
import type { UnitCode } from '../engine/quantities/units.ts'

export type Bounds = { readonly min?: number; readonly above?: number; readonly max?: number }

/** A number in `unit`, or a string with a unit; gives the number in `unit`. Out of bounds and wrong dimensions are issues with their facts. */
export function quantity(unit: UnitCode, description: string, bounds: Bounds = {}) {
  const { min, above, max } = bounds
  return z
    .union([z.number(), z.string()])
    .transform((input, context) => {
      const read = readQuantity(input, unit)
      const issue = (code: string, facts: object) => {
        context.issues.push({ code: 'custom', input, params: { code, ...facts }, message: code })
        return z.NEVER
      }
      if (!read.ok) return issue(read.code, { got: read.got, expected: unit })
      const { value } = read
      const wrong = (relation: string, limit: number) => issue('out-of-range', { relation, limit, got: value, unit })
      if (min !== undefined && value < min) return wrong('at least', min)
      if (above !== undefined && value <= above) return wrong('greater than', above)
      if (max !== undefined && value > max) return wrong('at most', max)
      return value
    })
    .meta({
      description,
      'x-unit': unit,
      ...(min !== undefined && { minimum: min }),
      ...(above !== undefined && { exclusiveMinimum: above }),
      ...(max !== undefined && { maximum: max }),
    })
}

/** A quantity that is constant, or linear from top to bottom of its layer. */
export const varying = (unit: UnitCode, description: string, bounds: Bounds = {}) =>
  z.union([
    quantity(unit, description, bounds),
    z.strictObject({
      top: quantity(unit, `${description}, at the top`, bounds),
      bottom: quantity(unit, `${description}, at the bottom`, bounds),
    }),
  ])
