import { expect, test } from 'vitest'
import { parse } from '../../src/contract/parse.ts'
import { groupRequest, settlementRequest, singlePileRequest } from '../../src/contract/requests.ts'
import { calculateGroup, calculateSettlement, calculateSinglePile } from '../../src/engine/index.ts'
import { calculationSheet } from '../../src/print/calculation-sheet.ts'
import { capSheet } from '../../src/print/cap-sheet.ts'
import { pileSchedule } from '../../src/print/pile-schedule.ts'
import { projectPlan } from '../../src/print/project-plan.ts'
import { read } from './printed-page.ts'
import { demoBody, exampleBody, recordOf } from './records.ts'

/**
 * What counts or measures on the page itself: numbers of lines and of piles in their layout, rulers of drawings, and the places of
 * piles, which are sums that the schedule of piles states and its own test holds.
 */
const ownNumbers = 'style, .ref, .use, .no, td.label, .tick, .count, td.place'

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹'
const plain = (text: string) =>
  text
    .replace(/[⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+/g, (r) => [...r].map((c) => (c === '⁻' ? '−' : RAISED.indexOf(c))).join(''))
    .replace(/(m|kN\/m)[234]\b/g, '$1')

type Known = { readonly numbers: readonly number[]; readonly words: string }

function knownOf(...records: readonly unknown[]): Known {
  const numbers: number[] = []
  const words: string[] = []
  const walk = (node: unknown): void => {
    if (typeof node === 'number') numbers.push(Math.abs(node))
    else if (typeof node === 'string') {
      words.push(node)
      for (const token of node.match(/\d+(?:\.\d+)?/g) ?? []) numbers.push(Number(token))
    } else if (typeof node === 'object' && node !== null)
      for (const [key, child] of Object.entries(node)) {
        walk(key)
        walk(child)
      }
  }
  for (const record of records) walk(record)
  return { numbers: numbers.sort((a, b) => a - b), words: words.join('\n') }
}

/** Whether a number of the record, rounded as printed, is what is printed. */
function isKnown(token: string, { numbers, words }: Known): boolean {
  const [, mantissa = '', power = '0'] = /^([\d.]+)(?: ?× ?10(−?\d+))?/.exec(token)!
  const exponent = Number(power.replace('−', '-'))
  const decimals = mantissa.split('.')[1]?.length ?? 0
  const value = Number(`${mantissa}e${exponent}`)
  // Trailing zeros are not printed: what is printed with fewer figures stands for all that round to it with four.
  const figures = Math.max(4, mantissa.replace(/^0\.0*/, '').replace('.', '').length)
  const half = 0.5 * 10 ** ((value === 0 ? 0 : Math.floor(Math.log10(value))) - figures + 1)
  const slack = Math.min(half, Math.max(0.5 * 10 ** (exponent - decimals), half)) * 1.000001
  let low = 0
  let high = numbers.length
  while (low < high) {
    const middle = (low + high) >> 1
    if (numbers[middle]! < value - slack) low = middle + 1
    else high = middle
  }
  return (low < numbers.length && numbers[low]! <= value + slack) || words.includes(mantissa)
}

/** Every number that can be read on a page, but for its own. */
function numbersOf(page: string): string[] {
  const root = read(page)
  for (const own of root.querySelectorAll(ownNumbers)) own.remove()
  for (const block of root.querySelectorAll(
    'td, th, p, li, dd, dt, text, tspan, mrow.in, mrow.out, h1, h2, h3, h4, figcaption, title, span',
  ))
    block.insertAdjacentHTML('beforeend', ' ')
  for (const number of root.querySelectorAll('mrow.in, msup')) {
    number.insertAdjacentHTML('beforebegin', number.rawTagName === 'msup' ? '' : ' ')
    number.insertAdjacentHTML('afterend', ' ')
  }
  return plain(root.text).match(/\d+(?:\.\d+)?(?: ?× ?10−?\d+)?/g) ?? []
}

const meta = { engine: 'kentledge/0.1.0', requestHash: 'sha256:5f3c' }
const single = parse(singlePileRequest, exampleBody('single-pile'))
const group = parse(groupRequest, exampleBody('group'))
const settled = parse(settlementRequest, exampleBody('settlement'))
const record = recordOf()
const changed = demoBody()
changed.loads.rows = changed.loads.rows.map((row: { Fz: number }) => ({ ...row, Fz: row.Fz * 1.31 }))
changed.limits.angularDistortion = 0.0004
const next = recordOf(changed, { revision: 4 })

const pages: Record<string, () => [page: string, known: Known]> = {
  'single pile': () => {
    const answer = calculateSinglePile(single, { trace: true })
    return [calculationSheet({ kind: 'single-pile', request: single, answer, meta }), knownOf(single, answer, meta)]
  },
  group: () => {
    const answer = calculateGroup(group, { trace: true })
    return [calculationSheet({ kind: 'group', request: group, answer, meta }), knownOf(group, answer, meta)]
  },
  settlement: () => {
    const answer = calculateSettlement(settled, { trace: true })
    return [calculationSheet({ kind: 'settlement', request: settled, answer, meta }), knownOf(settled, answer, meta)]
  },
  'settlement in a continuum': () => {
    const request = { ...settled, method: 'elastic-continuum' as const }
    const answer = calculateSettlement(request, { trace: true })
    const page = calculationSheet({ kind: 'settlement', request, answer, meta })
    // Spacing and interaction factor: the table of the solution, drawn.
    expect(page).toContain('Interaction of two piles')
    return [page, knownOf(request, answer, meta)]
  },
  'cap of a grid': () => [capSheet(record, 'C2')!, knownOf(record)],
  'cap of a ring': () => [capSheet(record, 'B4')!, knownOf(record)],
  'cap of 49 piles': () => [capSheet(record, 'B1')!, knownOf(record)],
  plan: () => [projectPlan(record), knownOf(record)],
  'plan beside an earlier one': () => [projectPlan(next, { previous: record }), knownOf(next, record)],
  'schedule of piles': () => [pileSchedule(record), knownOf(record)],
}

test.each(Object.keys(pages))('every number on the page is one of the record: %s', (name) => {
  const [page, known] = pages[name]!()
  const found = numbersOf(page)
  expect(found.length).toBeGreaterThan(60)
  expect([...new Set(found)].filter((token) => !isKnown(token, known))).toEqual([])
})

test('a number that is not of the record is seen', () => {
  const known = knownOf({ a: 12.3456789, b: 4.2e-5, name: 'BH3' })
  expect(['12.34568', '12.35', '4.2 × 10−5', '3'].filter((token) => !isKnown(token, known))).toEqual([])
  expect(['12.35001', '12.36', '4.3 × 10−5', '17'].filter((token) => isKnown(token, known))).toEqual([])
})

test('every step behind the result stands on the sheet with its value, and every reference leads to a line', () => {
  const page = read(capSheet(record, 'C2')!)
  const lines = new Map(page.querySelectorAll('[data-step]').map((e) => [e.getAttribute('data-step'), e.id]))
  expect(lines.size).toBeGreaterThan(250)
  const targets = new Set(page.querySelectorAll('[id]').map((e) => `#${e.id}`))
  const links = page.querySelectorAll('a.ref, a.use, a.cite').map((a) => a.getAttribute('href')!)
  expect(links.length).toBeGreaterThan(1000)
  expect([...new Set(links)].filter((href) => !targets.has(href))).toEqual([])
})
