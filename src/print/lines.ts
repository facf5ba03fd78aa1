import type { Step, Trace } from '../engine/trace/step.ts'
import { type Section, sectionOf } from './sections.ts'

/** One printed line: a step, with all steps that say the same of the same numbers. */
export type Line = { readonly number: number; readonly step: Step; readonly ids: readonly string[] }
/** Lines of one formula under one heading are printed as one table. */
export type Group = { readonly section: Section; readonly lines: readonly Line[] }

export type Lines = {
  readonly given: readonly Line[]
  readonly groups: readonly Group[]
  /** Line of a step id. */
  readonly of: (id: string) => Line | undefined
  /** Numbers of the lines that take a line as operand, rising. */
  readonly usedBy: (line: Line) => readonly number[]
}

type Draft = { readonly step: Step; readonly ids: string[]; readonly from: readonly Draft[]; number: number }
type Bundle = { readonly section: Section; readonly drafts: Draft[]; readonly at: number }

const operandsOf = (step: Step) => ('operands' in step ? step.operands : [])

/**
 * Numbers the steps of a trace for the paper: what is given first, then bundles of one formula, each after the lines that it
 * takes its operands from, and staying under one heading as long as it can. Steps that say the same share one line.
 */
export function linesOf(trace: Trace): Lines {
  const { drafts, byId } = distinct(trace.steps)
  const given = [
    ...Map.groupBy(
      drafts.filter((d) => d.step.kind === 'input'),
      (d) => alikeInput(d.step),
    ).values(),
  ].flat()
  const bundles = inOrder(bundled(drafts.filter((d) => d.step.kind !== 'input')))
  let count = 0
  for (const draft of [...given, ...bundles.flatMap((b) => b.drafts)]) draft.number = ++count
  const users = new Map<Draft, Set<number>>()
  for (const draft of drafts) {
    for (const source of draft.from) {
      const known = users.get(source)
      if (known) known.add(draft.number)
      else users.set(source, new Set([draft.number]))
    }
  }
  return {
    given,
    groups: bundles.map((b) => ({ section: b.section, lines: b.drafts })),
    of: (id) => byId.get(id),
    usedBy: (line) => [...(users.get(line as Draft) ?? [])].sort((a, b) => a - b),
  }
}

function distinct(steps: readonly Step[]): { drafts: Draft[]; byId: Map<string, Draft> } {
  const byId = new Map<string, Draft>()
  const bySaying = new Map<string, Draft>()
  for (const step of steps) {
    const from = operandsOf(step).flatMap((o) => byId.get(o.from) ?? [])
    const saying = JSON.stringify([
      { ...step, id: '', operands: 0 },
      from.map((d) => d.step.id),
      step.kind === 'input' ? '' : sectionOf(step.id).key,
    ])
    const known = bySaying.get(saying)
    if (known) known.ids.push(step.id)
    const draft = known ?? { step, ids: [step.id], from, number: 0 }
    bySaying.set(saying, draft)
    byId.set(step.id, draft)
  }
  return { drafts: [...bySaying.values()], byId }
}

/** What steps of one bundle have alike: formulas one text, solutions one method; all others stand alone. */
function alike(step: Step): string {
  if (step.kind === 'solution' && !step.table && !step.mesh) {
    const parts = [...step.operands, ...step.residuals].map((o) => ('symbol' in o ? o.symbol : o.name))
    return [sectionOf(step.id).key, nameOfMany(step.name), step.method, step.unit, ...parts].join('|')
  }
  if (step.kind !== 'formula') return step.id
  const operands = step.operands.map((o) => `${o.symbol} ${o.unit}`).join(',')
  return [sectionOf(step.id).key, step.symbol, step.name, step.formula, step.unit, operands].join('|')
}

/** What inputs have alike that only a number in their name, or their value, tells apart. */
export function alikeInput(step: Step): string {
  const why = step.kind === 'input' ? (step.from ?? step.reason) : undefined
  return JSON.stringify([step.symbol, nameOfMany(step.name), why])
}

/** The name of lines that only a number in it tells apart. */
export const nameOfMany = (name: string): string => name.replace(/ \d+\b/g, '')

function bundled(drafts: readonly Draft[]): Bundle[] {
  const made = new Map<string, Bundle>()
  for (const [at, draft] of drafts.entries()) {
    const key = alike(draft.step)
    const known = made.get(key)
    if (known) known.drafts.push(draft)
    else made.set(key, { section: sectionOf(draft.step.id), drafts: [draft], at })
  }
  return [...made.values()]
}

/** Bundles after those that they depend on; where two bundles need each other, the earlier one falls into its lines. */
function inOrder(bundles: readonly Bundle[]): Bundle[] {
  const out: Bundle[] = []
  const placed = new Set<Draft>()
  let waiting = [...bundles]
  let section = ''
  const ready = ({ drafts }: Bundle) => {
    const own = new Set(drafts)
    return drafts.every((d) => d.from.every((f) => f.step.kind === 'input' || placed.has(f) || own.has(f)))
  }
  while (waiting.length > 0) {
    const next = waiting.find((b) => b.section.key === section && ready(b)) ?? waiting.find(ready)
    if (!next) {
      const knot = waiting.find((b) => b.drafts.length > 1)
      if (!knot) throw new Error('the steps of a trace depend on each other in a circle')
      const single = knot.drafts.map((draft, i) => ({ section: knot.section, drafts: [draft], at: knot.at + i / 1e6 }))
      waiting = [...waiting.filter((b) => b !== knot), ...single].sort((a, b) => a.at - b.at)
      continue
    }
    section = next.section.key
    for (const draft of next.drafts) placed.add(draft)
    out.push(next)
    waiting = waiting.filter((b) => b !== next)
  }
  return out
}
