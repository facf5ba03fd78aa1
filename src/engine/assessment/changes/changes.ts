import type { Schedule } from '../schedule.ts'
import { type ChangedPart, changedInputs, type InputChange } from './changed-inputs.ts'
import {
  type AssessmentResult,
  type CapChange,
  type CheckChange,
  changedCaps,
  changedNeighbours,
  type LoneCap,
  type NeighbourChange,
  type Turn,
  turnOf,
} from './changed-verdicts.ts'

/** An assessment: what was asked and what came out. */
export type Assessed = { readonly schedule: Schedule; readonly result: AssessmentResult }

/** A check, of a cap or of a pair of neighbours, whose verdict turned. */
export type TurnedVerdict = CheckChange & {
  readonly cap?: string
  readonly a?: string
  readonly b?: string
  readonly turned: Turn
}
export type Changes = {
  readonly counts: {
    readonly turnedExceeded: number
    readonly turnedSatisfied: number
    readonly caps: number
    readonly added: number
    readonly gone: number
    readonly neighbours: number
    readonly inputs: Readonly<Partial<Record<ChangedPart, number>>>
  }
  readonly verdicts: readonly TurnedVerdict[]
  readonly caps: readonly CapChange[]
  readonly added: readonly LoneCap[]
  readonly gone: readonly LoneCap[]
  readonly neighbours: readonly NeighbourChange[]
  readonly inputs: readonly InputChange[]
}

const turns = [undefined, 'satisfied', 'exceeded']
const size = (by: number | undefined) => Math.abs(by ?? Number.POSITIVE_INFINITY)
/** What turned first, to exceeded before to satisfied; then by how far the utilisation moved; else as it stood. */
const first = (a: { turned?: Turn; by?: number }, b: { turned?: Turn; by?: number }) =>
  turns.indexOf(b.turned) - turns.indexOf(a.turned) || (size(b.by) === size(a.by) ? 0 : size(b.by) - size(a.by))

function turnedVerdicts(caps: readonly CapChange[], neighbours: readonly NeighbourChange[]): TurnedVerdict[] {
  const turned = <T extends CheckChange>(change: T) => {
    const turn = turnOf(change.before?.satisfied, change.after?.satisfied)
    return turn ? [{ ...change, turned: turn }] : []
  }
  return [
    ...caps.flatMap(({ mark, checks }) => checks.flatMap((check) => turned({ cap: mark, ...check }))),
    ...neighbours.flatMap(({ angularDistortion, ...pair }) => turned(pair)),
  ].sort(first)
}

/**
 * What differs between two assessments, in the order in which an engineer tells a checker: verdicts that turned, then the caps
 * with what governs them now, then the inputs behind it. Caps are matched by mark, rows by cap and combination, layers by their
 * order and names. The same two the other way round give the same with the sides changed. Nothing changed: every list is empty.
 */
export function changes(before: Assessed, after: Assessed): Changes {
  const { caps, added, gone } = changedCaps(before.result, after.result)
  const neighbours = changedNeighbours(before.result, after.result)
  const inputs = changedInputs(before.schedule, after.schedule)
  const verdicts = turnedVerdicts(caps, neighbours)
  const count = (turn: Turn) => verdicts.filter((v) => v.turned === turn).length
  const byPart: Partial<Record<ChangedPart, number>> = {}
  for (const { part } of inputs) byPart[part] = (byPart[part] ?? 0) + 1
  return {
    counts: {
      turnedExceeded: count('exceeded'),
      turnedSatisfied: count('satisfied'),
      caps: caps.length,
      added: added.length,
      gone: gone.length,
      neighbours: neighbours.length,
      inputs: byPart,
    },
    verdicts,
    caps: caps.sort(first),
    added,
    gone,
    neighbours: neighbours.sort(first),
    inputs,
  }
}
