/** Poisson's ratio at which the layers are taken for incompressible ground: at 0.5 itself a thin slice is infinitely stiff. */
export const INCOMPRESSIBLE = 0.4999995

/** 16 pi G (1 - nu), with G = E / 2(1 + nu): what divides every displacement below; kPa. */
export const divisor = (E: number, nu: number): number => (8 * Math.PI * E * (1 - nu)) / (1 + nu)

/**
 * Mindlin (1936): vertical displacement times 16 pi G (1 - nu) at depth z and distance r from a unit vertical load at depth c
 * in a homogeneous half-space; 1/m.
 */
export function mindlin(z: number, c: number, r: number, nu: number): number {
  const q = 3 - 4 * nu
  const u = z - c
  const v = z + c
  const r1 = Math.sqrt(r * r + u * u)
  const r2 = Math.sqrt(r * r + v * v)
  const image = (8 * (1 - nu) ** 2 - q) / r2 + (q * v * v - 2 * c * z) / r2 ** 3 + (6 * c * z * v * v) / r2 ** 5
  return q / r1 + (u * u) / r1 ** 3 + image
}

/**
 * Antiderivative of `mindlin` over the load's depth c, so that the displacement of a line of load is a difference of two values.
 * The two logarithms are taken without the 1/r that the difference cancels; r > 0.
 */
export function mindlinLine(z: number, c: number, r: number, nu: number): number {
  const q = 3 - 4 * nu
  const u = c - z
  const v = c + z
  const rr = r * r
  const r1 = Math.sqrt(rr + u * u)
  const r2 = Math.sqrt(rr + v * v)
  const near = u >= 0 ? Math.log(r1 + u) : Math.log(rr / (r1 - u))
  return (
    4 * (1 - nu) * near -
    u / r1 +
    8 * (1 - nu) ** 2 * Math.log(r2 + v) -
    (q * v + 4 * z) / r2 +
    (2 * z * (rr + z * v)) / (r2 * r2 * r2)
  )
}

/** The part of `mindlin` that the free surface adds, on the axis above the load: z = c, r = 0. */
export const surfaceShare = (c: number, nu: number): number => (8 * (1 - nu) ** 2 + 1) / (2 * c)

type Material = { readonly E: number; readonly nu: number }

/** Vertical flexibility times k of the plane between two full half-spaces for short waves: 1 / 2 pi of the inverse of both stiffnesses. */
export function bimaterial(above: Material, below: Material): number {
  const block = ({ E, nu }: Material, side: 1 | -1) => {
    const f = E / (1 + nu) / (3 - 4 * nu)
    return { own: f * 2 * (1 - nu), cross: side * f * (1 - 2 * nu) }
  }
  const [a, b] = [block(above, -1), block(below, 1)]
  const own = a.own + b.own
  const cross = a.cross + b.cross
  return own / (own * own - cross * cross) / (2 * Math.PI)
}
