import { effectiveStress } from '../../src/engine/ground/stress.ts'
import { rp2geoAlpha } from '../../src/engine/methods/cohesive-shaft/rp2geo-2011.ts'
import type { UnitCode } from '../../src/engine/quantities/units.ts'
import { Sheet } from '../../src/engine/trace/sheet.ts'
import type { Term } from '../../src/engine/trace/term.ts'
import { type Finding, interleaved, median, ratio, time } from './measure.ts'

const COUNT = 1024
const terms = <const U extends UnitCode>(unit: U, symbol: string, value: (i: number) => number): Term<U>[] =>
  Array.from({ length: COUNT }, (_, i) => ({ value: value(i), unit, symbol, from: '' }))

/** (d) One formula on a silent sheet against the same arithmetic written by hand, on the same terms. */
export function formulaStep(): Finding[] {
  const psi = terms('1', 'psi', (i) => 0.1 + i / 400)
  const sigma_0 = terms('kPa', 'sigma_v', (i) => 10 + i / 16)
  const gamma_e = terms('kN/m3', 'gamma_e', (i) => 8 + (i % 10))
  const z = terms('m', 'z', (i) => 4 + i / 100)
  const z_0 = terms('m', 'z_0', (i) => 3 + (i % 5) / 10)
  const sheet = Sheet.silent
  // The sum keeps every value in use; it costs both sides the same.
  const over = (one: (i: number) => number) => ({
    calls: 200,
    run: () => {
      let sum = 0
      for (let i = 0; i < COUNT; i++) sum += one(i)
      return sum
    },
  })
  const alpha = (x: number) => (x <= 1 ? Math.min(1, 0.5 * x ** -0.5) : Math.min(1, 0.5 * x ** -0.25))
  const us = interleaved(
    {
      alphaByHand: over((i) => alpha(psi[i]!.value)),
      alphaStep: over((i) => sheet.step(rp2geoAlpha, { psi: psi[i]! }).value),
      stressByHand: over((i) => sigma_0[i]!.value + gamma_e[i]!.value * (z[i]!.value - z_0[i]!.value)),
      stressStep: over(
        (i) =>
          sheet.step(effectiveStress, { sigma_0: sigma_0[i]!, gamma_e: gamma_e[i]!, z: z[i]!, z_0: z_0[i]! }).value,
      ),
    },
    25,
    10,
  )
  const judged = (what: string, step: readonly number[], hand: readonly number[], aim: boolean): Finding => {
    const value = ratio(step, hand)
    const each = (all: readonly number[]) => time(median(all) / COUNT)
    return {
      part: 'd',
      what,
      value: `${value.toFixed(2)} (${each(step)} : ${each(hand)})`,
      ...(aim && { aim: '<= 2', holds: value <= 2 }),
    }
  }
  return [
    judged('silent step : by hand, adhesion factor (two powers)', us.alphaStep, us.alphaByHand, true),
    // Three operations of a nanosecond in all: what remains is the unit check of four operands.
    judged('silent step : by hand, stress (three operations)', us.stressStep, us.stressByHand, true),
  ]
}
