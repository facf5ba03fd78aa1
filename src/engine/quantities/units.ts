/** Units as UCUM codes, their dimension, and the factor to the coherent set m, kN, rad. */

/** Exponents of length and force. Angles are ratios, so they carry no exponent. */
export type Dimension = { readonly length: number; readonly force: number }

export type Unit = { readonly dimension: Dimension; readonly factor: number }

const unit = (length: number, force: number, factor = 1): Unit => ({ dimension: { length, force }, factor })

/** The units that the engine itself computes and answers in. */
export const units = {
  '1': unit(0, 0),
  m: unit(1, 0),
  m2: unit(2, 0),
  m3: unit(3, 0),
  m4: unit(4, 0),
  mm: unit(1, 0, 1e-3),
  '1/m': unit(-1, 0),
  kN: unit(0, 1),
  kPa: unit(-2, 1),
  'kN/m': unit(-1, 1),
  'kN/m3': unit(-3, 1),
  'kN.m': unit(1, 1),
  'kN.m/rad': unit(1, 1),
  'rad/(kN.m)': unit(-1, -1),
  'm/kN': unit(1, -1),
  '1/kN': unit(0, -1),
  'kN/rad': unit(0, 1),
  deg: unit(0, 0, Math.PI / 180),
  rad: unit(0, 0),
} as const satisfies Record<string, Unit>

export type UnitCode = keyof typeof units

/** Units as an exporter may write them, next to the engine's own. Factors are exact definitions of the foot, pound-force and kilogram-force. */
const FOOT = 0.3048
const INCH = 0.0254
const LBF = 4.4482216152605e-3
const KGF = 9.80665e-3
export const writtenUnits: Readonly<Record<string, Unit>> = {
  ...units,
  cm: unit(1, 0, 1e-2),
  ft: unit(1, 0, FOOT),
  in: unit(1, 0, INCH),
  N: unit(0, 1, 1e-3),
  MN: unit(0, 1, 1e3),
  lbf: unit(0, 1, LBF),
  kip: unit(0, 1, LBF * 1e3),
  Pa: unit(-2, 1, 1e-3),
  MPa: unit(-2, 1, 1e3),
  GPa: unit(-2, 1, 1e6),
  psf: unit(-2, 1, LBF / FOOT ** 2),
  ksf: unit(-2, 1, (LBF * 1e3) / FOOT ** 2),
  tsf: unit(-2, 1, (LBF * 2e3) / FOOT ** 2),
  psi: unit(-2, 1, LBF / INCH ** 2),
  ksi: unit(-2, 1, (LBF * 1e3) / INCH ** 2),
  'kgf/cm2': unit(-2, 1, KGF / 1e-4),
  'kN/m^3': unit(-3, 1),
  'kN/m³': unit(-3, 1),
  pcf: unit(-3, 1, LBF / FOOT ** 3),
  kN·m: unit(1, 1),
  'kip.ft': unit(1, 1, LBF * 1e3 * FOOT),
  kip·ft: unit(1, 1, LBF * 1e3 * FOOT),
  mm2: unit(2, 0, 1e-6),
  cm2: unit(2, 0, 1e-4),
  in2: unit(2, 0, INCH ** 2),
  ft2: unit(2, 0, FOOT ** 2),
  '°': unit(0, 0, Math.PI / 180),
  '%': unit(0, 0, 1e-2),
}

export const sameDimension = (a: Unit, b: Unit): boolean =>
  a.dimension.length === b.dimension.length && a.dimension.force === b.dimension.force
