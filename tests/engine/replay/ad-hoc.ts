import type { UnitCode } from '../../../src/engine/quantities/units.ts'
import { formula } from '../../../src/engine/trace/formula.ts'
import { Sheet } from '../../../src/engine/trace/sheet.ts'
import type { Step } from '../../../src/engine/trace/step.ts'

/** A small trace with every kind of step, every unit that a formula may meet, and every allowed function. Its numbers mean nothing. */

const source = { key: 'test', locator: '' }
const friction = formula({
  symbol: 'f',
  name: 'friction',
  unit: 'kPa',
  text: 'min((1 - sin(phi)) * tan(phi) * sigma_v, (80 kPa))',
  where: { phi: 'deg', sigma_v: 'kPa' },
  source,
})
const mobilised = formula({
  symbol: 'delta',
  name: 'mobilised angle',
  unit: 'deg',
  text: 'atan(tan(phi) / 1.25) + abs(theta)',
  where: { phi: 'deg', theta: 'rad' },
  source,
})
const area = formula({ symbol: 'A', name: 'area', unit: 'm2', text: 'pi * d^2 / 4', where: { d: 'm' }, source })
const force = formula({
  symbol: 'R',
  name: 'force',
  unit: 'kN',
  text: 'f * A + q * sqrt(A) * d * exp(-d / (2 m))',
  where: { f: 'kPa', A: 'm2', q: 'kPa', d: 'm' },
  source,
})
const settlement = formula({
  symbol: 's',
  name: 'settlement',
  unit: 'mm',
  text: 'R / k * tanh(d / (1 m)) + ceil(n) * (0.5 mm)',
  where: { R: 'kN', k: 'kN/m', d: 'm', n: '1' },
  source,
})
const ratio = formula({
  symbol: 'psi',
  name: 'ratio',
  unit: '1',
  text: 's > (5 mm) ? max(0.2, log10(s / (1 mm))) : log(s / (1 mm)) * cos(phi)',
  where: { s: 'mm', phi: 'deg' },
  source,
})
const rocking = formula({
  symbol: 'theta_M',
  name: 'rotation',
  unit: 'rad',
  text: 'M * a_M + M / k_M',
  where: { M: 'kN.m', a_M: 'rad/(kN.m)', k_M: 'kN.m/rad' },
  source,
})
const weight = formula({
  symbol: 'W',
  name: 'weight',
  unit: 'kN',
  text: 'gamma * (V_c + kappa * I_4) + s / a_s + theta / b_s + theta * k_s',
  where: {
    ...{ gamma: 'kN/m3', V_c: 'm3', s: 'm', a_s: 'm/kN', kappa: '1/m', I_4: 'm4' },
    ...{ theta: 'rad', b_s: '1/kN', k_s: 'kN/rad' },
  },
  source,
})

export const request = {
  phi: 31,
  sigma: { top: 40, bottom: 120 },
  d: '750 mm',
  theta: -0.02,
  'a/b': { '~q': [410, 385.5, 402.25] },
  k: 82_000,
  n: 3,
  M: 210,
}

function weightTerms(sheet: Sheet) {
  const given = <const U extends UnitCode>(symbol: string, unit: U, value: number) =>
    sheet.assumed({ symbol, name: symbol, unit }, value, 'none was given', source)
  return {
    gamma: given('gamma', 'kN/m3', 24),
    V_c: given('V_c', 'm3', 7.5),
    s: given('s', 'm', 0.01),
    a_s: given('a_s', 'm/kN', 2e-4),
    kappa: given('kappa', '1/m', 0.3),
    I_4: given('I_4', 'm4', 0.7),
    theta: given('theta', 'rad', 0.001),
    b_s: given('b_s', '1/kN', 4e-5),
    k_s: given('k_s', 'kN/rad', 30_000),
  }
}

export function adHocSteps(): readonly Step[] {
  const sheet = Sheet.recording()
  const phi = sheet.input({ symbol: 'phi', name: 'angle', unit: 'deg' }, 31, '/phi')
  const sigma_v = sheet.input({ symbol: 'sigma_v', name: 'stress', unit: 'kPa' }, 76, '/sigma')
  const d = sheet.input({ symbol: 'd', name: 'diameter', unit: 'm' }, 0.75, '/d')
  const theta = sheet.input({ symbol: 'theta', name: 'rotation', unit: 'rad' }, -0.02, '/theta')
  const k = sheet.input({ symbol: 'k', name: 'stiffness', unit: 'kN/m' }, 82_000, '/k')
  const n = sheet.input({ symbol: 'n', name: 'count', unit: '1' }, 3, '/n')
  const M = sheet.input({ symbol: 'M', name: 'moment', unit: 'kN.m' }, 210, '/M')
  const qs = request['a/b']['~q'].map((q, i) =>
    sheet.input({ symbol: 'q', name: 'pressure', unit: 'kPa' }, q, `/a~1b/~0q/${i}`, `q/${i}`),
  )
  const assume = <const U extends 'rad/(kN.m)' | 'kN.m/rad'>(symbol: string, unit: U, value: number) =>
    sheet.assumed({ symbol, name: symbol, unit }, value, 'none was given', source)
  const f = sheet.step(friction, { phi, sigma_v })
  const delta = sheet.step(mobilised, { phi, theta })
  const A = sheet.step(area, { d })
  const q = sheet.choice({ symbol: 'q_min', name: 'least pressure', unit: 'kPa' }, 'smallest', qs)
  const Q = sheet.choice({ symbol: 'q_max', name: 'largest pressure', unit: 'kPa' }, 'largest', qs)
  const low = sheet.within('low').step(force, { f, A, q, d })
  const high = sheet.within('high').step(force, { f, A, q: Q, d })
  const R = sheet.sum({ symbol: 'R', name: 'forces', unit: 'kN' }, [low, high])
  const s = sheet.step(settlement, { R, k, d, n })
  sheet.step(ratio, { s, phi })
  sheet.step(rocking, { M, a_M: assume('a_M', 'rad/(kN.m)', 2e-6), k_M: assume('k_M', 'kN.m/rad', 450_000) })
  const table = [
    [20, 4],
    [30, 10],
    [40, 55],
  ] as const
  sheet.lookup({ symbol: 'N', name: 'factor', unit: '1' }, table, delta, source)
  sheet.lookup({ symbol: 'N_p', name: 'factor', unit: '1' }, table, phi, source)
  sheet.solution({
    symbol: 'x',
    name: 'root',
    unit: 'm',
    value: 1.5,
    method: 'bisection',
    operands: [R, d],
    unknowns: [{ symbol: 'x', value: 1.5, unit: 'm' }],
    residuals: [{ name: 'balance', value: 1e-11 }],
    tolerance: 1e-9,
    source,
  })
  sheet.step(weight, weightTerms(sheet.within('weight')))
  return sheet.steps
}
