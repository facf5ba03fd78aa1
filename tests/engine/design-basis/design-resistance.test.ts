import { expect, test } from 'vitest'
import type { DesignBasis } from '../../../src/engine/design-basis/design-basis.ts'
import {
  applyBasis,
  limitStateFor,
  materialFactors,
  type Part,
} from '../../../src/engine/design-basis/design-resistance.ts'
import { Sheet } from '../../../src/engine/trace/sheet.ts'

/** Shaft 1200, base 600 kN; in uplift 900 kN with a weight of 90. */
function designed(basis: DesignBasis, part: Part['part']) {
  const sheet = Sheet.recording()
  const given = (symbol: string, value: number) =>
    sheet.input({ symbol, name: symbol, unit: 'kN' }, value, `/${symbol}`)
  const pulled = part.endsWith('uplift')
  const resistance = applyBasis(
    sheet,
    basis,
    {
      part,
      shaft: given('R_s', pulled ? 810 : 1200),
      ...(!pulled && { base: given('R_b', 600) }),
      ultimate: given('R', pulled ? 900 : 1800),
      ...(pulled && { weight: given('W', 90) }),
      installation: 'driven',
    },
    '/designBasis',
  )
  const term = (resistance.designResistance ?? resistance.allowableLoad)!
  return { resistance, value: term.value, steps: sheet.steps, last: sheet.steps.find((s) => s.id === term.from)! }
}

test.each<[string, DesignBasis, Part['part'], number]>([
  ['one factor', { format: 'overall-factor', factor: 2.5 }, 'pile-compression', 720],
  [
    'the split governs',
    { format: 'overall-factor', factor: 2, split: { shaft: 1.5, base: 6 } },
    'pile-compression',
    900,
  ],
  [
    'the whole governs',
    { format: 'overall-factor', factor: 2.5, split: { shaft: 1.5, base: 3 } },
    'pile-compression',
    720,
  ],
  [
    'a block takes no split',
    { format: 'overall-factor', factor: 2, split: { shaft: 9, base: 9 } },
    'block-compression',
    900,
  ],
  ['the block its own factor', { format: 'overall-factor', factor: 2, blockFactor: 3 }, 'block-compression', 600],
  ['uplift its own factor', { format: 'overall-factor', factor: 2, upliftFactor: 3 }, 'pile-uplift', 300],
  [
    'custom, parts',
    { format: 'custom', shaft: 0.45, base: 0.4, block: 0.55, uplift: 0.35 },
    'pile-compression',
    0.45 * 1200 + 0.4 * 600,
  ],
  [
    'custom, block',
    { format: 'custom', shaft: 0.45, base: 0.4, block: 0.55, uplift: 0.35 },
    'block-compression',
    0.55 * 1800,
  ],
  ['custom, uplift', { format: 'custom', shaft: 0.45, base: 0.4, block: 0.55, uplift: 0.35 }, 'block-uplift', 315],
])('%s', (_, basis, part, expected) => {
  const { value, resistance, last } = designed(basis, part)
  expect(value).toBeCloseTo(expected, 9)
  expect(last.value).toBe(value)
  expect(resistance.allowableLoad === undefined).toBe(basis.format !== 'overall-factor')
})

test('a factor that was not given is an assumed step with its reason, and points nowhere', () => {
  const { steps } = designed({ format: 'overall-factor', factor: 2 }, 'pile-uplift')
  const factor = steps.find((s) => s.id === 'F')!
  expect(factor).toMatchObject({ value: 2, default: true, reason: expect.stringContaining('upliftFactor') })
  const given = designed({ format: 'overall-factor', factor: 2, upliftFactor: 3 }, 'pile-uplift').steps
  expect(given.find((s) => s.id === 'F')).toMatchObject({ value: 3, from: '/designBasis/upliftFactor' })
})

/** xi3 of table A.10; between its rows the lower count, past its end the last row. */
test.each([
  [1, 1.4],
  [3, 1.33],
  [6, 1.29],
  [9, 1.27],
  [40, 1.25],
])('%i profiles: the larger of xi3 and xi4 governs, both are named', (count, xi3) => {
  const basis = (stiffStructure: boolean): DesignBasis => ({
    format: 'en1997-1-2004',
    approach: 'DA3',
    characteristic: { route: 'profiles', count, stiffStructure },
  })
  const { value, steps } = designed(basis(false), 'pile-compression')
  expect(value).toBeCloseTo(1800 / xi3, 9)
  expect(steps.find((s) => s.id === 'xi')).toMatchObject({ kind: 'choice', rule: 'largest', chosen: 'xi3' })
  expect(designed(basis(true), 'pile-compression').value).toBeCloseTo(1800 / Math.max(1, xi3 / 1.1), 9)
})

test('limit state and ground factors of each format', () => {
  const en = (approach: 'DA1-1' | 'DA1-2' | 'DA2' | 'DA3'): DesignBasis => ({
    format: 'en1997-1-2004',
    approach,
    characteristic: { route: 'model-factor', value: 1.4 },
  })
  expect(limitStateFor({ format: 'overall-factor', factor: 2 })).toBe('working')
  expect(limitStateFor(en('DA2'))).toBe('ultimate')
  expect(limitStateFor({ format: 'custom', shaft: 1, base: 1, block: 1, uplift: 1 })).toBe('ultimate')
  expect((['DA1-1', 'DA1-2', 'DA2'] as const).map((a) => materialFactors(en(a)))).toEqual([
    undefined,
    undefined,
    undefined,
  ])
  expect(materialFactors(en('DA3'))).toEqual({ cu: 1.4, tanPhi: 1.25 })
})
