import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { calculateGroup } from '../../../src/engine/index.ts'
import type { GroupRequest } from '../../../src/engine/requests.ts'
import { declaredFormulas } from '../../../src/engine/trace/formula.ts'
import { formulaMathml, stepMathml } from '../../../src/engine/trace/mathml.ts'
import type { Step } from '../../../src/engine/trace/step.ts'
import { adHocSteps } from '../replay/ad-hoc.ts'

/** The line as it reads: a fraction as (a)/(b), a power as ^(n), an index as _(i). */
function reads(mathml: string): string {
  let text = mathml
  const two: Record<string, string> = { mfrac: '/', msup: '^', msub: '_' }
  const atom = /<(mi|mn|mo|mtext)(?: [^>]*)?>([^<]*)<\/\1>/g
  text = text
    .replace(/<mspace[^>]*><\/mspace>/g, ' ')
    .replace(atom, (_, tag, inner) => `⟦${tag === 'mtext' ? inner : inner.trim()}⟧`)
  for (let before = ''; before !== text; ) {
    before = text
    text = text.replace(
      /<(mrow|mpadded|mstyle)(?: [^>]*)?>([^<]*)<\/\1>/g,
      (_, __, inner) => `⟦${inner.replace(/[⟦⟧]/g, '')}⟧`,
    )
    text = text.replace(/<(mfrac|msup|msub)>⟦([^⟦⟧<]*)⟧\s*⟦([^⟦⟧<]*)⟧<\/\1>/g, (_, tag, a, b) =>
      tag === 'mfrac' ? `⟦(${a})/(${b})⟧` : `⟦${a}${two[tag]}(${b})⟧`,
    )
    text = text.replace(/<msqrt>([^<]*)<\/msqrt>/g, (_, inner) => `⟦√(${inner.replace(/[⟦⟧]/g, '')})⟧`)
  }
  return text.replace(/<\/?math[^>]*>|[⟦⟧\u2061\s]/g, '')
}

test.each([
  ['f', 'alpha * c_u', 'f=α⋅c_(u)'],
  ['q_b', 'c_u / (100 kPa)', 'q_(b)=(c_(u))/(100kPa)'],
  ['sigma_v', 'gamma * (z - z_0)', 'σ_(v)=γ⋅(z−z_(0))'],
  ['delta', 'atan(tan(phi) / gamma_phi)', 'δ=tan^(−1)((tan(φ))/(γ_(φ)))'],
  ['alpha', 'min(1, 0.5 * psi^(-0.5))', 'α=min(1,0.5⋅ψ^(−0.5))'],
  ['x_i', 'sqrt(OCR) + 1e-9', 'x_(i)=√(OCR)+10^(−9)'],
  ['A', '(a - b)^2 * c', 'A=(a−b)^(2)⋅c'],
  ['A', '(a)^2', 'A=a^(2)'],
])('%s = %s', (symbol, text, line) => {
  expect(reads(formulaMathml({ symbol, text }))).toBe(line)
})

const base = { id: 'y', symbol: 'R_s', name: '', quantity: '', source: { key: 'k', locator: '' } }
const operand = (symbol: string, value: number, unit: string) => ({ symbol, value, unit, from: symbol })
test.each<[string, object, string]>([
  [
    'a formula',
    {
      kind: 'formula',
      formula: 'U * f',
      value: 10.123456,
      unit: 'kN/m',
      operands: [operand('U', 1.2, 'm'), operand('f', 8.4362133, 'kPa')],
    },
    'R_(s)=1.2m⋅8.4362kPa=10.123kN/m',
  ],
  [
    'a quantity, a negative number or a power of ten under an exponent',
    {
      kind: 'formula',
      formula: 'd^2 * n^2 * e^2',
      value: 5e7,
      unit: 'm2',
      operands: [operand('d', 3, 'm'), operand('n', -2, '1'), operand('e', 1e6, '1')],
    },
    'R_(s)=(3m)^(2)⋅(−2)^(2)⋅(10^(6))^(2)=5×10^(7)m^(2)',
  ],
  [
    'a negative number in brackets that the text has',
    {
      kind: 'formula',
      formula: '(n)^2 - (k)',
      value: 8,
      unit: '1',
      operands: [operand('n', -2, '1'), operand('k', -4, '1')],
    },
    'R_(s)=(−2)^(2)−(−4)=8',
  ],
  [
    'a sum',
    {
      kind: 'sum',
      value: -1,
      unit: 'kN',
      operands: [operand('a', -3, 'kN'), operand('b', 4, 'kN'), operand('c', -2, 'kN')],
    },
    'R_(s)=−3kN+4kN+(−2kN)=−1kN',
  ],
  [
    'a choice',
    {
      kind: 'choice',
      rule: 'largest',
      chosen: 'b',
      value: 4,
      unit: 'mm',
      operands: [operand('a', 3, 'mm'), operand('b', 4, 'mm')],
    },
    'R_(s)=max(3mm,4mm)=4mm',
  ],
  [
    'a lookup',
    {
      kind: 'lookup',
      rows: [
        [20, 4],
        [30, 10],
      ],
      value: 7,
      unit: '1',
      operands: [operand('x', 25, 'deg')],
    },
    'R_(s)=4+(10−4)/(30−20)⋅(25−20)=7',
  ],
  ['an input', { kind: 'input', from: '/a', value: 30, unit: 'deg' }, 'R_(s)=30^(∘)'],
  [
    'a formula without arithmetic',
    { kind: 'formula', formula: 'c', value: 44, unit: 'kPa', operands: [operand('c', 44, 'kPa')] },
    'R_(s)=44kPa',
  ],
])('the line of %s', (_, step, line) => {
  expect(reads(stepMathml({ ...base, ...step } as Step))).toBe(line)
})

test('what stands in a symbol is text, never markup', () => {
  for (const symbol of ['<script>', 'a}b', '\\href{javascript:1}{x}', '"&\'', '$~^#%_', '']) {
    const mathml = formulaMathml({ symbol, text: '1 + 1' })
    expect(mathml).not.toMatch(/<(?!\/?(math|mrow|mi|mn|mo|mtext|mspace|mpadded)\b)/)
    expect(mathml).not.toMatch(/href=/)
  }
})

test('every declared formula and every step is set, without an error mark', () => {
  const { cases } = JSON.parse(readFileSync(new URL('../../published/capacity.json', import.meta.url), 'utf8')) as {
    cases: { request: GroupRequest }[]
  }
  const steps = [...adHocSteps(), ...cases.flatMap((c) => calculateGroup(c.request, { trace: true }).trace!.steps)]
  expect(declaredFormulas().length).toBeGreaterThan(100)
  expect(steps.length).toBeGreaterThan(3000)
  for (const mathml of [...declaredFormulas().map(formulaMathml), ...steps.map(stepMathml)]) {
    expect(mathml).toMatch(/^<math .*<\/math>$/s)
    expect(mathml).not.toMatch(/b22222|merror|undefined|NaN/)
  }
})
