import fc from 'fast-check'
import { expect, test } from 'vitest'
import { neighbourPairs } from '../../../src/engine/assessment/neighbours.ts'
import type { Cap } from '../../../src/engine/assessment/schedule.ts'

type Place = readonly [number, number]
const pairs = (xy: readonly Place[]) =>
  neighbourPairs(
    xy.map(([x, y], i): Cap => {
      const layout = { kind: 'points', points: [{ x: 0, y: 0 }] } as const
      return { mark: `C${i}`, x, y, ground: 'BH1', pileType: 'P1', layout }
    }),
  )
const edges = (xy: readonly Place[]) => pairs(xy).map((p) => `${p.a}-${p.b}`)

test('a line far from the origin and aslant: each cap and the next one along it', () => {
  const at = (t: number): Place => [451_200 + 0.6 * t, 5_411_000 + 0.8 * t]
  expect(edges([at(30), at(0), at(10), at(20)])).toEqual(['0-3', '1-2', '2-3'])
  expect(pairs([at(30), at(0), at(10), at(20)]).map((p) => Math.round(p.distance * 1e6) / 1e6)).toEqual([10, 10, 10])
})

test('caps in one place share the neighbours of the place and are none of each other', () => {
  const square: Place[] = [
    [0, 0],
    [6, 0],
    [0, 6],
    [6, 6.5],
  ]
  const once = edges(square)
  expect(once).toHaveLength(5)
  const twice = edges([...square, [0, 0]])
  const ofFirst = once.filter((e) => e.startsWith('0-')).map((e) => e.slice(2))
  expect(twice).toEqual(expect.arrayContaining(once))
  expect(twice.filter((e) => e.endsWith('-4')).map((e) => e.slice(0, -2))).toEqual(ofFirst)
  expect(twice).not.toContain('0-4')
  expect(
    edges([
      [1, 1],
      [1, 1],
    ]),
  ).toEqual([])
  expect(
    edges([
      [1, 1],
      [1, 1],
      [4, 5],
    ]),
  ).toEqual(['0-2', '1-2'])
})

const coordinate = fc.integer({ min: 0, max: 12 })
test('any plan: nobody is left alone, nearest places are neighbours, distances are those of the plan', () => {
  fc.assert(
    fc.property(fc.array(fc.tuple(coordinate, coordinate), { minLength: 2, maxLength: 25 }), (xy) => {
      const found = pairs(xy)
      const apart = (a: number, b: number) => Math.hypot(xy[a]![0] - xy[b]![0], xy[a]![1] - xy[b]![1])
      for (const p of found) {
        expect(p.a).toBeLessThan(p.b)
        expect(p.distance).toBe(apart(p.a, p.b))
        expect(p.distance).toBeGreaterThan(0)
      }
      expect(new Set(found.map((p) => `${p.a}-${p.b}`)).size).toBe(found.length)
      for (const i of xy.keys()) {
        const others = [...xy.keys()].map((j) => apart(i, j)).filter((d) => d > 0)
        if (others.length === 0) continue
        const own = found.filter((p) => p.a === i || p.b === i).map((p) => p.distance)
        // A nearest place is always at the end of a Delaunay edge.
        expect(Math.min(...own)).toBe(Math.min(...others))
      }
    }),
    { numRuns: 400 },
  )
})
