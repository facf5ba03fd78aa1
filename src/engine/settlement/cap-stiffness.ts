import { factor, solveFactored } from '../numerics/cholesky.ts'
import type { UnitCode } from '../quantities/units.ts'
import { statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { PreparedGroup } from './prepared-group.ts'

const source = statics('flexibility of the rigid cap')
export const settlementPerMoment = formula({
  symbol: 'F_vm',
  name: "settlement at the cap's origin for a unit moment",
  unit: '1/kN',
  text: 'f * a',
  where: { f: 'm/kN', a: '1/m' },
  source,
})
export const slopePerLoad = formula({
  symbol: 'F_mv',
  name: 'slope of the cap for a unit load',
  unit: '1/kN',
  text: 'r * e',
  where: { r: 'rad/(kN.m)', e: 'm' },
  source,
})
export const slopePerMoment = formula({
  symbol: 'F_mm',
  name: 'slope of the cap for a unit moment about the other axis',
  unit: 'rad/(kN.m)',
  text: 'r * c',
  where: { r: 'rad/(kN.m)', c: '1' },
  source,
})

const units = [
  ['kN/m', 'kN/rad', 'kN/rad'],
  ['kN/rad', 'kN.m/rad', 'kN.m/rad'],
  ['kN/rad', 'kN.m/rad', 'kN.m/rad'],
] as const satisfies UnitCode[][]

/**
 * Flexibility and stiffness of a rigid cap at its origin, symmetric 3 x 3: V, My, Mx (kN, kN.m) against settlement (m), slope along x,
 * slope along y (rad). Ready for a structural model. Rows that a single pile or a line of piles cannot take are 0 in both.
 */
function capMatrices(sheet: Sheet, { flexibility, stiffness: k }: PreparedGroup) {
  const { f, a_x, a_y, r_x, e_x, c_x, r_y, e_y, c_y } = flexibility
  const here = sheet.within('matrix')
  const F: Term[][] = [
    [f, here.step(settlementPerMoment, { f, a: a_x }, 'F_01'), here.step(settlementPerMoment, { f, a: a_y }, 'F_02')],
    [here.step(slopePerLoad, { r: r_x, e: e_x }, 'F_10'), r_x, here.step(slopePerMoment, { r: r_x, c: c_x }, 'F_12')],
    [here.step(slopePerLoad, { r: r_y, e: e_y }, 'F_20'), here.step(slopePerMoment, { r: r_y, c: c_y }, 'F_21'), r_y],
  ]
  const { K, residual } = inverse(F.map((row) => row.map((t) => t.value)))
  const stiffness = K.map((row, r) =>
    row.map((value, c) =>
      here.solution(
        {
          symbol: `K_${r}${c}`,
          name: `stiffness of the cap at its origin, row ${r + 1}, column ${c + 1}`,
          unit: units[r]![c]!,
          value,
          method: 'inverse of the flexibility of the cap',
          operands: r === 0 && c === 0 ? F.flat() : [k],
          unknowns: [],
          residuals: [{ name: 'flexibility times stiffness less the identity', value: residual }],
          tolerance: 1e-9,
          source,
        },
        `K_${r}${c}`,
      ),
    ),
  )
  return { flexibility: F, stiffness }
}

/** Inverse on the rows whose diagonal is not 0, scaled to a unit diagonal first: metres and radians differ by their lever. */
function inverse(F: readonly (readonly number[])[]): { K: number[][]; residual: number } {
  const K = [0, 1, 2].map(() => [0, 0, 0])
  const size = F.map((row, i) => Math.sqrt(row[i]!))
  let rows = [0, 1, 2].filter((i) => size[i]! > 0)
  const scaled = () => Float64Array.from(rows.flatMap((r) => rows.map((c) => F[r]![c]! / (size[r]! * size[c]!))))
  let a = scaled()
  // A slanting line of piles turns about one axis only: neither row can be inverted alone.
  if (!factor(Float64Array.from(a), rows.length) || degenerate(a, rows.length)) {
    rows = [0]
    a = scaled()
  }
  const n = rows.length
  const l = Float64Array.from(a)
  factor(l, n)
  let residual = 0
  for (let c = 0; c < n; c++) {
    const x = new Float64Array(n)
    x[c] = 1
    solveFactored(l, n, x)
    for (let r = 0; r < n; r++) {
      K[rows[r]!]![rows[c]!] = x[r]! / (size[rows[r]!]! * size[rows[c]!]!)
      let sum = r === c ? -1 : 0
      for (let i = 0; i < n; i++) sum += a[r * n + i]! * x[i]!
      residual = Math.max(residual, Math.abs(sum))
    }
  }
  return { K, residual }
}

function degenerate(a: Float64Array, n: number): boolean {
  const l = Float64Array.from(a)
  factor(l, n)
  for (let i = 0; i < n; i++) if (l[i * n + i]! ** 2 < 1e-10) return true
  return false
}

/**
 * Stiffness of a rigid cap: about the centroid of the piles, each component acting alone (0: it cannot be taken), and as matrices at the
 * cap's origin.
 */
export function capStiffness(sheet: Sheet, prepared: PreparedGroup) {
  const { flexibility, elastic, stiffness: k } = prepared
  const term = <const U extends 'kN/m' | 'kN.m/rad'>(symbol: string, name: string, unit: U, i: number) => {
    const own = elastic.flexibility[i * 4]!
    const value = own > 0 ? 1 / own : 0
    return sheet.solution({
      symbol,
      name,
      unit,
      value,
      method: 'inverse of the flexibility about the centroid of the piles',
      operands: [flexibility.f, flexibility.r_x, flexibility.r_y, k],
      unknowns: [{ symbol, value, unit }],
      residuals: [{ name: 'stiffness times flexibility, less 1', value: own > 0 ? Math.abs(value * own - 1) : 0 }],
      tolerance: 1e-9,
      source,
    })
  }
  return {
    vertical: term('K_v', 'vertical stiffness of the cap at the centroid of the piles', 'kN/m', 0),
    rockingAlongX: term('K_rx', 'rocking stiffness along x about the centroid', 'kN.m/rad', 1),
    rockingAlongY: term('K_ry', 'rocking stiffness along y about the centroid', 'kN.m/rad', 2),
    atOrigin: capMatrices(sheet, prepared),
  }
}
