import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { parse } from '../../src/contract/parse.ts'
import { groupRequest, settlementRequest } from '../../src/contract/requests.ts'
import { calculateGroup, calculateSettlement } from '../../src/engine/index.ts'
import { evaluateFormula } from '../../src/engine/replay/evaluator.ts'
import type { GroupRequest } from '../../src/engine/requests.ts'
import { calculationSheet } from '../../src/print/calculation-sheet.ts'
import { capSheet } from '../../src/print/cap-sheet.ts'
import { seed } from '../seed.ts'
import { formulaLines, numberIn, type PrintedLine, read } from './printed-page.ts'
import { demoBody, exampleBody, recordOf } from './records.ts'

/** Target 37: a line computed again from its operands as printed gives the printed result. */
const meta = { engine: 'kentledge/test', requestHash: 'sha256:0' }

/** How far a line is off, in units of its fourth figure, and in what the rounding of its operands can make of it. */
function deviation(line: PrintedLine) {
  const at = (shift: number[]) =>
    evaluateFormula(
      line.formula,
      line.operands.map((o, i) => ({ symbol: o.symbol, unit: o.unit, value: o.number.value + shift[i]! })),
      line.unit,
    )
  const none = line.operands.map(() => 0)
  const found = at(none)
  const off = Math.abs(found - line.result.value)
  const cancelled = line.operands.reduce((sum, o, i) => {
    const shifted = (by: number) => Math.abs(at(none.map((z, k) => (k === i ? by : z))) - found)
    return sum + Math.max(shifted(o.number.half), shifted(-o.number.half))
  }, line.result.half)
  return { units: off / line.result.unit, cancelled: off / cancelled }
}

/** A number of more than seven figures near another: what a real model holds, rounded nowhere. */
function unrounded<T>(node: T, random: () => number): T {
  if (typeof node === 'number')
    return (Number.isInteger(node) && node < 12 ? node : node * (0.96 + 0.08 * random())) as T
  if (Array.isArray(node)) return node.map((child) => unrounded(child, random)) as T
  if (typeof node !== 'object' || node === null) return node
  return Object.fromEntries(Object.entries(node).map(([key, child]) => [key, unrounded(child, random)])) as T
}
function mulberry(a: number): () => number {
  return () => {
    a = (a + 0x6d2b79f5) | 0
    let t = Math.imul(a ^ (a >>> 15), 1 | a)
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296
  }
}

const published = JSON.parse(readFileSync(new URL('../published/capacity.json', import.meta.url), 'utf8')) as {
  cases: { request: GroupRequest }[]
}

function pages(): string[] {
  const random = mulberry(seed)
  const settlement = parse(settlementRequest, exampleBody('settlement'))
  const cases = published.cases.map(({ request }) => ({ ...request, designBasis: exampleBody('group').designBasis }))
  const groups = [...cases, ...cases.map((c) => unrounded(c, random)), ...cases.map((c) => unrounded(c, random))]
  const record = recordOf()
  const odd = recordOf(unroundedLoads(random))
  return [
    ...groups.flatMap((body) => {
      const request = parse(groupRequest, body)
      return calculationSheet({ kind: 'group', request, answer: calculateGroup(request, { trace: true }), meta })
    }),
    ...[settlement, unrounded(settlement, random)].map((request) =>
      calculationSheet({ kind: 'settlement', request, answer: calculateSettlement(request, { trace: true }), meta }),
    ),
    ...record.schedule.caps.map((cap) => capSheet(record, cap.mark)!),
    ...odd.schedule.caps.map((cap) => capSheet(odd, cap.mark)!),
  ]
}

function unroundedLoads(random: () => number) {
  const body = demoBody()
  body.loads.rows = unrounded(body.loads.rows, random)
  return body
}

test('every printed line of a formula, computed again by mathjs from its printed operands, gives the printed result', () => {
  let lines = 0
  let byOperands = 0
  let worst = 0
  for (const page of pages()) {
    for (const line of formulaLines(read(page))) {
      lines++
      const { units, cancelled } = deviation(line)
      if (units > 0.5) byOperands++
      else worst = Math.max(worst, units)
      const where = `${line.id}: ${line.formula} ${JSON.stringify(line.operands)} -> ${JSON.stringify(line.result)}`
      expect(units <= 0.5 || cancelled <= 1.000001, where).toBe(true)
    }
  }
  process.stdout.write(
    `${lines} lines; ${byOperands} of them cancel; of the others the worst is off by ${worst.toFixed(3)} of its fourth figure\n`,
  )
  expect(lines).toBeGreaterThan(5000)
  // The second half of the rule is for differences: it must stay an exception.
  expect(byOperands / lines).toBeLessThan(0.02)
})

test('every printed sum and choice holds', () => {
  let sums = 0
  let choices = 0
  for (const page of pages()) {
    for (const block of read(page).querySelectorAll('section.line')) {
      const out = block.querySelector('.sum .out')
      if (!out || block.querySelector('.rows, .solved')) continue
      const operands = block.querySelectorAll('.in').map(numberIn)
      const result = numberIn(out)
      if (block.querySelector('.choice')) {
        choices++
        const values = operands.map((o) => o.value)
        const rule = block.querySelector('.rule')!.text.includes('smallest') ? Math.min : Math.max
        expect(result.value).toBe(rule(...values))
        expect(block.querySelectorAll('b').map((b) => b.text)).toContain('taken')
        continue
      }
      sums++
      const slack = operands.reduce((sum, o) => sum + o.half, result.half)
      const total = operands.reduce((sum, o) => sum + o.value, 0)
      expect(Math.abs(total - result.value)).toBeLessThanOrEqual(Math.max(result.unit, slack) * 1.000001)
    }
  }
  expect(sums).toBeGreaterThan(300)
  expect(choices).toBeGreaterThan(100)
})
