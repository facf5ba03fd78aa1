import { expect, test } from 'vitest'
import { applyBasis } from '../../src/engine/design-basis/design-resistance.ts'
import { correlationFactors, groundFactors, resistanceFactors } from '../../src/engine/design-basis/en-1997-1-2004.ts'
import { linearNc, nhiNc, skemptonNc } from '../../src/engine/methods/cohesive-base/bearing.ts'
import { kolkAlpha } from '../../src/engine/methods/cohesive-shaft/kolk-van-der-velde-1996.ts'
import { oneillReeseAlpha } from '../../src/engine/methods/cohesive-shaft/oneill-reese-1999.ts'
import { rp2aAlpha } from '../../src/engine/methods/cohesive-shaft/rp2a-1984.ts'
import { rp2geoAlpha } from '../../src/engine/methods/cohesive-shaft/rp2geo-2011.ts'
import { navfacBearing } from '../../src/engine/methods/granular-base/navfac-1986.ts'
import { blowCountBase } from '../../src/engine/methods/granular-base/oneill-reese-1999.ts'
import { oneillReeseBeta } from '../../src/engine/methods/granular-shaft/oneill-reese-1999.ts'
import { rp2geoClasses } from '../../src/engine/methods/rp2geo-classes.ts'
import { Sheet } from '../../src/engine/trace/sheet.ts'
import type { Term } from '../../src/engine/trace/term.ts'
import { evaluated } from '../engine/trace/evaluated.ts'

const kN = (value: number): Term<'kN'> => ({ value, unit: 'kN', symbol: 'R', from: '' })

/** Skempton (1951), rectangle rule [memory]. */
test.each([
  [0, 0, 5],
  [0, 1, 6],
  [1, 1, 7.2],
  [2, 1, 8.4],
  [2.5, 1, 9],
  [4, 1, 9],
  [4, 0, 7.5],
  [1, 0.5, 6.6],
  [2, 0.75, 8.05],
])('Skempton: D/B = %f, B/L = %f gives N_c = %f', (D, shape, expected) =>
  expect(evaluated(skemptonNc, { D: D, B: 1, L_g: shape === 0 ? 1e12 : 1 / shape })).toBeCloseTo(expected, 8),
)

test('9 from D/B = 4, 5.6 + 0.85 D/B above [common practice]; NHI 2006 capped at 9', () => {
  expect([0, 2, 4, 10].map((D) => evaluated(linearNc, { D: D, B: 1 }))).toEqual([5.6, 7.3, 9, 9])
  expect(evaluated(nhiNc, { D: 15, B: 3, L_g: 4 })).toBe(9)
})

/** AASHTO LRFD 10.7.3.9 [memory]: Q = (2X + 2Y) Z s_u + X Y N_c s_u. */
test.each([
  [3, 4, 15, 60, 80, 8.625, 20880],
  [6, 6, 9, 40, 70, 7.8, 28296],
])('block %f x %f x %f', (X, Y, Z, side, base, Nc, Q) => {
  const factor = evaluated(skemptonNc, { D: Z, B: X, L_g: Y })
  expect(factor).toBeCloseTo(Nc, 8)
  expect((2 * X + 2 * Y) * Z * side + X * Y * factor * base).toBeCloseTo(Q, 6)
})

test("adhesion factors: RP 2GEO (2011), RP 2A (1980s), O'Neill & Reese (1999), Kolk & van der Velde (1996)", () => {
  expect([0.25, 1, 4].map((psi) => evaluated(rp2geoAlpha, { psi: psi }))).toEqual([1, 0.5, 0.5 * 4 ** -0.25])
  expect([10, 24, 48, 72, 100].map((c_u) => evaluated(rp2aAlpha, { c_u: c_u }))).toEqual([1, 1, 0.75, 0.5, 0.5])
  expect([100, 150, 250].map((c_u) => Number(evaluated(oneillReeseAlpha, { c_u: c_u }).toFixed(9)))).toEqual([
    0.55, 0.55, 0.45,
  ])
  // The local form, one diameter above the toe: 0.9 psi^-0.3.
  expect(evaluated(kolkAlpha, { D: 10, z: 9, d: 1, psi: 1 })).toBeCloseTo(0.9, 12)
})

/** RP 2GEO table 1 [memory]. */
test('RP 2GEO density classes', () => {
  expect(rp2geoClasses.map((c) => [c.beta, c.shaftLimit, c.bearing, c.baseLimit])).toEqual([
    [0.29, 67, 12, 3000],
    [0.37, 81, 20, 5000],
    [0.46, 96, 40, 10000],
    [0.56, 115, 50, 12000],
  ])
})

/** NAVFAC DM 7.02 p. 7.2-193 [memory]. */
test('NAVFAC bearing factors', () => {
  expect(navfacBearing.driven.map((r) => r[1])).toEqual([10, 15, 21, 24, 29, 35, 42, 50, 62, 77, 86, 120, 145])
  expect(navfacBearing.bored.map((r) => r[1])).toEqual([5, 8, 10, 12, 14, 17, 21, 25, 30, 38, 43, 60, 72])
  const phi: Term<'deg'> = { value: 34.5, unit: 'deg', symbol: 'phi', from: '' }
  expect(
    Sheet.silent.lookup({ symbol: 'N_q', name: '', unit: '1' }, navfacBearing.driven, phi, { key: '', locator: '' })
      .value,
  ).toBe(46)
})

/** O'Neill & Reese (1999) [memory]. */
test('drilled shafts in sand', () => {
  expect([0.5, 1.5, 4, 16, 40].map((z) => Number(evaluated(oneillReeseBeta, { z: z }).toFixed(4)))).toEqual([
    1.2, 1.1999, 1.01, 0.52, 0.25,
  ])
  expect([10, 30, 50, 60].map((N_60) => evaluated(blowCountBase, { N_60: N_60 }))).toEqual([575, 1725, 2875, 2900])
})

/** EN 1997-1:2004 Annex A, tables A.4, A.6 to A.8, A.10 [read in print]. */
test('EN 1997-1 factor sets', () => {
  const row = (set: keyof typeof resistanceFactors, kind: 'driven' | 'bored' | 'continuous-flight-auger') =>
    Object.values(resistanceFactors[set][kind])
  expect(row('R1', 'bored')).toEqual([1.25, 1, 1.15, 1.25])
  expect(row('R1', 'continuous-flight-auger')).toEqual([1.1, 1, 1.1, 1.25])
  expect(row('R4', 'driven')).toEqual([1.3, 1.3, 1.3, 1.6])
  expect(row('R4', 'bored')).toEqual([1.6, 1.3, 1.5, 1.6])
  expect(row('R2', 'driven')).toEqual([1.1, 1.1, 1.1, 1.15])
  expect(groundFactors).toEqual({ cu: 1.4, tanPhi: 1.25 })
  expect(correlationFactors.slice(0, 5)).toEqual([
    [1, 1.4, 1.4],
    [2, 1.35, 1.27],
    [3, 1.33, 1.23],
    [4, 1.31, 1.2],
    [5, 1.29, 1.15],
  ])
})

/** A pile of base 946 kN and shaft 1572 kN (Tomlinson & Woodward 2008, example 4.3, resistances as printed), characteristic by a model factor of 1. */
test('bored pile under DA1-1 and DA1-2', () => {
  const design = (approach: 'DA1-1' | 'DA1-2') =>
    applyBasis(
      Sheet.silent,
      { format: 'en1997-1-2004', approach, characteristic: { route: 'model-factor', value: 1 } },
      { part: 'pile-compression', shaft: kN(1572), base: kN(946), ultimate: kN(2518), installation: 'bored' },
      '',
    ).designResistance!.value
  expect(design('DA1-1')).toBeCloseTo(946 / 1.25 + 1572, 9)
  expect(design('DA1-2')).toBeCloseTo(946 / 1.6 + 1572 / 1.3, 9)
})
