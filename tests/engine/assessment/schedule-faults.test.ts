import { expect, test } from 'vitest'
import type { Cap, LimitState, PressingRow, Schedule } from '../../../src/engine/assessment/schedule.ts'
import { refuseFaults } from '../../../src/engine/assessment/schedule-faults.ts'
import type { DesignBasis } from '../../../src/engine/design-basis/design-basis.ts'
import { EngineFault, type Fault } from '../../../src/engine/faults.ts'

const cap = (mark: string, x: number): Cap => ({
  mark,
  x,
  y: 0,
  ground: 'BH1',
  pileType: 'P1',
  layout: { kind: 'grid', columns: 2, rows: 2, spacing: 2 },
})
const row = (mark: string, combination: string): PressingRow => ({ cap: mark, combination, V: 900, Mx: 0, My: 0 })
const states = (...all: LimitState[]) =>
  Object.fromEntries(all.map((limitState, i) => [`K${i + 1}`, { limitState }] as const))
const overall: DesignBasis = { format: 'overall-factor', factor: 2.5 }
const partial: DesignBasis = {
  format: 'en1997-1-2004',
  approach: 'DA2',
  characteristic: { route: 'model-factor', value: 1.4 },
}

/** Caps C1 and C2, each with a row for every combination. */
function schedule(designBasis: DesignBasis, ...all: LimitState[]): Schedule {
  const combinations = states(...all)
  const caps = [cap('C1', 0), cap('C2', 8)]
  return {
    title: 'Two caps',
    designBasis,
    ground: { BH1: { layers: [{ name: 'clay', unitWeight: 19, soil: 'cohesive', undrainedShearStrength: 60 }] } },
    pileTypes: { P1: { section: { shape: 'square', width: 0.35 }, length: 12, installation: 'driven' } },
    caps,
    loads: {
      signs: 'pressing',
      loadsAre: 'actions',
      combinations,
      rows: caps.flatMap(({ mark }) => Object.keys(combinations).map((name) => row(mark, name))),
    },
    limits: { settlement: 25 },
  }
}
function faults(s: Schedule): readonly Fault[] {
  try {
    refuseFaults(s)
  } catch (fault) {
    if (fault instanceof EngineFault) return fault.faults
    throw fault
  }
  return []
}
const told = (s: Schedule) => faults(s).map((f) => `${f.code} ${f.pointer}`)

test.each<[DesignBasis['format'], DesignBasis, LimitState[], string[]]>([
  ['overall-factor', overall, ['working'], []],
  ['overall-factor', overall, ['working', 'serviceability'], []],
  ['overall-factor', overall, ['working', 'ultimate'], []],
  ['overall-factor', overall, ['ultimate'], ['limit-state-mismatch /loads/combinations']],
  ['overall-factor', overall, ['ultimate', 'serviceability'], ['limit-state-mismatch /loads/combinations']],
  ['en1997-1-2004', partial, ['ultimate', 'serviceability'], []],
  ['en1997-1-2004', partial, ['ultimate', 'working'], []],
  ['en1997-1-2004', partial, ['working'], ['limit-state-mismatch /loads/combinations']],
  ['en1997-1-2004', partial, ['ultimate'], ['limit-state-mismatch /limits']],
])('%s with %3$j', (_, basis, all, expected) => {
  expect(told(schedule(basis, ...all))).toEqual(expected)
})

test('a mismatch says what was needed and what was found', () => {
  const [fault] = faults(schedule(overall, 'ultimate', 'serviceability'))
  expect(fault!.facts).toMatchObject({ needed: 'working', found: ['ultimate', 'serviceability'] })
  expect(fault!.facts.reason).toContain('the schedule has ultimate, serviceability')
})

test('without limits nothing is asked of serviceability', () => {
  const { limits: _, ...bare } = schedule(partial, 'ultimate')
  expect(told(bare)).toEqual([])
  expect(told({ ...bare, limits: {} })).toEqual([])
})

test('a cap that no combination of a limit state loads is named with the combinations that would', () => {
  const full = schedule(partial, 'ultimate', 'serviceability')
  const without = (combination: string): Schedule => ({
    ...full,
    loads: {
      ...full.loads,
      rows: (full.loads.rows as PressingRow[]).filter((r) => !(r.cap === 'C2' && r.combination === combination)),
    } as Schedule['loads'],
  })
  for (const combination of ['K1', 'K2'])
    expect(faults(without(combination))).toEqual([
      { code: 'missing-load', pointer: '/caps/1', facts: { cap: 'C2', combination } },
    ])
})

test('two rows for one cap and combination: the second is refused, also where the names run together', () => {
  const full = schedule(overall, 'working')
  const rows = [...(full.loads.rows as PressingRow[]), row('C2', 'K1')]
  expect(faults({ ...full, loads: { ...full.loads, rows } as Schedule['loads'] })).toEqual([
    { code: 'duplicate-row', pointer: '/loads/rows/2', facts: { cap: 'C2', combination: 'K1', first: 2 } },
  ])
  const combinations = { '1K': { limitState: 'working' }, K: { limitState: 'working' } } as const
  const close = {
    ...full,
    caps: [cap('C', 0), cap('C1', 8)],
    loads: {
      ...full.loads,
      combinations,
      rows: [row('C', '1K'), row('C1', 'K')],
    },
  } as Schedule
  expect(told(close)).toEqual([])
})

test('every fault at once, each with the known names', () => {
  const full = schedule(overall, 'working')
  const bent: Schedule = {
    ...full,
    caps: [...full.caps, { ...cap('C1', 16), ground: 'BH9' }, { ...cap('C4', 24), pileType: 'toString' }],
    loads: {
      ...full.loads,
      rows: [...(full.loads.rows as PressingRow[]), row('C4', 'K1'), row('C7', 'K9')],
    } as Schedule['loads'],
  }
  const all = faults(bent)
  expect(all.map((f) => `${f.code} ${f.pointer}`)).toEqual([
    'duplicate-mark /caps/2/mark',
    'unknown-reference /caps/2/ground',
    'unknown-reference /caps/3/pileType',
    'unknown-reference /loads/rows/3/cap',
    'unknown-reference /loads/rows/3/combination',
  ])
  expect(all[1]!.facts).toEqual({ kind: 'ground profile', name: 'BH9', known: ['BH1'] })
  expect(all[4]!.facts).toEqual({ kind: 'combination', name: 'K9', known: ['K1'] })
})

test('components of another sign convention are refused', () => {
  const full = schedule(overall, 'working')
  const s = { ...full, loads: { ...full.loads, signs: 'right-handed-z-up' as const } }
  expect(told(s)).toEqual(['wrong-load-components /loads/rows/0', 'wrong-load-components /loads/rows/1'])
})
