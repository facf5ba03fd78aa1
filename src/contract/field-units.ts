import { z } from 'zod'
import { scheduleRequest } from './schedule.ts'

type Schema = {
  readonly 'x-unit'?: string
  readonly properties?: Readonly<Record<string, Schema>>
  readonly [keyword: string]: unknown
}

/** Units of the fields of a schedule by their names, read from the schemas that parse it. `top` and `bottom` have that of their owner. */
export function fieldUnits(): ReadonlyMap<string, ReadonlySet<string>> {
  const found = new Map<string, Set<string>>()
  const note = (name: string, unit: string) => found.set(name, (found.get(name) ?? new Set()).add(unit))
  const walk = (schema: unknown, name: string): void => {
    if (typeof schema !== 'object' || schema === null) return
    const { 'x-unit': unit, properties, ...others } = schema as Schema
    if (unit) note(name, unit)
    for (const [key, inner] of Object.entries(properties ?? {}))
      walk(inner, key === 'top' || key === 'bottom' ? name : key)
    for (const inner of Object.values(others)) walk(inner, name)
  }
  walk(z.toJSONSchema(scheduleRequest, { io: 'input', unrepresentable: 'any', reused: 'inline' }), '')
  return found
}

const units = fieldUnits()

/** The unit of a value by its JSON Pointer into a schedule; undefined where it is no quantity. */
export function unitOf(pointer: string): string | undefined {
  const parts = pointer.split('/')
  const last = parts.at(-1)!
  const name = last === 'top' || last === 'bottom' ? parts.at(-2)! : last
  return units.get(name)?.values().next().value
}
