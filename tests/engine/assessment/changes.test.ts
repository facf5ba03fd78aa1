import { readFileSync } from 'node:fs'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { parse } from '../../../src/contract/parse.ts'
import { scheduleRequest } from '../../../src/contract/schedule.ts'
import type { Schedule } from '../../../src/engine/assessment/schedule.ts'
import { type Assessed, assess, type Changes, changes, EngineFault } from '../../../src/engine/index.ts'
import { differences } from '../../../src/operations/differences.ts'

const example = readFileSync(new URL('../../../schema/examples/assessment.json', import.meta.url), 'utf8')
/** Free to be changed: the engine's types are readonly. */
// biome-ignore lint/suspicious/noExplicitAny: a schedule is bent in every place
type Loose = any
const base = (): Loose => structuredClone(parse(scheduleRequest, JSON.parse(example)))
const assessed = (schedule: Schedule): Assessed => ({ schedule, result: assess(schedule, { trace: false }).result })
const before = assessed(base())

/** Changes of a schedule, each by a number from 0 to 1 that says where and how much. */
const pick = <T>(list: readonly T[], at: number): T => list[Math.min(list.length - 1, Math.floor(at * list.length))]!
const bends: Readonly<Record<string, (s: Loose, at: number) => void>> = {
  reaction: (s, at) => {
    const row = pick<Loose>(s.loads.rows, at)
    const field = pick(
      Object.keys(row).filter((key) => typeof row[key] === 'number'),
      (at * 97) % 1,
    )
    row[field] = Math.round(row[field] * (0.2 + 3 * at) * 10) / 10 + 1
  },
  'order of caps': (s) => s.caps.reverse(),
  'order of rows': (s) => s.loads.rows.reverse(),
  'cap gone': (s, at) => {
    if (s.caps.length < 3) return
    const [{ mark }] = s.caps.splice(Math.floor(at * s.caps.length), 1)
    s.loads.rows = s.loads.rows.filter((row: Loose) => row.cap !== mark)
  },
  'cap added': (s, at) => {
    const cap = pick<Loose>(s.caps, at)
    const mark = `N${s.caps.length}/~${cap.mark}`
    s.caps.unshift({ ...cap, mark, x: cap.x + 40 + s.caps.length, y: cap.y + 3 })
    s.loads.rows.push(...s.loads.rows.filter((r: Loose) => r.cap === cap.mark).map((r: Loose) => ({ ...r, cap: mark })))
  },
  'layer put in': (s, at) => {
    const { layers } = pick<Loose>(Object.values(s.ground), at)
    const clay = { name: 'lens', thickness: 0.5, unitWeight: 17, soil: 'cohesive' }
    layers.splice(Math.floor(at * (layers.length - 1)), 0, {
      ...clay,
      undrainedShearStrength: 20,
      youngsModulus: 5000,
      poissonsRatio: 0.5,
    })
  },
  'layer renamed': (s, at) => {
    pick<Loose>(pick<Loose>(Object.values(s.ground), at).layers, (at * 31) % 1).name += ', weathered'
  },
  thickness: (s, at) => {
    pick<Loose>(Object.values(s.ground), at).layers[0].thickness += 0.25 + at
  },
  'pile length': (s, at) => {
    pick<Loose>(Object.values(s.pileTypes), at).length += 0.5
  },
  'weight and place': (s, at) => {
    const cap = pick<Loose>(s.caps, at)
    cap.x += 0.5
    cap.capWeight = (cap.capWeight ?? 0) + 25
  },
  layout: (s, at) => {
    const cap = pick<Loose>(s.caps, at)
    cap.layout = { kind: 'ring', count: 5 + Math.floor(3 * at), radius: 3 }
  },
  limit: (s, at) => {
    s.limits = { ...s.limits, settlement: 3 + 30 * at }
  },
  'no limits': (s) => {
    delete s.limits
  },
  method: (s) => {
    s.methods = { ...s.methods, granularBase: 'navfac-1986', sublayer: 0.5 }
  },
  factor: (s, at) => {
    if ('factor' in s.designBasis) s.designBasis.factor += at
  },
}
const bending = fc.array(
  fc.tuple(fc.constantFrom(...Object.keys(bends)), fc.double({ min: 0, max: 0.999, noNaN: true })),
  { maxLength: 5 },
)
type Bend = [string, number]
/** The schedule that these changes give, assessed; undefined where the engine refuses it. */
function bent(list: readonly Bend[]): Assessed | undefined {
  const schedule = base()
  for (const [name, at] of list) bends[name]!(schedule, at)
  try {
    return assessed(schedule)
  } catch (fault) {
    if (fault instanceof EngineFault) return undefined
    throw fault
  }
}
const pair = (check: (a: Assessed, b: Assessed) => void) =>
  fc.assert(
    fc.property(bending, bending, (one, two) => {
      const [a, b] = [bent(one), bent(two)]
      fc.pre(a !== undefined && b !== undefined)
      check(a, b)
    }),
    { numRuns: 150 },
  )

function at(document: unknown, pointer: string): unknown {
  const parts = pointer.split('/').slice(1)
  return parts.reduce<unknown>((node, part) => {
    const key = part.replaceAll('~1', '/').replaceAll('~0', '~')
    expect(Object.hasOwn(node as object, key), pointer).toBe(true)
    return (node as Record<string, unknown>)[key]
  }, document)
}

/** Without order: the lists of both ways round follow different schedules. */
const unordered = (value: unknown): unknown => {
  if (Array.isArray(value))
    return value
      .map(unordered)
      .map((v) => JSON.stringify(v))
      .sort()
  if (typeof value !== 'object' || value === null) return value === 0 ? 0 : value
  return Object.fromEntries(
    Object.entries(value)
      .map(([key, inner]) => [key, unordered(inner)])
      .sort(([a], [b]) => (a! < b! ? -1 : 1)),
  )
}
/** The same changes told from the other side. */
function turnedRound(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(turnedRound)
  if (typeof value !== 'object' || value === null) return value
  const names: Record<string, string> = { before: 'after', after: 'before', added: 'gone', gone: 'added' }
  Object.assign(names, { turnedExceeded: 'turnedSatisfied', turnedSatisfied: 'turnedExceeded' })
  return Object.fromEntries(
    Object.entries(value).map(([key, inner]) => {
      if (key === 'by') return [key, -(inner as number)]
      if (key === 'turned') return [key, inner === 'exceeded' ? 'satisfied' : 'exceeded']
      // What is told of a layer that has two names is the later one.
      return [names[key] ?? key, key === 'before' || key === 'after' ? inner : turnedRound(inner)]
    }),
  )
}
const withoutLayerNames = (found: Changes) => ({
  ...found,
  inputs: found.inputs.map(({ layer, ...input }) => input),
})

describe('changes between two assessments', () => {
  test('none: empty, also where caps and rows stand in another order', () => {
    for (const list of [[], [['order of caps', 0]], [['order of rows', 0]]] as Bend[][]) {
      const found = changes(before, bent(list)!)
      expect([found.verdicts, found.caps, found.added, found.gone, found.inputs]).toEqual([[], [], [], [], []])
      expect(found.counts).toMatchObject({ turnedExceeded: 0, turnedSatisfied: 0, caps: 0, inputs: {} })
    }
    fc.assert(
      fc.property(bending, (list) => {
        const one = bent(list)
        fc.pre(one !== undefined)
        const found = changes(one, structuredClone(one))
        expect(Object.entries(found).filter(([, v]) => Array.isArray(v) && v.length > 0)).toEqual([])
      }),
      { numRuns: 30 },
    )
  })

  test('the other way round: the same, with the sides changed', () => {
    pair((a, b) => {
      expect(unordered(withoutLayerNames(changes(b, a)))).toEqual(
        unordered(turnedRound(withoutLayerNames(changes(a, b)))),
      )
    })
  })

  test('every pointer leads to the value that is told, in its own schedule', () => {
    let count = 0
    pair((a, b) => {
      for (const { pointer, ...change } of changes(a, b).inputs) {
        for (const [side, one] of [
          ['before', a],
          ['after', b],
        ] as const) {
          expect(pointer[side] === undefined).toBe(change[side] === undefined)
          if (pointer[side] === undefined) continue
          expect(at(one.schedule, pointer[side])).toEqual(change[side])
          count++
        }
        if (typeof change.before === 'number' && typeof change.after === 'number')
          expect(change.by).toBe(change.after - change.before)
      }
      for (const { mark, pointer } of changes(a, b).caps) {
        expect(at(a.schedule, `${pointer.before}/mark`)).toBe(mark)
        expect(at(b.result, `${pointer.after}/mark`)).toBe(mark)
      }
      for (const { mark, pointer } of changes(a, b).added) expect(at(b.schedule, `${pointer}/mark`)).toBe(mark)
      for (const { mark, pointer } of changes(a, b).gone) expect(at(a.result, `${pointer}/mark`)).toBe(mark)
    })
    expect(count).toBeGreaterThan(500)
  })

  test('where nothing is added, gone or moved, the inputs are those that a plain comparison finds', () => {
    const still = Object.keys(bends).filter((name) =>
      /^(reaction|thickness|pile|weight|limit|factor|layer r)/.test(name),
    )
    const some = fc.array(fc.tuple(fc.constantFrom(...still), fc.double({ min: 0, max: 0.999, noNaN: true })), {
      maxLength: 6,
    })
    fc.assert(
      fc.property(some, (list) => {
        const after = bent(list)
        fc.pre(after !== undefined)
        const plain = differences(before.schedule, after.schedule).map((d) => d.pointer)
        const found = changes(before, after).inputs.map((input) => input.pointer.after ?? input.pointer.before)
        expect([...found].sort()).toEqual(plain.sort())
      }),
      { numRuns: 100 },
    )
  })

  test('verdicts, what governs and utilisations are those of the two results', () => {
    let turned = 0
    pair((a, b) => {
      const found = changes(a, b)
      const verdictOf = (one: Assessed, mark: string, check: string) =>
        one.result.caps.find((cap) => cap.mark === mark)?.checks.find((c) => c.check === check)
      for (const change of found.caps) {
        for (const check of change.checks) {
          const [x, y] = [verdictOf(a, change.mark, check.check), verdictOf(b, change.mark, check.check)]
          expect([check.before?.utilisation, check.after?.utilisation]).toEqual([x?.utilisation, y?.utilisation])
        }
        const worst = (one: Assessed) =>
          Math.max(...one.result.caps.find((cap) => cap.mark === change.mark)!.checks.map((c) => c.utilisation))
        expect([change.governing.before?.utilisation, change.governing.after?.utilisation]).toEqual([
          worst(a),
          worst(b),
        ])
      }
      const expected = a.result.caps.flatMap((cap) =>
        cap.checks.filter((check) => {
          const other = verdictOf(b, cap.mark, check.check)
          return other !== undefined && other.satisfied !== check.satisfied
        }),
      ).length
      const both = found.verdicts.filter((v) => v.cap !== undefined && v.before && v.after)
      expect(both).toHaveLength(expected)
      turned += expected
      const order = found.verdicts.map((v) => v.turned)
      expect(order).toEqual([...order].sort())
    })
    expect(turned).toBeGreaterThan(20)
  })

  test('a layer put in, and one with a new name, do not shift those below', () => {
    const bh = Object.keys(before.schedule.ground)[0]!
    const lens = changes(before, bent([['layer put in', 0]])!).inputs
    expect(lens.map((i) => [i.part, i.name, i.layer, i.pointer])).toEqual([
      ['ground', bh, 'lens', { after: `/ground/${bh}/layers/0` }],
    ])
    const renamed = changes(before, bent([['layer renamed', 0]])!).inputs
    expect(renamed.map((i) => [i.field, i.pointer.before])).toEqual([['name', `/ground/${bh}/layers/0/name`]])
  })
})
