import { positions } from '../engine/index.ts'
import type { Layout } from '../engine/piles/layout.ts'
import type { Step, Trace } from '../engine/trace/step.ts'
import type { Stretch } from './draw/depth-figure.ts'
import type { LayoutView } from './draw/layout-figure.ts'

/** What the drawings take from the steps of a trace. `prefix` is where a resistance stands: '' or `resistance/<n>/`. */

const byIdOf = new WeakMap<Trace, Map<string, Step>>()
function byId(trace: Trace): Map<string, Step> {
  const known = byIdOf.get(trace) ?? new Map(trace.steps.map((s) => [s.id, s]))
  byIdOf.set(trace, known)
  return known
}

/** The sublayers of the shaft, with what each carries; those that nothing stands for are left out. */
export function shaftStretches(trace: Trace, prefix: string): Stretch[] {
  const steps = byId(trace)
  return trace.steps.flatMap((step): Stretch[] => {
    if (step.kind !== 'formula' || !step.id.startsWith(`${prefix}shaft/`)) return []
    if (!/^shaft\/\d+\/\d+\/R$/.test(step.id.slice(prefix.length))) return []
    const middle = steps.get(step.id.replace(/R$/, 'z'))
    const height = step.operands.find((o) => o.symbol === 'h')
    const unit = step.operands.find((o) => o.symbol === 'f')
    if (!middle || !height || !unit) return []
    const half = height.value / 2
    return [{ top: middle.value - half, bottom: middle.value + half, unit: unit.value, resistance: step.value }]
  })
}

/** Direction of the block's first side, as the solution of the smallest rectangle found it. */
export function blockAngle(trace: Trace, prefix: string): number {
  const step = byId(trace).get(`${prefix}block/e_1`)
  return step?.kind === 'solution' ? (step.unknowns[0]?.value ?? 0) : 0
}

/** Where the steps of a result stand: `resistance/<n>/` in an assessment. */
export function prefixOf(trace: Trace, pointer: string): string {
  const id = trace.results[pointer] ?? ''
  return /^resistance\/\d+\//.exec(id)?.[0] ?? ''
}

export const pilePoints = (layout: Layout): LayoutView['points'] => positions(layout)
