import { sameDimension, type UnitCode, units, writtenUnits } from './units.ts'

export type ReadQuantity =
  | { readonly ok: true; readonly value: number }
  | { readonly ok: false; readonly code: 'not-a-number' | 'unknown-unit' | 'wrong-dimension'; readonly got: string }

const WRITTEN = /^\s*([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)\s*(\S*)\s*$/u

const isAngle = (code: string) => code === 'deg' || code === 'rad' || code === '°'

/**
 * Reads a number (already in `expected`) or a string with a unit such as `"600 mm"`.
 * A string without a unit is taken in `expected`. Never throws.
 */
export function readQuantity(input: number | string, expected: UnitCode): ReadQuantity {
  if (typeof input === 'number') {
    return Number.isFinite(input) ? { ok: true, value: input } : { ok: false, code: 'not-a-number', got: String(input) }
  }
  const match = WRITTEN.exec(input)
  if (!match) return { ok: false, code: 'not-a-number', got: input }
  const number = Number(match[1])
  if (!Number.isFinite(number)) return { ok: false, code: 'not-a-number', got: input }
  const code = match[2] ?? ''
  if (code === '') return { ok: true, value: number }
  const written = Object.hasOwn(writtenUnits, code) ? writtenUnits[code] : undefined
  if (!written) return { ok: false, code: 'unknown-unit', got: input }
  const wanted = units[expected]
  // An angle is a ratio by dimension, yet "36 %" for a friction angle or "0.3 deg" for a ratio is a slip of the pen.
  if (!sameDimension(written, wanted) || isAngle(code) !== isAngle(expected)) {
    return { ok: false, code: 'wrong-dimension', got: input }
  }
  const value = code === expected ? number : (number * written.factor) / wanted.factor
  return Number.isFinite(value) ? { ok: true, value } : { ok: false, code: 'not-a-number', got: input }
}
