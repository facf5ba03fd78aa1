import type { Point } from '../piles/layout.ts'
import { type CapActions, capActions } from './cap-loads.ts'
import type { ResistanceSet } from './resistance-set.ts'
import type { Cap, ModelRow, PressingRow, Schedule } from './schedule.ts'

/** What the other caps do to a rigid cap under one combination, at its origin: m and slopes. */
export type Felt = {
  readonly settlement: number
  readonly alongX: number
  readonly alongY: number
  /** The caps that add most: mark's index, distance, V and what it adds in mm. */
  readonly largest: readonly (readonly [number, number, number, number])[]
}
/** By cap index and combination; nothing where no other cap carries load. */
export type CapField = (cap: number, combination: string) => Felt | undefined

/** Caps farther apart than so many times their extents act as single loads on single points; at 8 the settlement so found is off by 0.2 %. */
const FAR = 8
/** Contributions kept by name. */
const KEPT = 8

type Member = {
  readonly cap: Cap
  readonly set: ResistanceSet
  readonly reach: number
  /** Loads of the piles for unit V, My and Mx at the cap's origin. By reciprocity also how the cap follows the ground under its piles. */
  readonly unit: readonly [Float64Array, Float64Array, Float64Array]
  readonly loads: Map<string, CapActions>
}

/**
 * The field of every cap at every other, for the given combinations. Two piles act on one another by the mean of what each method says:
 * alpha(s)/k of either pile (reciprocal). The caps are rigid; their loads stay.
 */
export function capField(
  schedule: Schedule,
  sets: readonly ResistanceSet[],
  rows: readonly { readonly row: ModelRow | PressingRow }[],
): CapField {
  const members = schedule.caps.map((cap, i) => member(cap, sets[i]!))
  const index = new Map(schedule.caps.map((cap, i) => [cap.mark, i]))
  for (const { row } of rows) {
    const { cap, loads } = members[index.get(row.cap)!]!
    loads.set(row.combination, capActions(schedule.loads, row, cap.capWeight ?? 0))
  }
  const felt = members.map(() => new Map<string, Sum>())
  for (let a = 0; a < members.length; a++)
    for (let b = 0; b < a; b++) {
      const F = crossFlexibility(members[a]!, members[b]!)
      add(felt[a]!, members[b]!, b, F, distance(members[a]!.cap, members[b]!.cap), false)
      add(felt[b]!, members[a]!, a, F, distance(members[a]!.cap, members[b]!.cap), true)
    }
  return (cap, combination) => felt[cap]!.get(combination)
}

type Sum = {
  settlement: number
  alongX: number
  alongY: number
  largest: (readonly [number, number, number, number])[]
}

/** Adds what one cap's loads do. `F` maps V, My, Mx of the second of its pair to settlement and slopes of the first; transposed the other way. */
function add(
  felt: Map<string, Sum>,
  from: Member,
  index: number,
  F: Float64Array,
  far: number,
  transposed: boolean,
): void {
  const at = (r: number, c: number) => F[transposed ? c * 3 + r : r * 3 + c]!
  for (const [combination, { V, Mx, My }] of from.loads) {
    const row = (r: number) => at(r, 0) * V + at(r, 1) * My + at(r, 2) * Mx
    const settlement = row(0)
    let sum = felt.get(combination)
    if (!sum) {
      sum = { settlement: 0, alongX: 0, alongY: 0, largest: [] }
      felt.set(combination, sum)
    }
    sum.settlement += settlement
    sum.alongX += row(1)
    sum.alongY += row(2)
    const { largest } = sum
    largest.push([index, far, V, settlement * 1000])
    if (largest.length <= KEPT) continue
    largest.sort((p, q) => Math.abs(q[3]) - Math.abs(p[3]))
    largest.length = KEPT
  }
}

function member(cap: Cap, set: ResistanceSet): Member {
  const { elastic } = set.prepared
  const { flexibility: F, centroid } = elastic
  const reach = Math.max(...set.points.map((p) => Math.hypot(p.x, p.y)), set.prepared.pile.width.value)
  const loads = (V: number, My: number, Mx: number) => {
    const about = [V, My - V * centroid.x, Mx - V * centroid.y]
    const part = (r: number) => F[r * 3]! * about[0]! + F[r * 3 + 1]! * about[1]! + F[r * 3 + 2]! * about[2]!
    return elastic.pileLoads({ centre: part(0), alongX: part(1), alongY: part(2) })
  }
  return { cap, set, reach, unit: [loads(1, 0, 0), loads(0, 1, 0), loads(0, 0, 1)], loads: new Map() }
}

const distance = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y)

/** Settlement and slopes of cap a at its origin for unit V, My, Mx on cap b, 3 x 3 row-major. */
function crossFlexibility(a: Member, b: Member): Float64Array {
  const [one, two] = [a.set.prepared, b.set.prepared]
  const same = a.set === b.set
  const between = (s: number) => {
    const own = one.pile.interaction(s) / one.stiffness.value
    return same ? own : (own + two.pile.interaction(s) / two.stiffness.value) / 2
  }
  const out = new Float64Array(9)
  const far = distance(a.cap, b.cap)
  if (far > FAR * (a.reach + b.reach)) {
    out[0] = between(far)
    return out
  }
  for (const [i, p] of a.set.points.entries())
    for (const [j, q] of b.set.points.entries()) {
      const w = between(Math.hypot(a.cap.x + p.x - b.cap.x - q.x, a.cap.y + p.y - b.cap.y - q.y))
      for (let r = 0; r < 3; r++) for (let c = 0; c < 3; c++) out[r * 3 + c]! += a.unit[r]![i]! * w * b.unit[c]![j]!
    }
  return out
}
