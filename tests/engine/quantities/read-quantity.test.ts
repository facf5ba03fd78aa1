import { expect, test } from 'vitest'
import { readQuantity } from '../../../src/engine/quantities/read-quantity.ts'
import type { UnitCode } from '../../../src/engine/quantities/units.ts'

/** Exact definitions: international foot and inch, standard gravity, avoirdupois pound (NIST SP 811, appendix B). */
test.each<[string, UnitCode, number]>([
  ['600 mm', 'm', 0.6],
  ['60cm', 'm', 0.6],
  ['12 ft', 'm', 3.6576],
  ['10 in', 'm', 0.254],
  ['25 mm', 'mm', 25],
  ['1 in', 'mm', 25.4],
  ['20 MPa', 'kPa', 20000],
  ['30 GPa', 'kPa', 30e6],
  ['3 ksf', 'kPa', 143.640776],
  ['1 tsf', 'kPa', 95.760518],
  ['1 psi', 'kPa', 6.89475729],
  ['1 ksi', 'kPa', 6894.75729],
  ['1000 psf', 'kPa', 47.880259],
  ['1 kgf/cm2', 'kPa', 98.0665],
  ['120 pcf', 'kN/m3', 18.8504957],
  ['1 kip', 'kN', 4.44822162],
  ['1 MN', 'kN', 1000],
  ['500 N', 'kN', 0.5],
  ['1 kip.ft', 'kN.m', 1.35581795],
  ['0.5 rad', 'deg', 28.64788976],
  ['36', 'deg', 36],
  ['-1.5e2 kN', 'kN', -150],
])('%s in %s is %f', (text, unit, value) => {
  const read = readQuantity(text, unit)
  expect(read.ok).toBe(true)
  // Nine printed digits.
  if (read.ok) expect(Math.abs(read.value / value - 1)).toBeLessThan(1e-8)
})

test.each<[string | number, UnitCode, string]>([
  ['600 kPa', 'm', 'wrong-dimension'],
  ['3 furlong', 'm', 'unknown-unit'],
  ['about 3', 'm', 'not-a-number'],
  ['1e999 m', 'm', 'not-a-number'],
  ['1e999', 'm', 'not-a-number'],
  [Number.NaN, 'm', 'not-a-number'],
  ['20 deg', '1', 'wrong-dimension'],
  ['5 constructor', 'm', 'unknown-unit'],
])('%s as %s is refused: %s', (text, unit, code) => {
  const read = readQuantity(text, unit)
  expect(read.ok ? undefined : read.code).toBe(code)
})
