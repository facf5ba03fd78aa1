import { readFileSync } from 'node:fs'
import { cpus } from 'node:os'
import { singlePileRequest } from '../../src/contract/requests.ts'
import { scheduleRequest } from '../../src/contract/schedule.ts'
import type { Cap, ModelRow, Schedule } from '../../src/engine/assessment/schedule.ts'
import { assess, calculateSinglePile } from '../../src/engine/index.ts'
import { formula } from '../../src/engine/trace/formula.ts'
import { Sheet } from '../../src/engine/trace/sheet.ts'
import type { Term } from '../../src/engine/trace/term.ts'

/** Run with `node tests/bench/run.ts`. Prints times and ratios; each time is the median of several rounds after a warm-up. */
const print = (line: string) => process.stdout.write(`${line}\n`)
const example = (name: string): unknown =>
  JSON.parse(readFileSync(new URL(`../../schema/examples/${name}`, import.meta.url), 'utf8'))

/** Nanoseconds of one call: the median and the spread of `rounds`, each of `calls` calls. */
function time(calls: number, rounds: number, run: () => void) {
  for (let i = 0; i < calls; i++) run()
  const each = Array.from({ length: rounds }, () => {
    const start = process.hrtime.bigint()
    for (let i = 0; i < calls; i++) run()
    return Number(process.hrtime.bigint() - start) / calls
  }).sort((a, b) => a - b)
  return { median: each[Math.floor(rounds / 2)]!, least: each[0]!, most: each.at(-1)! }
}
type Timing = ReturnType<typeof time>
const scale = (ns: number) =>
  ns < 1e3 ? `${ns.toFixed(1)} ns` : ns < 1e6 ? `${(ns / 1e3).toFixed(1)} us` : `${(ns / 1e6).toFixed(1)} ms`
const show = (name: string, t: Timing) =>
  print(`  ${name.padEnd(44)} ${scale(t.median).padStart(10)}   (${scale(t.least)} to ${scale(t.most)})`)

// What a bench computes is added up and printed, so that no call can be left out as unused.
let sink = 0

function formulaStep(): void {
  print('(d) One formula: a step on a silent sheet against arithmetic written by hand')
  const adhesion = formula({
    symbol: 'alpha',
    name: 'adhesion factor',
    unit: '1',
    text: 'psi <= 1 ? min(1, 0.5 * psi^(-0.5)) : min(1, 0.5 * psi^(-0.25))',
    where: { psi: '1' },
    source: { key: 'api-rp2geo-2011', locator: '8.1.3' },
  })
  const byHand = (psi: number) => (psi <= 1 ? Math.min(1, 0.5 * psi ** -0.5) : Math.min(1, 0.5 * psi ** -0.25))
  const values = Array.from({ length: 1024 }, (_, i) => 0.1 + i / 400)
  const terms = values.map((value): Term<'1'> => ({ value, unit: '1', symbol: 'psi', from: '' }))
  const [hand, silent, native] = [
    time(2000, 15, () => {
      for (const v of values) sink += byHand(v)
    }),
    time(2000, 15, () => {
      for (const psi of terms) sink += Sheet.silent.step(adhesion, { psi }).value
    }),
    time(2000, 15, () => {
      for (const psi of terms) sink += adhesion.evaluate({ psi })
    }),
  ].map((t) => ({ median: t.median / 1024, least: t.least / 1024, most: t.most / 1024 })) as [Timing, Timing, Timing]
  show('by hand', hand)
  show('compiled formula alone', native)
  show('step on a silent sheet', silent)
  print(
    `  ratio: formula ${(native.median / hand.median).toFixed(2)}, step ${(silent.median / hand.median).toFixed(2)}\n`,
  )
}

function singlePile(): void {
  print('(b) One single pile: trace on against silent')
  const request = singlePileRequest.parse(example('single-pile.json'))
  const run = (trace: boolean) =>
    time(200, 15, () => {
      sink += calculateSinglePile(request, { trace }).result.ultimateResistance
    })
  const silent = run(false)
  const traced = run(true)
  show('silent', silent)
  show('trace on', traced)
  print(`  ratio: ${(traced.median / silent.median).toFixed(2)}\n`)
}

/** The demo schedule with its CSV, repeated in plan until it has `count` caps. */
function scheduleOf(count: number): Schedule {
  const [header, ...lines] = readFileSync(new URL('../../schema/examples/demo-loads.csv', import.meta.url), 'utf8')
    .trim()
    .split('\n')
    .map((line) => line.split(','))
  const rows = lines.map((cells) =>
    Object.fromEntries(header!.map((name, i) => [name, i < 2 ? cells[i]! : Number(cells[i])])),
  ) as unknown as ModelRow[]
  const raw = example('demo-schedule.json') as { caps: Cap[]; loads: object }
  const base = scheduleRequest.parse({ ...raw, loads: { ...raw.loads, rows } })
  const caps: Cap[] = []
  const repeated: ModelRow[] = []
  for (let i = 0; i < count; i++) {
    const original = base.caps[i % base.caps.length]!
    const bay = Math.floor(i / base.caps.length)
    const mark = `${original.mark}-${bay}`
    caps.push({ ...original, mark, x: original.x + 36 * (bay % 20), y: original.y + 30 * Math.floor(bay / 20) })
    for (const row of base.loads.rows as ModelRow[]) if (row.cap === original.mark) repeated.push({ ...row, cap: mark })
  }
  return { ...base, caps, loads: { ...base.loads, rows: repeated } }
}

function assessment(): void {
  print('(c) assess(): 300 against 3000 caps, silent, ten combinations')
  const run = (count: number) => {
    const schedule = scheduleOf(count)
    const t = time(1, 7, () => {
      sink += assess(schedule, { trace: false }).result.summary.exceeded
    })
    show(`${count} caps, ${schedule.loads.rows.length} rows`, t)
    return t
  }
  const few = run(300)
  const many = run(3000)
  print(`  ratio: ${(many.median / few.median).toFixed(2)} (10 is linear)\n`)
}

print(`Node ${process.version}, ${cpus().length} x ${cpus()[0]?.model ?? 'unknown processor'}\n`)
formulaStep()
singlePile()
assessment()
print(`(sum of what was computed: ${sink.toPrecision(6)})`)
