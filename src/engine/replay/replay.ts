import { quantityKind } from '../quantities/quantity-kind.ts'
import type { OperandLine, Step } from '../trace/step.ts'
import { evaluateFormula } from './evaluator.ts'

export type ReplayedStep = {
  readonly id: string
  readonly holds: boolean
  readonly why?: string
  readonly printed?: number
  readonly found?: number
}
export type Replay = { readonly holds: boolean; readonly count: number; readonly steps: readonly ReplayedStep[] }

/** Relative difference up to which a printed and a re-computed value are the same. */
const TOLERANCE = 1e-9
/** Infinity would be within tolerance of everything, so only finite numbers are ever the same. */
const same = (a: number, b: number) =>
  Number.isFinite(a) && Number.isFinite(b) && Math.abs(a - b) <= TOLERANCE * Math.max(Math.abs(a), Math.abs(b), 1e-12)

/**
 * Re-computes each step of a printed trace from its printed operands, by an evaluator that shares nothing with the engine's compiler.
 * A step that fails is named. An operand that differs from the step it came from is blamed on the step that printed it wrongly:
 * on the user where the origin re-computes, on the origin where it does not.
 */
export function replay(trace: { readonly steps: readonly Step[] }, request?: unknown): Replay {
  const origins = new Map<string, { readonly step: Step; readonly holds: boolean }>()
  const users = new Map<string, OperandLine[]>()
  for (const step of trace.steps) for (const o of operandsOf(step)) users.set(o.from, [...(users.get(o.from) ?? []), o])
  const steps = trace.steps.map((step): ReplayedStep => {
    const why = origins.has(step.id)
      ? 'the id stands twice'
      : (closed(step, origins) ?? verdict(step, users.get(step.id) ?? [], request))
    if (!origins.has(step.id)) origins.set(step.id, { step, holds: why === undefined })
    if (why === undefined) return { id: step.id, holds: true }
    return typeof why === 'string'
      ? { id: step.id, holds: false, why }
      : { id: step.id, holds: false, why: 'the operands give another value', printed: step.value, found: why.found }
  })
  return { holds: steps.every((s) => s.holds), count: steps.length, steps }
}

const operandsOf = (step: Step): readonly OperandLine[] =>
  'operands' in step && Array.isArray(step.operands) ? step.operands : []

/** Every operand comes from an earlier step, with that step's value and unit. */
function closed(step: Step, origins: ReadonlyMap<string, { step: Step; holds: boolean }>): string | undefined {
  for (const o of operandsOf(step)) {
    const origin = origins.get(o.from)
    if (!origin) return `operand ${o.symbol} comes from ${o.from}, which is no earlier step`
    if (!origin.holds) continue
    if (origin.step.unit !== o.unit)
      return `operand ${o.symbol} is printed in ${o.unit}, its step in ${origin.step.unit}`
    if (!same(origin.step.value, o.value))
      return `operand ${o.symbol} is printed as ${o.value}, its step as ${origin.step.value}`
  }
  return undefined
}

function verdict(step: Step, uses: readonly OperandLine[], request: unknown): string | { found: number } | undefined {
  if (!Number.isFinite(step.value)) return 'the value is not a finite number'
  if (quantityKind(step.unit) !== step.quantity) return `the unit ${step.unit} does not measure a ${step.quantity}`
  try {
    switch (step.kind) {
      case 'formula':
        return match(step.value, evaluateFormula(step.formula, step.operands, step.unit), roundingOf(step))
      case 'sum':
        return step.operands.some((o) => o.unit !== step.unit)
          ? 'the parts are in other units'
          : match(
              step.value,
              step.operands.reduce((s, o) => s + o.value, 0),
            )
      case 'choice':
        return choice(step)
      case 'lookup':
        return lookup(step)
      case 'solution':
        return step.residuals.some((r) => !(Math.abs(r.value) <= step.tolerance))
          ? 'a residual exceeds the tolerance'
          : given(step, uses)
      case 'input':
        return input(step, uses, request)
      default:
        return 'the kind of the step is unknown'
    }
  } catch (fault) {
    return (fault as Error).message
  }
}

/** What was found is printed in the answer, which holds no NaN and no Infinity. */
function match(printed: number, found: number, rounding = 0): string | { found: number } | undefined {
  if (!Number.isFinite(found)) return 'the operands give no finite number'
  return same(printed, found) || Math.abs(printed - found) <= rounding ? undefined : { found }
}

/** What rounding leaves where operands cancel to nothing: a few units in the last place of the largest operand of the step's own unit. */
const roundingOf = (step: Step & { kind: 'formula' }): number =>
  step.operands.reduce((most, o) => (o.unit === step.unit ? Math.max(most, Math.abs(o.value)) : most), 0) *
  64 *
  Number.EPSILON

/** A value that nothing re-computes: wrong where all its users printed another one alike. */
function given(step: Step, uses: readonly OperandLine[]): string | undefined {
  const [first] = uses
  const agree = first && uses.every((u) => same(u.value, first.value) && u.unit === first.unit)
  if (uses.length > 1 && agree && (!same(first.value, step.value) || first.unit !== step.unit))
    return `its users print ${first.value} ${first.unit}`
  return undefined
}

function choice(step: Step & { kind: 'choice' }): string | { found: number } | undefined {
  const values = step.operands.map((o) => o.value)
  if (step.operands.some((o) => o.unit !== step.unit)) return 'a candidate is in another unit'
  const chosen = step.operands.find((o) => o.from === step.chosen)
  if (!chosen) return 'the chosen step is no candidate'
  const found = step.rule === 'smallest' ? Math.min(...values) : Math.max(...values)
  return same(chosen.value, found) ? match(step.value, found) : `the ${step.rule} candidate is another one`
}

function lookup(step: Step & { kind: 'lookup' }): string | { found: number } | undefined {
  const x = step.operands[0]?.value
  const [low, high = low] = step.rows
  if (x === undefined || !low || !high) return 'the rows are missing'
  if (step.rows.length > 1 && (x < low[0] || x > high[0])) return 'the rows do not bracket the argument'
  const found = low[0] === high[0] ? low[1] : low[1] + ((high[1] - low[1]) * (x - low[0])) / (high[0] - low[0])
  return match(step.value, found)
}

function input(step: Step & { kind: 'input' }, uses: readonly OperandLine[], request: unknown): string | undefined {
  if (step.default) return step.reason ? given(step, uses) : 'a default without its reason'
  if (typeof step.from !== 'string' || !/^(\/|$)/.test(step.from)) return 'the origin is no JSON Pointer'
  if (request === undefined) return given(step, uses)
  const path = step.from
    .split('/')
    .slice(1)
    .map((k) => k.replaceAll('~1', '/').replaceAll('~0', '~'))
  const found = path.reduce<unknown>(
    (n, k) =>
      typeof n === 'object' && n !== null && Object.hasOwn(n, k) ? (n as Record<string, unknown>)[k] : undefined,
    request,
  )
  if (found === undefined) return `the request has nothing at ${step.from}`
  return typeof found === 'number' && !same(found, step.value) ? `the request says ${found}` : given(step, uses)
}
