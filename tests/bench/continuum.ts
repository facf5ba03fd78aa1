import { execFileSync } from 'node:child_process'
import { fileURLToPath } from 'node:url'
import { parse } from '../../src/contract/parse.ts'
import { scheduleRequest } from '../../src/contract/schedule.ts'
import { assess } from '../../src/engine/index.ts'
import { factor } from '../../src/engine/numerics/cholesky.ts'
import type { Point } from '../../src/engine/piles/layout.ts'
import { CoupledPiles } from '../../src/engine/settlement/continuum/coupled-piles.ts'
import { interactionCurve } from '../../src/engine/settlement/continuum/interaction-curve.ts'
import { solvePile } from '../../src/engine/settlement/continuum/single-pile.ts'
import { elasticGroup, superposed } from '../../src/engine/settlement/group.ts'
import { scheduleBody } from './bodies.ts'
import { type Finding, interleaved, median, sink, time } from './measure.ts'

const ground = {
  layers: [{ top: 0, bottom: Number.POSITIVE_INFINITY, E: { top: 25_000, bottom: 25_000 }, nu: 0.4 }],
  rigidBase: false,
}
const shape = { head: 0, toe: 15, radius: 0.3, baseRadius: 0.3, axialStiffness: 30e6 * Math.PI * 0.09 }

/** Piles 1.8 m apart, moved by up to 0.4 m in a fixed disorder. */
function irregular(n: number): Point[] {
  const side = Math.ceil(Math.sqrt(n))
  let seed = 7
  const next = () => {
    seed = (seed * 16_807) % 2_147_483_647
    return (seed / 2_147_483_647) * 0.4
  }
  return Array.from({ length: n }, (_, i) => ({ x: (i % side) * 2.2 + next(), y: Math.floor(i / side) * 2.2 + next() }))
}
const grid = (side: number): Point[] =>
  Array.from({ length: side * side }, (_, i) => ({ x: (i % side) * 1.8, y: Math.floor(i / side) * 1.8 }))

/** The median of five processes that have compiled nothing. */
function cold(kind: 'homogeneous' | 'layered') {
  const script = fileURLToPath(new URL('cold-pile.ts', import.meta.url))
  const runs = Array.from({ length: 5 }, () => {
    const out = JSON.parse(execFileSync(process.execPath, [script, kind], { encoding: 'utf8' }))
    sink.sum += out.alpha
    return out as { pile: number; curve: number }
  })
  return { pile: median(runs.map((r) => r.pile)), curve: median(runs.map((r) => r.curve)) }
}

const ms = (value: number) => `${value.toFixed(value < 10 ? 1 : 0)} ms`

/** (h) Settlement on the continuum: cold piles and curves, rigid caps, coupling in full, an assessment of twenty sets. One thread. */
export function continuum(): Finding[] {
  const found: Finding[] = []
  const say = (what: string, value: number, aim: number, more = '') =>
    found.push({ part: 'h', what, value: `${ms(value)}${more}`, aim: `<= ${aim} ms`, holds: value <= aim })
  const [even, layered] = [cold('homogeneous'), cold('layered')]
  say('homogeneous pile and its curve of 30 spacings, cold', even.pile + even.curve, 50)
  say('pile in 5 layers, cold', layered.pile, 40)
  say('its curve of 30 spacings, cold', layered.curve, 150)

  const pile = solvePile(shape, ground)
  const curve = interactionCurve(pile)
  const rigidCap = (points: Point[]) => () =>
    elasticGroup(points, superposed(points, pile.stiffness, curve.at)).flexibility[0]!
  const sizes = [
    ['100 piles', irregular(100), 0.5],
    ['400 piles', irregular(400), 9],
    ['1000 piles', irregular(1000), 60],
    ['2500 piles', irregular(2500), 600],
    ['10 x 10 grid', grid(10), 0.5],
    ['50 x 50 grid', grid(50), 150],
  ] as const
  const cost = new Map<string, number>()
  for (const [name, points, aim] of sizes) {
    const calls = points.length <= 100 ? 20 : 1
    const us = interleaved({ cap: { calls, run: rigidCap([...points]) } }, 7, 3)
    cost.set(name, median(us.cap) / 1e3)
    say(`rigid cap from a known curve, ${name}`, median(us.cap) / 1e3, aim)
  }
  const exponent = Math.log(cost.get('2500 piles')! / cost.get('400 piles')!) / Math.log(2500 / 400)
  found.push({ part: 'h', what: 'growth from 400 to 2500 irregular piles', value: `n^${exponent.toFixed(2)}` })
  const n = 1000
  const plain = interleaved(
    {
      cholesky: {
        calls: 1,
        run: () => {
          const a = new Float64Array(n * n)
          for (let i = 0; i < n; i++) for (let j = 0; j <= i; j++) a[i * n + j] = i === j ? n : 1 / (1 + i - j)
          factor(a, n)
          return a[n * n - 1]!
        },
      },
    },
    3,
    1,
  )
  found.push({
    part: 'h',
    what: 'the same 1000 piles : one plain Cholesky of that size',
    value: (cost.get('1000 piles')! / (median(plain.cholesky) / 1e3)).toFixed(3),
  })

  const fine = solvePile({ ...shape, toe: 36 }, ground)
  const sixtyFour = irregular(64)
  const coupled = interleaved(
    {
      full: {
        calls: 1,
        run: () => {
          const piles = new CoupledPiles(fine, sixtyFour)
          return elasticGroup(sixtyFour, {
            modes: (about, _, modes) =>
              piles.loads(modes.map((m) => Float64Array.from(about, (p) => m.v + m.x * p.x + m.y * p.y))),
            settlements: (loads) => loads,
          }).flexibility[0]!
        },
      },
    },
    7,
    3,
  )
  say(`64 irregular piles x ${fine.soil.size} elements, coupled in full`, median(coupled.full) / 1e3, 120)

  const schedule = parse(scheduleRequest, scheduleBody(300, 40))
  const few = parse(scheduleRequest, scheduleBody(300, 4))
  const run = (s: typeof schedule) => ({ calls: 1, run: () => assess(s, { trace: false }).result.summary.satisfied })
  const us = interleaved({ all: run(schedule), few: run(few) }, 5, 2)
  const perCombination = (median(us.all) - median(us.few)) / 36
  found.push({
    part: 'h',
    what: '300 caps x 40 combinations, 20 sets: whole, set-up, combinations',
    value: `${time(median(us.all))}, ${time(median(us.few) - 4 * perCombination)}, ${time(40 * perCombination)}`,
  })
  return found
}
