import { expect, test } from 'vitest'
import { capActions, capTerms } from '../../../src/engine/assessment/cap-loads.ts'
import type { Loads, ModelRow, PressingRow } from '../../../src/engine/assessment/schedule.ts'
import { Sheet } from '../../../src/engine/trace/sheet.ts'

type Vector = readonly [number, number, number]
const cross = ([a, b, c]: Vector, [d, e, f]: Vector): Vector => [b * f - c * e, c * d - a * f, a * e - b * d]

/** A weight of 100 kN that stands at (x, y) of a cap, as a right-handed model exports it: the moment is r x F. */
function weightAt(x: number, y: number, down: 1 | -1, loadsAre: Loads['loadsAre']): ModelRow {
  const force: Vector = [0, 0, down * 100]
  const moment = cross([x, y, 0], force)
  const s = loadsAre === 'reactions' ? -1 : 1
  return {
    cap: 'C1',
    combination: 'W1',
    Fx: 0,
    Fy: 0,
    Fz: s * force[2],
    Mx: s * moment[0],
    My: s * moment[1],
    Mz: s * moment[2],
  }
}

const conventions = (['right-handed-z-up', 'right-handed-z-down'] as const).flatMap((signs) =>
  (['actions', 'reactions'] as const).map((loadsAre) => [signs, loadsAre] as const),
)
const loads = (signs: Loads['signs'], loadsAre: Loads['loadsAre']): Loads => ({
  signs,
  loadsAre,
  combinations: {},
  rows: [],
})

test.each(conventions)('%s, %s: a weight presses the piles at its own side', (signs, loadsAre) => {
  const down = signs === 'right-handed-z-up' ? -1 : 1
  for (const [x, y] of [
    [2, 0],
    [0, 3],
    [-2, 3],
  ] as const) {
    // Pressing signs: V 100, Mx = V y, My = V x.
    const { V, Mx, My } = capActions(loads(signs, loadsAre), weightAt(x, y, down, loadsAre), 0)
    expect([V, Mx + 0, My + 0]).toEqual([100, 100 * y, 100 * x])
  }
})

const pressing: PressingRow = { cap: 'C1', combination: 'W1', V: 100, Mx: 20, My: 30 }

test('pressing signs: actions stay, reactions change sign; the weight of the cap is never turned', () => {
  expect(capActions(loads('pressing', 'actions'), pressing, 7)).toEqual({ V: 107, Mx: 20, My: 30 })
  expect(capActions(loads('pressing', 'reactions'), pressing, 7)).toEqual({ V: -93, Mx: -20, My: -30 })
})

test.each([...conventions, ['pressing', 'actions'] as const, ['pressing', 'reactions'] as const])(
  'the traced loads are the computed ones: %s, %s',
  (signs, loadsAre) => {
    const row = signs === 'pressing' ? pressing : weightAt(-2, 3, -1, loadsAre)
    const sheet = Sheet.recording()
    const weight = sheet.input({ symbol: 'W_c', name: 'weight', unit: 'kN' }, 7, '/caps/0/capWeight')
    const terms = capTerms(sheet, loads(signs, loadsAre), 4, row, weight)
    const { V, Mx, My } = capActions(loads(signs, loadsAre), row, 7)
    expect([terms.V.value, terms.Mx.value, terms.My.value]).toEqual([V, Mx, My])
    const pointers = sheet.steps.flatMap((s) => (s.kind === 'input' && s.from ? [s.from] : []))
    const vertical = signs === 'pressing' ? 'V' : 'Fz'
    expect(pointers).toEqual(['/caps/0/capWeight', ...[vertical, 'Mx', 'My'].map((field) => `/loads/rows/4/${field}`)])
  },
)
