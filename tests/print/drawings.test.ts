import { expect, test } from 'vitest'
import { contours } from '../../src/print/draw/contours.ts'
import { coursesPath } from '../../src/print/draw/courses.ts'
import { curveFigure } from '../../src/print/draw/curve-figure.ts'
import { layoutFigure } from '../../src/print/draw/layout-figure.ts'
import { read } from './printed-page.ts'

test('contours of a plane are straight and where the plane has their value', () => {
  const spots = [0, 1, 2, 3].flatMap((x) =>
    [0, 1, 2].map((y) => ({ x, y: y + 0.01 * x, value: 2 * x + 3 * y + 0.03 * x })),
  )
  const found = contours(spots, [1, 4.5, 100])
  expect(found.map((c) => c.level)).toEqual([1, 4.5])
  for (const { level, segments } of found)
    for (const [xa, ya, xb, yb] of segments)
      for (const [x, y] of [
        [xa, ya],
        [xb, yb],
      ] as const)
        expect(2 * x + 3 * (y - 0.01 * x) + 0.03 * x).toBeCloseTo(level, 9)
  expect(contours(spots.slice(0, 2), [1])).toEqual([])
  expect(
    contours(
      [0, 1, 2].map((x) => ({ x, y: 0, value: x })),
      [0.5],
    ),
  ).toEqual([])
})

test('courses are laid by quarters, and crossed beyond the resistance', () => {
  const laid = (u: number) => coursesPath(u, 0, 20, 20, 3).laid.match(/M/g)?.length ?? 0
  expect([0, 0.1, 0.25, 0.26, 0.75, 1].map(laid)).toEqual([0, 1, 1, 2, 3, 4])
  expect(coursesPath(1, 0, 20, 20, 3).cross).toBe('')
  expect(coursesPath(1.0001, 0, 20, 20, 3).cross).not.toBe('')
})

test('a curve goes through its points, settlement downward; an interaction curve closes and shows its combinations', () => {
  const axis = { title: 'load', unit: 'kN' }
  const down = curveFigure('a', {
    title: 'Load and settlement',
    description: '',
    x: axis,
    y: { title: 'settlement', unit: 'mm', downward: true },
    curve: [
      { x: 0, y: 0 },
      { x: 500, y: 2 },
      { x: 1000, y: 10 },
    ],
  })
  const knots = read(down.text)
    .querySelectorAll('.knot')
    .map((k) => [Number(k.getAttribute('cx')), Number(k.getAttribute('cy'))])
  expect(knots).toEqual([
    [70, 36],
    [300, 96],
    [530, 336],
  ])
  const closed = curveFigure('b', {
    title: 'Interaction of V and M',
    description: '',
    x: { title: 'M', unit: 'kN·m' },
    y: axis,
    curve: [
      { x: 0, y: -300 },
      { x: 400, y: 0 },
      { x: 0, y: 1200 },
      { x: -400, y: 0 },
    ],
    marks: [{ x: 100, y: 500, name: 'W<1>' }],
    closed: true,
  })
  const drawn = read(closed.text)
  expect(drawn.querySelector('.profile')!.getAttribute('d')).toMatch(/Z$/)
  expect(closed.text).toContain('W&lt;1&gt;')
})

test('the plan of a layout is to scale in both directions', () => {
  const view = {
    points: [
      { x: 0, y: 0 },
      { x: 3, y: 0 },
      { x: 0, y: 2 },
    ],
    section: { shape: 'circular', diameter: 0.8 } as const,
  }
  const circles = read(layoutFigure('a', view).text).querySelectorAll('circle.white')
  const [a, b, c] = circles.map((e) => ['cx', 'cy', 'r'].map((k) => Number(e.getAttribute(k))))
  const scale = (b![0]! - a![0]!) / 3
  expect((a![1]! - c![1]!) / 2).toBeCloseTo(scale, 0)
  expect(a![2]! / 0.4).toBeCloseTo(scale, 0)
})
