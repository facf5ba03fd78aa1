import fc from 'fast-check'
import { expect, test } from 'vitest'
import { units } from '../../../src/engine/quantities/units.ts'
import { replay } from '../../../src/engine/replay/replay.ts'
import { adHocSteps, request } from './ad-hoc.ts'

// biome-ignore lint/suspicious/noExplicitAny: a mutant is a step bent out of its type
type Bent = any

const steps = adHocSteps()
/** A copy as it stands on the wire: nothing is shared between steps. */
const printed = (): Bent[] => JSON.parse(JSON.stringify(steps))
const failing = (mutant: readonly Bent[], asked?: unknown) =>
  replay({ steps: mutant }, asked)
    .steps.filter((s) => !s.holds)
    .map((s) => s.id)
const usersOf = (id: string) =>
  steps.flatMap((s) => ('operands' in s ? s.operands.filter((o) => o.from === id) : [])).length

test('a trace with every kind of step and every unit holds, with its request and without', () => {
  expect(new Set(steps.map((s) => s.kind))).toEqual(
    new Set(['input', 'formula', 'sum', 'choice', 'lookup', 'solution']),
  )
  expect(new Set(steps.map((s) => s.unit))).toEqual(new Set(Object.keys(units)))
  for (const asked of [undefined, request]) {
    const answer = replay({ steps }, asked)
    expect(answer.steps.filter((s) => !s.holds)).toEqual([])
    expect(answer).toMatchObject({ holds: true, count: steps.length })
  }
})

/** Each bends one step and says whether there was something to bend. `asked`: only the request can tell. */
const bends: Record<string, (step: Bent, by: number, pick: number) => boolean> = {
  value: (step, by) => {
    step.value *= 1 + by
    // Nothing re-computes a solution, a default, or a request value that stands as { top, bottom } or with a unit:
    // these are known to be wrong only by two users that agree.
    const unchecked = step.kind === 'solution' || step.default || step.from === '/sigma' || step.from === '/d'
    return !unchecked || usersOf(step.id) > 1
  },
  operand: (step, by, pick) => {
    if (!step.operands) return false
    step.operands[pick % step.operands.length].value *= 1 + by
    return true
  },
  unit: (step, _, pick) => {
    const codes = Object.keys(units).filter((code) => code !== step.unit)
    step.unit = codes[pick % codes.length]
    // A unit of the same quantity (m for mm) is plain from the value only where the step is re-computed.
    return step.kind === 'formula' || (step.kind === 'sum' && step.unit !== 'kN')
  },
  'unit of an operand': (step, _, pick) => {
    if (!step.operands) return false
    const operand = step.operands[pick % step.operands.length]
    const codes = Object.keys(units).filter((code) => code !== operand.unit)
    operand.unit = codes[pick % codes.length]
    return true
  },
  formula: (step, by) => {
    if (step.kind !== 'formula') return false
    step.formula = `${1 + by} * (${step.formula})`
    return true
  },
  origin: (step, _, pick) => {
    if (!step.operands) return false
    const operand = step.operands[pick % step.operands.length]
    operand.from = pick % 2 ? 'nowhere' : step.id
    return true
  },
  row: (step, by) => {
    if (step.kind !== 'lookup') return false
    for (const row of step.rows) row[1] *= 1 + by
    return true
  },
  choice: (step) => {
    if (step.kind !== 'choice') return false
    step.rule = step.rule === 'smallest' ? 'largest' : 'smallest'
    return true
  },
  residual: (step) => {
    if (step.kind !== 'solution') return false
    step.residuals[0].value = -2 * step.tolerance
    return true
  },
}

test('3000 mutants, bent by 2e-6 to 0.5: the bent step is named, and no other', () => {
  const bent = Object.fromEntries(Object.keys(bends).map((kind) => [kind, 0]))
  fc.assert(
    fc.property(
      fc.nat(steps.length - 1),
      fc.constantFrom(...Object.keys(bends)),
      fc.double({ min: Math.log(2e-6), max: Math.log(0.5), noNaN: true }),
      fc.boolean(),
      fc.nat(1000),
      (where, kind, size, down, pick) => {
        const mutant = printed()
        // The first step from there on that has something of the kind to bend.
        for (let i = 0; i < mutant.length; i++) {
          const at = (where + i) % mutant.length
          const step = structuredClone(mutant[at])
          if (!bends[kind]!(step, Math.exp(size) * (down ? -1 : 1), pick)) continue
          mutant[at] = step
          bent[kind]!++
          expect(failing(mutant, request), `${kind} of ${step.id}`).toEqual([step.id])
          return
        }
        expect.fail(`no step to bend: ${kind}`)
      },
    ),
    { numRuns: 3000 },
  )
  expect(Object.values(bent).reduce((a, b) => a + b)).toBe(3000)
  expect(Object.entries(bent).filter(([, count]) => count < 200)).toEqual([])
})

test('without the request an input is blamed by two users that agree, and a user that stands alone is blamed itself', () => {
  for (const [i, step] of steps.entries()) {
    const uses = usersOf(step.id)
    if (step.kind !== 'input' || uses === 0) continue
    const mutant = printed()
    mutant[i]!.value *= 1.001
    const named = failing(mutant)
    expect(named.length, step.id).toBe(1)
    expect(named[0] === step.id, step.id).toBe(uses > 1)
  }
})

test('an input must lie where its pointer says', () => {
  const bendFrom = (from: string) => {
    const mutant = printed()
    mutant.find((s) => s.id === 'q/1').from = from
    return failing(mutant, request)
  }
  expect(bendFrom('/a~1b/~0q/1')).toEqual([])
  for (const from of ['/a~1b/~0q/7', '/a/b/~q/1', '/a~1b/~0q/0', 'a~1b', '/__proto__', '/phi/toString'])
    expect(bendFrom(from), from).toEqual(['q/1'])
})

test('a second step of the same id, and a step before its operands, are named', () => {
  expect(failing([...steps, steps.at(-1)!])).toEqual([steps.at(-1)!.id])
  const first = steps.findIndex((s) => s.id === 'f')
  const moved = [steps[first]!, ...steps.filter((_, i) => i !== first)]
  expect(failing(moved)).toContain('f')
})

const line = { id: 'y', symbol: 'y', name: 'y', value: 1, unit: '1', quantity: 'ratio' } as const
const alone = (formula: unknown, value = 1) =>
  replay({
    steps: [{ ...line, value, kind: 'formula', formula, operands: [], source: { key: 'k', locator: '' } }] as Bent,
  })

test.each(['1e999', '1e308 * 10', '9^9^9^9', '1 / 0', '0 / 0', '-1 / 0', 'log(0)', 'sqrt(-1)'])(
  '%s is no finite number: whatever is printed, it does not hold, and nothing infinite is answered',
  (formula) => {
    for (const value of [1, 0, -1, 1e300, Number.MAX_VALUE]) {
      const answer = alone(formula, value)
      expect(answer.holds).toBe(false)
      expect(JSON.parse(JSON.stringify(answer))).toEqual(answer)
    }
  },
)

test.each([
  'x',
  'constructor',
  'toString',
  '__proto__',
  'cos.constructor("return 1")()',
  'import({})',
  'createUnit("q")',
  'parse("1")',
  'simplify("1")',
  'config({})',
  'unit("1 m")',
  'f(x) = 1',
  'x = 1',
  '1; 1',
  '[1][1]',
  '{a: 1}["a"]',
  '"1"',
  '1:1',
  "1'",
  '1!',
  '5 mod 2',
  '1 m',
  'random()',
  'map',
  'min',
  '()',
  '',
  '('.repeat(501),
  `${'1*'.repeat(250)}1`,
  null,
  1,
  {},
])('%s is refused, not run', (formula) => {
  expect(alone(formula).holds).toBe(false)
})
