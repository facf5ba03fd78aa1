import { refuse } from '../faults.ts'
import { factor, solveFactored } from '../numerics/cholesky.ts'
import { tabulate } from '../numerics/tabulate.ts'
import { smallestSpacing } from '../piles/enclosing-prism.ts'
import { centroidOf, type Point } from '../piles/layout.ts'
import { type ModeLoads, solveModes } from './kernel-solve.ts'
import { type Fold, foldOf } from './mirror-fold.ts'
import { type Mode, planeModes } from './plane-modes.ts'

/** Loads at the cap's origin: kN and kN.m, pressing signs. */
export type CapLoad = { readonly V: number; readonly Mx: number; readonly My: number }
/** A plane of settlements: at the centroid (m) and its slopes. */
export type Plane = { readonly centre: number; readonly alongX: number; readonly alongY: number }

/** A group of elastic piles prepared once: interaction factored, plane stiffness ready for any load. */
export type ElasticGroup = {
  readonly points: readonly Point[]
  readonly centroid: Point
  /** Flexibility of the plane for V, My, Mx at the centroid, 3 x 3 row-major: settlement, slope along x, slope along y. */
  readonly flexibility: Float64Array
  /** Largest residual of the solves, relative; 0 where they were direct. */
  readonly residual: number
  /** Pile loads for a plane of settlements. */
  readonly pileLoads: (plane: Plane) => Float64Array
  /** Settlements of piles under given loads, m. */
  readonly settlements: (loads: Float64Array) => Float64Array
  readonly plane: (load: CapLoad, pointer: string) => Plane
  /** Refuses a moment about an axis across which no pile stands. */
  readonly assertTaken: (load: CapLoad, pointer: string) => void
}

/** How piles answer: their loads for each movement of a rigid plane, and their settlements under given loads. */
export type PileAnswers = {
  readonly modes: (about: readonly Point[], fold: Fold, modes: readonly Mode[]) => ModeLoads
  readonly settlements: (loads: Float64Array) => Float64Array
}

/** From so many piles on the interaction comes from a table. */
const TABLED = 48

/** Piles that act on each other by superposed interaction factors: stiffness of one pile (kN/m) and the factor at a spacing. */
export function superposed(
  points: readonly Point[],
  stiffness: number,
  interaction: (s: number) => number,
): PileAnswers {
  const factorAt = points.length > TABLED ? tabled(points, interaction) : interaction
  const own = 1 / stiffness
  const entry = (distance: number) => (distance === 0 ? own : factorAt(distance) * own)
  return {
    modes: (about, fold, modes) => solveModes(about, fold, modes, entry),
    settlements: (loads) =>
      Float64Array.from(points, (p) =>
        points.reduce((sum, q, j) => sum + loads[j]! * entry(Math.hypot(p.x - q.x, p.y - q.y)), 0),
      ),
  }
}

function tabled(points: readonly Point[], interaction: (spacing: number) => number): (spacing: number) => number {
  const { x, y } = centroidOf(points)
  const reach = 2 * points.reduce((most, p) => Math.max(most, Math.hypot(p.x - x, p.y - y)), 0)
  return tabulate(interaction, smallestSpacing(points, 0, '/layout'), reach)
}

/** Prepares a group under a rigid cap: its piles' answers to sinking and turning, once for all loads. */
export function elasticGroup(points: readonly Point[], answers: PileAnswers): ElasticGroup {
  const n = points.length
  const centroid = centroidOf(points)
  const x = Float64Array.from(points, (p) => p.x - centroid.x)
  const y = Float64Array.from(points, (p) => p.y - centroid.y)
  const about = points.map((_, i) => ({ x: x[i]!, y: y[i]! }))
  const fold = foldOf(about)
  const modes = planeModes(x, y, fold.mirrors.x || fold.mirrors.y)
  const { loads: unit, residual } = answers.modes(about, fold, modes)
  const m = modes.length
  const movement = ({ v, x: alongX, y: alongY }: Mode, i: number) => v + alongX * x[i]! + alongY * y[i]!
  const inverse = invert(
    Float64Array.from({ length: m * m }, (_, k) => {
      const mode = modes[Math.floor(k / m)]!
      return unit[k % m]!.reduce((sum, p, i) => sum + p * movement(mode, i), 0)
    }),
    m,
  )
  // From modes to V, My, Mx: turning along u adds u.x to alongX and u.y to alongY.
  const flexibility = new Float64Array(9)
  for (let a = 0; a < m; a++) {
    for (let b = 0; b < m; b++) {
      const rows = [modes[a]!.v, modes[a]!.x, modes[a]!.y]
      const columns = [modes[b]!.v, modes[b]!.x, modes[b]!.y]
      for (let r = 0; r < 3; r++)
        for (let c = 0; c < 3; c++) flexibility[r * 3 + c]! += rows[r]! * columns[c]! * inverse[a * m + b]!
    }
  }
  const atCentroid = (load: CapLoad) => ({ Mx: load.Mx - load.V * centroid.y, My: load.My - load.V * centroid.x })
  const reach = Math.max(...points.map((p) => Math.hypot(p.x, p.y)))
  const assertTaken = (load: CapLoad, pointer: string) => {
    if (m === 3) return
    const { Mx, My } = atCentroid(load)
    const u = modes[1]
    const left = u ? Math.abs(My * -u.y + Mx * u.x) : Math.hypot(Mx, My)
    // V on a line that passes the origin by rounding only leaves a moment of rounding.
    const size = Math.hypot(load.Mx, load.My) + Math.abs(load.V) * reach
    if (left > 1e-9 * size) refuse('line-cannot-take-moment', pointer, { moment: left, piles: n })
  }
  return {
    points,
    centroid,
    flexibility,
    residual,
    settlements: answers.settlements,
    pileLoads: ({ centre, alongX, alongY }) => {
      const out = new Float64Array(n)
      for (let k = 0; k < m; k++) {
        const { v, x: ux, y: uy } = modes[k]!
        const share = v * centre + ux * alongX + uy * alongY
        for (let i = 0; i < n; i++) out[i]! += share * unit[k]![i]!
      }
      return out
    },
    assertTaken,
    plane: (load, pointer) => {
      assertTaken(load, pointer)
      const { Mx, My } = atCentroid(load)
      const f = (r: number) =>
        flexibility[r * 3]! * load.V + flexibility[r * 3 + 1]! * My + flexibility[r * 3 + 2]! * Mx
      return { centre: f(0), alongX: f(1), alongY: f(2) }
    },
  }
}

/** Inverse of a symmetric positive definite matrix of a few rows. */
function invert(a: Float64Array, n: number): Float64Array {
  const l = Float64Array.from(a)
  if (!factor(l, n)) refuse('not-finite', '/layout', { symbol: 'cap stiffness' })
  const out = new Float64Array(n * n)
  for (let c = 0; c < n; c++) {
    const b = new Float64Array(n)
    b[c] = 1
    solveFactored(l, n, b)
    for (let r = 0; r < n; r++) out[r * n + c] = b[r]!
  }
  return out
}
